// @ts-check
import { atPlace } from '../svg.js';

/**
 * Pixels about the view's north-west corner, y down, for what keeps its size on the screen; and the lettering of a
 * placement, which is placed by the plan together with the plot's own.
 *
 * @typedef {{x: number, y: number, width: number, height: number, ppm: number}} View plan metres, south-west corner
 * @typedef {import('../kinds/env.js').Label} Label
 */

/** Greater than the plot's own lettering; see draw/kinds. */
export const WEIGHT = { dimension: 400, hold: 300, bearing: 350, legend: 60 };

/**
 * @param {View} view
 * @param {number[]} point plan metres
 * @returns {[number, number]} px
 */
export function toPixels(view, point) {
  return [(point[0] - view.x) * view.ppm, (view.y + view.height - point[1]) * view.ppm];
}

/**
 * @param {View} view
 * @param {number[]} pixel
 * @returns {[number, number]} plan metres
 */
export function toMetres(view, [x, y]) {
  return [view.x + x / view.ppm, view.y + view.height - y / view.ppm];
}

/**
 * @param {View} view
 * @param {(Node|null)[]} children
 * @param {string} className
 */
export function inPixels(view, children, className) {
  return atPlace([view.x, view.y + view.height], view.ppm, children, { class: className });
}

/**
 * Places every few pixels along a line, which lettering must not cover.
 * @param {View} view
 * @param {number[]} from px
 * @param {number[]} to px
 * @returns {number[][]} plan metres
 */
export function along(view, from, to) {
  const count = Math.max(1, Math.ceil(Math.hypot(to[0] - from[0], to[1] - from[1]) / 11));
  return Array.from({ length: count + 1 }, (_, index) =>
    toMetres(view, [from[0] + ((to[0] - from[0]) * index) / count, from[1] + ((to[1] - from[1]) * index) / count]),
  );
}
