// @ts-check
/** Dimension lines: a thin line with slash ticks, beside what it measures, its figure along it. */
import { distance, left, unit } from '../geometry/vector.js';
import { formatLength } from '../units/length.js';
import { pathOf, svg } from './svg.js';

/** @typedef {import('../geometry/vector.js').Point} Point */

/** @param {Point} p @param {Point} n @param {number} d @returns {Point} */
const off = (p, n, d) => [p[0] + n[0] * d, p[1] + n[1] * d];

/**
 * @param {Point} a @param {Point} b
 * @param {number} offset metres to the left of a→b; negative: to the right
 * @param {number} px metres a pixel
 * @param {string} look class
 * @returns {SVGElement}
 */
export function dimension(a, b, offset, px, look) {
  const u = unit(a, b);
  const n = left(u);
  const side = Math.sign(offset) || 1;
  const from = off(a, n, offset);
  const to = off(b, n, offset);
  const tick = 4.5 * px;
  const slash = (/** @type {Point} */ p) => [
    [p[0] - (u[0] + n[0]) * tick, p[1] - (u[1] + n[1]) * tick],
    [p[0] + (u[0] + n[0]) * tick, p[1] + (u[1] + n[1]) * tick],
  ];
  const start = side * Math.min(Math.abs(offset) * 0.3, 4 * px);
  return svg('g', { class: look, 'aria-hidden': 'true' }, [
    svg('path', { d: pathOf([from, to]), class: 'dimension-line' }),
    svg('path', { d: `${pathOf([off(a, n, start), off(from, n, side * 4 * px)])}${pathOf([off(b, n, start), off(to, n, side * 4 * px)])}`, class: 'dimension-extension' }),
    svg('path', { d: `${pathOf(slash(from))}${pathOf(slash(to))}`, class: 'dimension-tick' }),
  ]);
}

/** @param {Point} a @param {Point} b @returns {number} degrees clockwise on the screen, so that it reads from below or from the right */
export function readingTurn(a, b) {
  let degrees = (-Math.atan2(b[1] - a[1], b[0] - a[0]) * 180) / Math.PI;
  if (degrees > 90) degrees -= 180;
  if (degrees <= -90) degrees += 180;
  return degrees;
}

/**
 * The figure of a dimension line as a label that takes part in placing.
 * @param {string} id @param {Point} a @param {Point} b @param {number} offset
 * @param {{units: 'm'|'ft', px: number}} env @param {number} weight @param {string} [look]
 * @returns {import('./kinds/env.js').Label}
 */
export function dimensionLabel(id, a, b, offset, env, weight, look = 'figure') {
  const n = left(unit(a, b));
  const at = (/** @type {number} */ t) =>
    off([a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t], n, offset);
  return {
    id,
    weight,
    at: at(0.5),
    also: [at(0.38), at(0.62), at(0.25), at(0.75)],
    lines: [{ text: formatLength(distance(a, b), env.units, 2) }],
    look,
    sit: 'middle',
    turn: readingTurn(a, b),
  };
}
