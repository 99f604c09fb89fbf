// @ts-check
/** Ridge lines of roofs on a footprint. */
import { crossing } from './line.js';
import { bounds, contains } from './polygon.js';
import { between, distance, left, tidyPoint, unit } from './vector.js';

/** @typedef {import('./vector.js').Point} Point */

/**
 * A ridge for a footprint that has none drawn: through the middle of its box along its longest
 * wall, cut to the outline for a gable and drawn in by half the width for a hip; along the longest
 * wall itself for a lean-to (its high side).
 * @param {Point[]} footprint @param {'gable'|'hip'|'lean-to'|'flat'} roof
 * @param {number} [beside] the wall it runs beside instead of the longest
 * @returns {[Point, Point]|null} null for a flat roof or no outline
 */
export function defaultRidge(footprint, roof, beside) {
  if (roof === 'flat' || footprint.length < 3) return null;
  let longest = beside ?? 0;
  if (beside === undefined) {
    footprint.forEach((_, i) => {
      if (wall(footprint, i) > wall(footprint, longest) + 1e-6) longest = i;
    });
  }
  const a = footprint[longest];
  const b = footprint[(longest + 1) % footprint.length];
  if (roof === 'lean-to') return [tidyPoint(a.slice(0, 2)), tidyPoint(b.slice(0, 2))];
  const u = unit(a, b);
  const n = left(u);
  const local = footprint.map((p) => [dot(p, u), dot(p, n)]);
  const box = bounds(local);
  if (!box) return null;
  const middle = box.y + box.height / 2;
  const back = (/** @type {number} */ s, /** @type {number} */ t) => [
    s * u[0] + t * n[0],
    s * u[1] + t * n[1],
  ];
  let from = back(box.x, middle);
  let to = back(box.x + box.width, middle);
  [from, to] = inside(from, to, footprint);
  if (roof === 'hip') {
    const draw = Math.min(0.45, box.height / 2 / Math.max(0.1, distance(from, to)));
    [from, to] = [between(from, to, draw), between(to, from, draw)];
  }
  return [tidyPoint(from), tidyPoint(to)];
}

/** @param {Point[]} ring @param {number} i */
const wall = (ring, i) => distance(ring[i], ring[(i + 1) % ring.length]);

/** @param {Point} p @param {Point} u */
const dot = (p, u) => p[0] * u[0] + p[1] * u[1];

/** The longest part of a chord that lies inside a ring. @param {Point} a @param {Point} b @param {Point[]} ring @returns {[Point, Point]} */
function inside(a, b, ring) {
  const total = distance(a, b);
  const cuts = [0, 1];
  ring.forEach((p, i) => {
    const at = crossing(a, b, p, ring[(i + 1) % ring.length]);
    if (at) cuts.push(distance(a, at) / total);
  });
  cuts.sort((x, y) => x - y);
  /** @type {[Point, Point]} */
  let best = [a, b];
  let length = 0;
  for (let i = 0; i + 1 < cuts.length; i++) {
    if ((cuts[i + 1] - cuts[i]) * total <= length) continue;
    if (!contains(between(a, b, (cuts[i] + cuts[i + 1]) / 2), ring)) continue;
    length = (cuts[i + 1] - cuts[i]) * total;
    best = [between(a, b, cuts[i]), between(a, b, cuts[i + 1])];
  }
  return best;
}
