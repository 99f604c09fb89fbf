// @ts-check
/** Segments and open paths on the plan; see vector.js for the frame. */
import { between, cross, distance } from './vector.js';

/** @typedef {import('./vector.js').Point} Point */

/**
 * The point of a segment nearest to p.
 * @param {Point} p @param {Point} a @param {Point} b
 * @returns {{point: Point, t: number, distance: number}} t is 0 at a and 1 at b
 */
export function nearestOnSegment(p, a, b) {
  const dx = b[0] - a[0];
  const dy = b[1] - a[1];
  const squared = dx * dx + dy * dy;
  const raw = squared > 0 ? ((p[0] - a[0]) * dx + (p[1] - a[1]) * dy) / squared : 0;
  const t = Math.min(1, Math.max(0, raw));
  const point = [a[0] + t * dx, a[1] + t * dy];
  return { point, t, distance: distance(p, point) };
}

/**
 * Where two segments cross or touch.
 * @param {Point} a @param {Point} b @param {Point} c @param {Point} d
 * @returns {Point|null} null when they do not, or lie along one another
 */
export function crossing(a, b, c, d) {
  const rx = b[0] - a[0];
  const ry = b[1] - a[1];
  const sx = d[0] - c[0];
  const sy = d[1] - c[1];
  const denominator = rx * sy - ry * sx;
  if (Math.abs(denominator) < 1e-12) return null;
  const t = ((c[0] - a[0]) * sy - (c[1] - a[1]) * sx) / denominator;
  const u = ((c[0] - a[0]) * ry - (c[1] - a[1]) * rx) / denominator;
  if (t < 0 || t > 1 || u < 0 || u > 1) return null;
  return [a[0] + t * rx, a[1] + t * ry];
}

/**
 * Where two endless straight lines cross.
 * @param {Point} a @param {Point} u direction through a @param {Point} b @param {Point} v direction through b
 * @returns {Point|null}
 */
export function meeting(a, u, b, v) {
  const denominator = u[0] * v[1] - u[1] * v[0];
  if (Math.abs(denominator) < 1e-9) return null;
  const t = ((b[0] - a[0]) * v[1] - (b[1] - a[1]) * v[0]) / denominator;
  return [a[0] + t * u[0], a[1] + t * u[1]];
}

/** @param {Point[]} path @returns {number} metres on the plan */
export function pathLength(path) {
  let sum = 0;
  for (let i = 1; i < path.length; i++) sum += distance(path[i - 1], path[i]);
  return sum;
}

/**
 * The place a given way along a path.
 * @param {Point[]} path at least two points
 * @param {number} metres from its start
 * @returns {{point: Point, edge: number}}
 */
export function placeAlong(path, metres) {
  let rest = metres;
  for (let i = 1; i < path.length; i++) {
    const length = distance(path[i - 1], path[i]);
    if (rest <= length || i === path.length - 1) {
      return { point: between(path[i - 1], path[i], length > 0 ? rest / length : 0), edge: i - 1 };
    }
    rest -= length;
  }
  return { point: path[0], edge: 0 };
}

/**
 * @param {Point} p @param {Point[]} path @param {boolean} [closed]
 * @returns {{point: Point, distance: number, edge: number, t: number}|null}
 */
export function nearestOnPath(p, path, closed = false) {
  const count = closed ? path.length : path.length - 1;
  let best = null;
  for (let i = 0; i < count; i++) {
    const near = nearestOnSegment(p, path[i], path[(i + 1) % path.length]);
    if (!best || near.distance < best.distance) best = { ...near, edge: i };
  }
  return best;
}

/** @param {Point} a @param {Point} b @param {Point} p @returns {boolean} p lies left of a→b */
export const isLeft = (a, b, p) => cross(a, b, p) > 0;
