// @ts-check
/** Rings of corners in order, not closed; see vector.js for the frame. */
import { crossing, nearestOnPath } from './line.js';
import { direction, distance, turned } from './vector.js';

/** @typedef {import('./vector.js').Point} Point */
/** @typedef {{x: number, y: number, width: number, height: number}} Box */

/** @param {Point[]} ring @returns {number} m², positive when the corners run anticlockwise */
export function signedArea(ring) {
  let sum = 0;
  for (let i = 0; i < ring.length; i++) {
    const a = ring[i];
    const b = ring[(i + 1) % ring.length];
    sum += a[0] * b[1] - b[0] * a[1];
  }
  return sum / 2;
}

/** @param {Point[]} ring @returns {number} m² */
export const area = (ring) => Math.abs(signedArea(ring));

/** @param {Point[]} ring @returns {number} metres round */
export const perimeter = (ring) =>
  ring.reduce((sum, p, i) => sum + distance(p, ring[(i + 1) % ring.length]), 0);

/** @param {Point[]} ring @returns {Point} centre of area; the mean of the corners when there is none */
export function centre(ring) {
  const twice = signedArea(ring) * 2;
  const mean = [0, 1].map((k) => ring.reduce((s, p) => s + p[k], 0) / Math.max(1, ring.length));
  if (Math.abs(twice) < 1e-9) return mean;
  let x = 0;
  let y = 0;
  ring.forEach((a, i) => {
    const b = ring[(i + 1) % ring.length];
    const weight = a[0] * b[1] - b[0] * a[1];
    x += (a[0] + b[0]) * weight;
    y += (a[1] + b[1]) * weight;
  });
  return [x / (3 * twice), y / (3 * twice)];
}

/** @param {Point} p @param {Point[]} ring @returns {boolean} by even and odd crossings */
export function contains(p, ring) {
  let inside = false;
  for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
    const [xi, yi] = ring[i];
    const [xj, yj] = ring[j];
    if (yi > p[1] !== yj > p[1] && p[0] < ((xj - xi) * (p[1] - yi)) / (yj - yi) + xi) {
      inside = !inside;
    }
  }
  return inside;
}

/** @param {Point[]} points @returns {Box|null} null when there are none */
export function bounds(points) {
  if (!points.length) return null;
  let [west, south] = points[0];
  let [east, north] = points[0];
  for (const p of points) {
    west = Math.min(west, p[0]);
    east = Math.max(east, p[0]);
    south = Math.min(south, p[1]);
    north = Math.max(north, p[1]);
  }
  return { x: west, y: south, width: east - west, height: north - south };
}

/**
 * The walls of a ring, or the lengths of a path.
 * @param {Point[]} points @param {boolean} closed
 * @returns {{from: number, to: number, length: number, direction: number, turn: number|null}[]}
 *   `turn` is the angle inside the corner at its start, degrees; null where a path starts
 */
export function walls(points, closed) {
  const count = closed ? points.length : points.length - 1;
  const clockwise = signedArea(points) < 0;
  const rows = [];
  for (let i = 0; i < count; i++) {
    const a = points[i];
    const b = points[(i + 1) % points.length];
    const before = i > 0 || closed ? points[(i - 1 + points.length) % points.length] : null;
    const here = direction(a, b);
    let turn = null;
    if (before) {
      const inner = turned(direction(a, before) - here);
      turn = closed && clockwise ? inner : 360 - inner;
      if (!closed && turn > 180) turn = 360 - turn;
    }
    rows.push({ from: i, to: (i + 1) % points.length, length: distance(a, b), direction: here, turn });
  }
  return rows;
}

/**
 * Where a ring crosses itself.
 * @param {Point[]} ring
 * @returns {{a: number, b: number, at: Point}[]} edges that cross, and where
 */
export function selfCrossings(ring) {
  const found = [];
  const n = ring.length;
  for (let i = 0; i < n; i++) {
    for (let j = i + 2; j < n; j++) {
      if (i === 0 && j === n - 1) continue;
      const at = crossing(ring[i], ring[i + 1], ring[j], ring[(j + 1) % n]);
      if (at) found.push({ a: i, b: j, at });
    }
  }
  return found;
}

/**
 * The same corners in an order that does not cross itself: crossing edges are swapped (2-opt)
 * until none is left.
 * @param {Point[]} ring
 * @returns {Point[]}
 */
export function uncrossed(ring) {
  let now = [...ring];
  for (let round = 0; round < 200; round++) {
    const [first] = selfCrossings(now);
    if (!first) break;
    const turnedPart = now.slice(first.a + 1, first.b + 1).reverse();
    now = [...now.slice(0, first.a + 1), ...turnedPart, ...now.slice(first.b + 1)];
  }
  return now;
}

/**
 * A place well inside a ring for a label: the best of a coarse raster, then of a finer one round it.
 * @param {Point[]} ring
 * @returns {Point}
 */
export function labelPlace(ring) {
  const box = bounds(ring);
  if (!box) return [0, 0];
  const middle = centre(ring);
  let best = { at: middle, depth: contains(middle, ring) ? depth(middle, ring) * 1.15 : -1 };
  let step = Math.max(box.width, box.height) / 10;
  let around = [box.x + box.width / 2, box.y + box.height / 2];
  for (let round = 0; round < 2; round++) {
    for (let i = -5; i <= 5; i++) {
      for (let j = -5; j <= 5; j++) {
        const at = [around[0] + i * step, around[1] + j * step];
        if (!contains(at, ring)) continue;
        const here = depth(at, ring);
        if (here > best.depth) best = { at, depth: here };
      }
    }
    around = best.at;
    step /= 6;
  }
  return best.at;
}

/** @param {Point} p @param {Point[]} ring */
const depth = (p, ring) => nearestOnPath(p, ring, true)?.distance ?? 0;
