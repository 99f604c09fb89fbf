// @ts-check
import { nearestOnPath } from '../../geometry/line.js';
import { contains } from '../../geometry/polygon.js';

/**
 * Where an attachment may go when it is dragged: onto a support, along a bracket line, about a mast zone. Pure.
 * @typedef {{on: string, at: [number, number], lowest: number, highest: number, base: number, distance: number}} Holding
 *   heights above the local ground; distance on the plan from where it was wished
 */

const LEAST_MAST = 2.5;
/** Rope that an end keeps at least, metres. */
const LEAST_TAIL = 0.5;
/** A feedpoint this near a holding point is held by it, metres. */
const NEAR_HOLD = 0.8;

/**
 * @param {any} plan
 * @param {number[]} point x, y
 * @returns {Holding[]} nearest first
 */
export function holdings(plan, point) {
  const supports = (plan.supports ?? [])
    .filter((/** @type {any} */ one) => one.pullLimit !== 0)
    .map((/** @type {any} */ one) => ({
      on: one.id,
      at: one.at,
      lowest: one.lowest,
      highest: one.highest,
      base: 0,
    }));
  const brackets = (plan.bracketLines ?? []).map((/** @type {any} */ one) => ({
    on: one.id,
    at: nearest(point, one.path, false),
    lowest: one.lowest,
    highest: one.highest,
    base: 0,
  }));
  const zones = (plan.mastZones ?? []).map((/** @type {any} */ one) => ({
    on: one.id,
    at: contains(point, one.area) ? [point[0], point[1]] : nearest(point, one.area, true),
    lowest: (one.base ?? 0) + LEAST_MAST,
    highest: one.highest,
    base: one.base ?? 0,
  }));
  return [...supports, ...brackets, ...zones]
    .map((one) => ({ ...one, distance: Math.hypot(one.at[0] - point[0], one.at[1] - point[1]) }))
    .sort((a, b) => a.distance - b.distance);
}

/** @param {number[]} point @param {number[][]} path @param {boolean} closed @returns {[number, number]} */
function nearest(point, path, closed) {
  const found = nearestOnPath(point, path, closed)?.point ?? path[0];
  return [found[0], found[1]];
}

/**
 * The layout after one attachment has gone elsewhere: the wire keeps its share of each span, so it grows and shrinks
 * with them; the length of the feed line is left to be proposed anew.
 * @param {any} placement
 * @param {number} index of the attachment
 * @param {{on: string, at: [number, number], z: number}} to
 * @returns {any} what `assess` reads
 */
export function movedLayout(placement, index, to) {
  const attachments = placement.attachments.map((/** @type {any} */ hold, /** @type {number} */ k) =>
    k === index ? { on: to.on, at: [to.at[0], to.at[1], to.z] } : { on: hold.on, at: hold.at },
  );
  const { conductor, line } = placement.feed;
  const conductors = placement.conductors.map((/** @type {any} */ one) => ({
    points: carried(one.points, placement.attachments, attachments),
    wire: one.wire,
  }));
  const [feedAt] = carried([placement.feed.at], placement.attachments, attachments);
  // A feedpoint that hangs free keeps its share of the wire; one at a holding point stays there.
  const held = placement.attachments.some(
    (/** @type {any} */ hold) => Math.hypot(...[0, 1, 2].map((k) => hold.at[k] - placement.feed.at[k])) < NEAR_HOLD,
  );
  return {
    shape: placement.shape,
    attachments,
    conductors,
    feed: {
      conductor,
      fraction: held ? shareAlong(conductors[conductor].points, feedAt) : placement.feed.fraction,
      line,
    },
  };
}

/**
 * @param {number[][]} points
 * @param {number[]} place
 * @returns {number} share of the line's length at the place on it that is nearest
 */
export function shareAlong(points, place) {
  let [total, at, least] = [0, 0, Infinity];
  for (let index = 1; index < points.length; index++) {
    const [a, b] = [points[index - 1], points[index]];
    const length = Math.hypot(b[0] - a[0], b[1] - a[1], b[2] - a[2]);
    const dot = [0, 1, 2].reduce((sum, k) => sum + (place[k] - a[k]) * (b[k] - a[k]), 0);
    const share = length > 0 ? Math.min(1, Math.max(0, dot / (length * length))) : 0;
    const distance = Math.hypot(...[0, 1, 2].map((k) => a[k] + share * (b[k] - a[k]) - place[k]));
    if (distance < least) [least, at] = [distance, total + share * length];
    total += length;
  }
  return total > 0 ? at / total : 0.5;
}

/**
 * A wire of a given length laid along its holding points, the rest of the course shared by the ropes at its ends.
 * @param {number[][]} holds x, y, z in order
 * @param {number} length of wire [m]
 * @returns {{points: number[][], fraction: number}} the wire, shortened where the course has no room for it; fed at
 *   the middle holding point of three, else in its middle
 */
export function laidAlong(holds, length) {
  const parts = holds.slice(1).map((hold, index) => Math.hypot(...[0, 1, 2].map((k) => hold[k] - holds[index][k])));
  const course = parts.reduce((sum, part) => sum + part, 0);
  const tail = Math.max(Math.min(LEAST_TAIL, course / 4), (course - length) / 2);
  const at = (/** @type {number} */ way) => {
    let rest = way;
    for (let index = 0; index < parts.length; index++) {
      if (rest <= parts[index] || index === parts.length - 1) {
        return [0, 1, 2].map((k) => holds[index][k] + ((holds[index + 1][k] - holds[index][k]) * rest) / parts[index]);
      }
      rest -= parts[index];
    }
    return holds[0];
  };
  const bends = holds.slice(1, -1).filter((_, index) => {
    const way = parts.slice(0, index + 1).reduce((sum, part) => sum + part, 0);
    return way > tail && way < course - tail;
  });
  const fraction = holds.length === 3 ? Math.min(1, Math.max(0, (parts[0] - tail) / (course - 2 * tail))) : 0.5;
  return { points: [at(tail), ...bends, at(course - tail)], fraction };
}

/**
 * Carries points along with the attachments they hang between.
 * @param {number[][]} points
 * @param {any[]} before
 * @param {any[]} after
 * @returns {number[][]}
 */
export function carried(points, before, after) {
  return points.map((point) => {
    let best = { distance: Infinity, index: 0, share: 0 };
    for (let index = 0; index + 1 < before.length; index++) {
      const [a, b] = [before[index].at, before[index + 1].at];
      const d = a.map((/** @type {number} */ value, /** @type {number} */ k) => b[k] - value);
      const square = d[0] * d[0] + d[1] * d[1] + d[2] * d[2] || 1;
      const along = ((point[0] - a[0]) * d[0] + (point[1] - a[1]) * d[1] + (point[2] - a[2]) * d[2]) / square;
      const share = Math.min(1, Math.max(0, along));
      const distance = Math.hypot(...[0, 1, 2].map((k) => a[k] + share * d[k] - point[k]));
      if (distance < best.distance) best = { distance, index, share };
    }
    const move = (/** @type {number} */ k) => {
      const from = after[best.index].at[k] - before[best.index].at[k];
      const to = after[best.index + 1].at[k] - before[best.index + 1].at[k];
      return from + best.share * (to - from);
    };
    return point.map((value, k) => value + move(k));
  });
}
