// @ts-check
/** The part of the plan that is in sight: a rectangle in metres, x and y its south-west corner. */
import { bounds } from './polygon.js';

/** @typedef {{x: number, y: number, width: number, height: number}} View */
/** @typedef {import('./vector.js').Point} Point */

/** Widest and narrowest sight, metres across. */
export const WIDEST = 4000;
export const NARROWEST = 2;

/**
 * A view about the same middle with another shape, showing all of the old one.
 * @param {View} view @param {number} ratio width over height
 * @returns {View}
 */
export function shaped(view, ratio) {
  const width = Math.max(view.width, view.height * ratio, NARROWEST);
  const height = width / ratio;
  return {
    x: view.x + (view.width - width) / 2,
    y: view.y + (view.height - height) / 2,
    width,
    height,
  };
}

/**
 * Nearer or farther about a place that stays where it is.
 * @param {View} view @param {number} factor over 1 shows more @param {Point} about
 * @returns {View}
 */
export function zoomed(view, factor, about) {
  const width = Math.min(WIDEST, Math.max(NARROWEST, view.width * factor));
  const k = width / view.width;
  return {
    x: about[0] - (about[0] - view.x) * k,
    y: about[1] - (about[1] - view.y) * k,
    width,
    height: view.height * k,
  };
}

/** @param {View} view @param {number} dx metres east @param {number} dy metres north @returns {View} */
export const panned = (view, dx, dy) => ({ ...view, x: view.x + dx, y: view.y + dy });

/**
 * All the points with a margin round them.
 * @param {Point[]} points @param {number} margin share of the greater side @param {number} ratio
 * @returns {View} a 20 m square where there is nothing to show
 */
export function around(points, margin, ratio) {
  const box = bounds(points) ?? { x: -4, y: -4, width: 24, height: 18 };
  const extra = Math.max(1.5, Math.max(box.width, box.height) * margin);
  return shaped(
    {
      x: box.x - extra,
      y: box.y - extra,
      width: box.width + 2 * extra,
      height: box.height + 2 * extra,
    },
    ratio,
  );
}

/**
 * A step of 1, 2 or 5 times a power of ten that is at least so many pixels long.
 * @param {number} ppm pixels per metre @param {number} least pixels
 * @returns {number} metres
 */
export function roundStep(ppm, least) {
  const raw = least / ppm;
  const power = 10 ** Math.floor(Math.log10(raw));
  return [1, 2, 5, 10].map((k) => k * power).find((step) => step >= raw - 1e-12) ?? 10 * power;
}
