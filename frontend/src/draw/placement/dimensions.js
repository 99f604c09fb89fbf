// @ts-check
import { svg } from '../svg.js';
import { markAt } from '../../charts/marks.js';
import { lettering, toPixels } from './labels.js';

/** Dimension lines at the tightest clearances. Pixels about the view's north-west corner. */

const MOST = 4;
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
 * @param {ReturnType<typeof import('./labels.js').labelRoom>} room
 * @param {{figure: string, words: string[]}} text
 * @returns {SVGElement[]}
 */
export function dimension(clearance, view, room, text) {
  const a = toPixels(view, clearance.at);
  const b = toPixels(view, clearance.toAt);
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
  const length = Math.hypot(dx, dy);
  const line = length < 4 ? [svg('circle', { class: `dimension ${clearance.state}`, cx: a[0], cy: a[1], r: 7 })]
    : length < SHORT ? fromOutside(a, b, [dx / length, dy / length], clearance.state)
      : between(a, b, [dx / length, dy / length], clearance.state);
  const spot = room.place((a[0] + b[0]) / 2, (a[1] + b[1]) / 2, [`  ${text.figure}`, ...text.words], length < SHORT ? 12 : 9);
  if (!spot) return line;
  const figureX = spot.anchor === 'end' ? spot.x : spot.x + 15;
  const markX = spot.anchor === 'end' ? spot.x - text.figure.length * 6.2 - 9 : spot.anchor === 'middle' ? spot.x - text.figure.length * 3 - 6 : spot.x + 6;
  return [
    ...line,
    markAt(clearance.state, markX, spot.y - 4),
    lettering(spot.anchor === 'middle' ? spot.x + 6 : figureX, spot.y, [text.figure], `bold ${clearance.state}`, spot.anchor),
    lettering(spot.anchor === 'start' ? spot.x : spot.x, spot.y + 13, text.words, 'soft', spot.anchor),
  ];
}

/** @param {number[]} a @param {number[]} b @param {number[]} unit @param {string} state */
function between(a, b, [ux, uy], state) {
  const tick = ([x, y]) => {
    const [tx, ty] = [(ux - uy) * 5, (uy + ux) * 5];
    return `M${(x - tx).toFixed(1)} ${(y - ty).toFixed(1)}L${(x + tx).toFixed(1)} ${(y + ty).toFixed(1)}`;
  };
  return [
    svg('path', { class: `dimension ${state}`, d: `M${a[0].toFixed(1)} ${a[1].toFixed(1)}L${b[0].toFixed(1)} ${b[1].toFixed(1)}` }),
    svg('path', { class: `dimension-tick ${state}`, d: tick(a) + tick(b) }),
  ];
}

/** @param {number[]} a @param {number[]} b @param {number[]} unit @param {string} state */
function fromOutside(a, b, [ux, uy], state) {
  const arrow = ([x, y], way) => {
    const [tx, ty] = [x + ux * way * 16, y + uy * way * 16];
    const [bx, by] = [x + ux * way * 6, y + uy * way * 6];
    return `M${tx.toFixed(1)} ${ty.toFixed(1)}L${x.toFixed(1)} ${y.toFixed(1)}M${(bx - uy * 3).toFixed(1)} ${(by + ux * 3).toFixed(1)}L${x.toFixed(1)} ${y.toFixed(1)}L${(bx + uy * 3).toFixed(1)} ${(by - ux * 3).toFixed(1)}`;
  };
  return [svg('path', { class: `dimension ${state}`, d: arrow(a, -1) + arrow(b, 1) })];
}
