// @ts-check
/** The line all round a path at one distance: the edge of a kept distance. */
import { meeting } from './line.js';
import { cross, distance, left, unit } from './vector.js';

/** @typedef {import('./vector.js').Point} Point */

/**
 * Outline of everything within `radius` of a path, round at its ends and at the outside of bends.
 * Where the path turns so sharply that an inside corner would fall beyond its neighbours, the
 * outline may cross itself; filled by the non-zero rule it still covers the right ground.
 * @param {Point[]} path at least two points
 * @param {number} radius metres
 * @param {number} [step] degrees between points of an arc
 * @returns {Point[]} a ring
 */
export function corridor(path, radius, step = 10) {
  const clean = path.filter((p, i) => i === 0 || distance(p, path[i - 1]) > 1e-6);
  if (clean.length < 2) return clean.length ? arc(clean[0], radius, 0, 360, step) : [];
  return [...side(clean, radius, step), ...side([...clean].reverse(), radius, step)];
}

/**
 * The left side of a path from its start, and the round end.
 * @param {Point[]} path @param {number} radius @param {number} step
 */
function side(path, radius, step) {
  /** @type {Point[]} */
  const out = [];
  for (let i = 0; i + 1 < path.length; i++) {
    const u = unit(path[i], path[i + 1]);
    const n = left(u);
    const a = [path[i][0] + n[0] * radius, path[i][1] + n[1] * radius];
    const b = [path[i + 1][0] + n[0] * radius, path[i + 1][1] + n[1] * radius];
    if (i === 0) out.push(a);
    if (i + 2 < path.length) {
      const v = unit(path[i + 1], path[i + 2]);
      const turnsLeft = cross(path[i], path[i + 1], path[i + 2]) > 0;
      const inner = turnsLeft ? meeting(a, u, path[i + 1].map((c, k) => c + left(v)[k] * radius), v) : null;
      if (inner) out.push(inner);
      else out.push(...arc(path[i + 1], radius, angle(n), sweep(angle(n), angle(left(v))), step));
    } else {
      out.push(b, ...arc(path[i + 1], radius, angle(n), -180, step));
    }
  }
  return out;
}

/** @param {Point} v */
const angle = (v) => (Math.atan2(v[1], v[0]) * 180) / Math.PI;

/** @param {number} from @param {number} to @returns {number} clockwise, so never positive */
const sweep = (from, to) => -((((from - to) % 360) + 360) % 360);

/**
 * @param {Point} centre @param {number} radius @param {number} from degrees anticlockwise from east
 * @param {number} by degrees @param {number} step
 * @returns {Point[]} both ends included
 */
function arc(centre, radius, from, by, step) {
  const count = Math.max(1, Math.ceil(Math.abs(by) / step));
  return Array.from({ length: count + 1 }, (_, i) => {
    const a = ((from + (by * i) / count) * Math.PI) / 180;
    return [centre[0] + radius * Math.cos(a), centre[1] + radius * Math.sin(a)];
  });
}
