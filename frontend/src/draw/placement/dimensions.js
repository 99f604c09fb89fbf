// @ts-check
import { svg } from '../svg.js';
import { toPixels, WEIGHT } from './labels.js';

/** Dimension lines at the tightest clearances. Pixels about the view's north-west corner. */

const MOST = 4;
/** Under this many pixels a dimension is drawn from outside. */
const SHORT = 26;

/**
 * Which clearances are dimensioned: all that are tight or foul up to a few, and with fewer the nearest clear one.
 * @param {any[]} clearances tightest first
 * @returns {any[]}
 */
export function toDimension(clearances) {
  const bad = clearances.filter((one) => one.state !== 'clear');
  return (bad.length ? bad : clearances.slice(0, 1)).filter((one) => one.toAt).slice(0, MOST);
}

/**
 * @param {any} clearance
 * @param {import('./labels.js').View} view
 * @returns {SVGElement[]}
 */
export function dimension(clearance, view) {
  const a = toPixels(view, clearance.at);
  const b = toPixels(view, clearance.toAt);
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
  const length = Math.hypot(dx, dy);
  if (length < 4) return [svg('circle', { class: `dimension ${clearance.state}`, cx: a[0], cy: a[1], r: 7 })];
  const draw = length < SHORT ? fromOutside : between;
  return draw(a, b, [dx / length, dy / length], clearance.state);
}

/**
 * @param {any} clearance
 * @param {number} index
 * @param {{figure: string, words: string[]}} text
 * @returns {import('../kinds/env.js').Label}
 */
export function dimensionLabel(clearance, index, { figure, words }) {
  const middle = [0, 1].map((k) => (clearance.at[k] + clearance.toAt[k]) / 2);
  return {
    id: `clearance-${index}`,
    weight: WEIGHT.dimension - index,
    at: middle,
    also: [],
    sit: 'around',
    gap: 13,
    lines: [{ text: figure, bold: true }, ...words.map((text) => ({ text }))],
    mark: clearance.state,
    look: clearance.state,
  };
}

/** @param {number[]} a @param {number[]} b @param {number[]} unit @param {string} state */
function between(a, b, [ux, uy], state) {
  const tick = (/** @type {number[]} */ [x, y]) => {
    const [tx, ty] = [(ux - uy) * 5, (uy + ux) * 5];
    return `M${(x - tx).toFixed(1)} ${(y - ty).toFixed(1)}L${(x + tx).toFixed(1)} ${(y + ty).toFixed(1)}`;
  };
  return [
    svg('path', {
      class: `dimension ${state}`,
      d: `M${a[0].toFixed(1)} ${a[1].toFixed(1)}L${b[0].toFixed(1)} ${b[1].toFixed(1)}`,
    }),
    svg('path', { class: `dimension-tick ${state}`, d: tick(a) + tick(b) }),
  ];
}

/** @param {number[]} a @param {number[]} b @param {number[]} unit @param {string} state */
function fromOutside(a, b, [ux, uy], state) {
  const arrow = (/** @type {number[]} */ [x, y], /** @type {number} */ way) => {
    const [tx, ty] = [x + ux * way * 16, y + uy * way * 16];
    const [bx, by] = [x + ux * way * 6, y + uy * way * 6];
    return `M${tx.toFixed(1)} ${ty.toFixed(1)}L${x.toFixed(1)} ${y.toFixed(1)}M${(bx - uy * 3).toFixed(1)} ${(by + ux * 3).toFixed(1)}L${x.toFixed(1)} ${y.toFixed(1)}L${(bx + uy * 3).toFixed(1)} ${(by - ux * 3).toFixed(1)}`;
  };
  return [svg('path', { class: `dimension ${state}`, d: arrow(a, -1) + arrow(b, 1) })];
}
