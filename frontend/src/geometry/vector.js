// @ts-check
/**
 * Points and directions on the plan. A point is [x, y] in metres, x east and y north of the plan;
 * a third number, where there is one, is a height and is left alone. A direction is in degrees,
 * clockwise from the plan's north. Nothing here changes its arguments.
 */

/** @typedef {number[]} Point */

const DEGREE = Math.PI / 180;

/** @param {Point} a @param {Point} b @returns {number} metres between them on the plan */
export const distance = (a, b) => Math.hypot(b[0] - a[0], b[1] - a[1]);

/** @param {Point} a @param {Point} b @returns {boolean} nearer than a millimetre */
export const same = (a, b) => distance(a, b) < 1e-3;

/** @param {Point} a @param {Point} b @param {number} t 0 at a, 1 at b @returns {Point} */
export const between = (a, b, t) => a.map((value, i) => value + ((b[i] ?? value) - value) * t);

/** @param {Point} p @param {number} dx @param {number} dy @returns {Point} */
export const moved = (p, dx, dy) => [p[0] + dx, p[1] + dy, ...p.slice(2)];

/** @param {number} degrees @returns {number} the same direction in 0 ≤ d < 360 */
export const turned = (degrees) => ((degrees % 360) + 360) % 360;

/** @param {Point} a @param {Point} b @returns {number} direction from a to b, degrees */
export const direction = (a, b) => turned(Math.atan2(b[0] - a[0], b[1] - a[1]) / DEGREE);

/** @param {Point} from @param {number} degrees @param {number} length @returns {Point} */
export const along = (from, degrees, length) => [
  from[0] + length * Math.sin(degrees * DEGREE),
  from[1] + length * Math.cos(degrees * DEGREE),
];

/** @param {Point} a @param {Point} b @returns {Point} of length 1; [0, 1] when they coincide */
export function unit(a, b) {
  const length = distance(a, b);
  return length > 0 ? [(b[0] - a[0]) / length, (b[1] - a[1]) / length] : [0, 1];
}

/** @param {Point} u @returns {Point} a quarter turn to the left */
export const left = (u) => [-u[1], u[0]];

/** @param {Point} a @param {Point} b @param {Point} c @returns {number} twice the area of abc, positive when it turns left */
export const cross = (a, b, c) => (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);

/** @param {Point} p @param {number} step metres @returns {Point} to the nearest multiple of the step */
export const onGrid = (p, step) => [
  tidy(Math.round(p[0] / step) * step),
  tidy(Math.round(p[1] / step) * step),
  ...p.slice(2),
];

/** @param {number} value metres @returns {number} to a tenth of a millimetre, and no minus zero */
export const tidy = (value) => Math.round(value * 1e4) / 1e4 + 0;

/** @param {Point} p @returns {Point} each figure tidy */
export const tidyPoint = (p) => p.map(tidy);
