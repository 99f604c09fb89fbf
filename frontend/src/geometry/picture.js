// @ts-check
/** A picture laid on the plan: its south-west corner, width and turn, and scaling it by two points. */
import { direction, distance } from './vector.js';

/** @typedef {import('./vector.js').Point} Point */
/** @typedef {{at: Point, width: number, turn: number}} Lay metres; turn clockwise about `at`, degrees */

/**
 * The picture laid anew so that two of its points stand apart by a known length, and in a known
 * direction where one is given. The first of them stays where it is.
 * @param {Lay} lay @param {Point} a @param {Point} b where the points stand now
 * @param {number} length metres they are apart in truth @param {number|null} way degrees from plan north
 * @returns {Lay} the same when the points coincide
 */
export function scaled(lay, a, b, length, way) {
  const now = distance(a, b);
  if (!(now > 1e-6) || !(length > 0)) return lay;
  const k = length / now;
  const by = way === null ? 0 : way - direction(a, b);
  const r = (by * Math.PI) / 180;
  const dx = (lay.at[0] - a[0]) * k;
  const dy = (lay.at[1] - a[1]) * k;
  // A turn clockwise by r.
  const at = [a[0] + dx * Math.cos(r) + dy * Math.sin(r), a[1] - dx * Math.sin(r) + dy * Math.cos(r)];
  return { ...lay, at, width: lay.width * k, turn: (((lay.turn + by) % 360) + 360) % 360 };
}

/**
 * Pixels of the picture to pixels of the screen, as a CSS matrix.
 * @param {Lay} lay @param {{width: number, height: number}} picture pixels
 * @param {number} ppm pixels of the screen per metre @param {[number, number]} at where `lay.at` is on the screen
 * @returns {[number, number, number, number, number, number]}
 */
export function onScreen(lay, picture, ppm, at) {
  const k = (lay.width / picture.width) * ppm;
  const r = (lay.turn * Math.PI) / 180;
  const [c, s] = [Math.cos(r) * k, Math.sin(r) * k];
  return [c, s, -s, c, at[0] + s * picture.height, at[1] - c * picture.height];
}
