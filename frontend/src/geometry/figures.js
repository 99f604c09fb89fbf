// @ts-check
/** Lines as a draughtsman marks them: scallops, zig-zags, barbs, beads. Metres in, metres out. */
import { placeAlong, pathLength } from './line.js';
import { distance, left, unit } from './vector.js';

/** @typedef {import('./vector.js').Point} Point */

/**
 * Path data of a scalloped circle: an even number of outward bows.
 * @param {Point} centre @param {number} radius metres @param {number} bow wanted chord, metres
 * @returns {string}
 */
export function scallops(centre, radius, bow) {
  const count = Math.max(9, Math.min(72, Math.round((2 * Math.PI * radius) / bow)));
  const points = Array.from({ length: count }, (_, i) => {
    const a = (2 * Math.PI * i) / count;
    // A slight, fixed unevenness keeps crowns from looking machined.
    const r = radius * (0.975 + 0.02 * Math.sin(i * 2.4));
    return [centre[0] + r * Math.cos(a), centre[1] + r * Math.sin(a)];
  });
  const chord = (2 * Math.PI * radius) / count;
  const bend = (chord * 0.56).toFixed(3);
  const at = (/** @type {Point} */ p) => `${p[0].toFixed(3)} ${p[1].toFixed(3)}`;
  return `M${at(points[0])}${points
    .map((_, i) => `A${bend} ${bend} 0 0 1 ${at(points[(i + 1) % count])}`)
    .join('')}Z`;
}

/**
 * A path with a zig and a zag at even steps, the first half a step in.
 * @param {Point[]} path @param {number} every metres @param {number} height metres to each side
 * @returns {Point[]}
 */
export function zigzag(path, every, height) {
  /** @type {Point[]} */
  const out = [path[0]];
  for (let i = 0; i + 1 < path.length; i++) {
    const a = path[i];
    const b = path[i + 1];
    const length = distance(a, b);
    const u = unit(a, b);
    const n = left(u);
    const count = Math.floor(length / every);
    for (let k = 0; k < count; k++) {
      const middle = (length / count) * (k + 0.5);
      for (const [along, across] of [[-1.1, 0], [-0.45, 1], [0.45, -1], [1.1, 0]]) {
        const s = middle + along * height;
        out.push([a[0] + u[0] * s + n[0] * across * height, a[1] + u[1] * s + n[1] * across * height]);
      }
    }
    out.push(b);
  }
  return out;
}

/**
 * Short strokes square to a path, on its left.
 * @param {Point[]} path @param {number} every metres @param {number} length metres
 * @returns {[Point, Point][]}
 */
export function barbs(path, every, length) {
  const total = pathLength(path);
  const count = Math.max(2, Math.round(total / every));
  return Array.from({ length: count - 1 }, (_, i) => {
    const { point, edge } = placeAlong(path, (total * (i + 1)) / count);
    const n = left(unit(path[edge], path[edge + 1]));
    return [point, [point[0] + n[0] * length, point[1] + n[1] * length]];
  });
}

/** @param {Point[]} path @param {number} every metres @returns {Point[]} places at even steps, ends included */
export function beads(path, every) {
  const total = pathLength(path);
  const count = Math.max(1, Math.round(total / every));
  return Array.from({ length: count + 1 }, (_, i) => placeAlong(path, (total * i) / count).point);
}

/**
 * Points of a raster inside a ring, half a step in from its box.
 * @param {Point[]} ring @param {number} every metres @param {(p: Point) => boolean} inside
 * @returns {Point[]} at most 200
 */
export function sprinkle(ring, every, inside) {
  const xs = ring.map((p) => p[0]);
  const ys = ring.map((p) => p[1]);
  /** @type {Point[]} */
  const out = [];
  for (let x = Math.min(...xs) + every / 2; x < Math.max(...xs); x += every) {
    for (let y = Math.min(...ys) + every / 2; y < Math.max(...ys); y += every) {
      if (out.length < 200 && inside([x, y])) out.push([x, y]);
    }
  }
  return out;
}
