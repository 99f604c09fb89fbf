// @ts-check
import { nearestOnPath } from '../../geometry/line.js';
import { contains } from '../../geometry/polygon.js';

/**
 * Where an attachment may go when it is dragged: onto a support, along a bracket line, about a mast zone. Pure.
 * @typedef {{on: string, at: [number, number], lowest: number, highest: number, base: number, distance: number}} Holding
 *   heights above the local ground; distance on the plan from where it was wished
 */

const LEAST_MAST = 2.5;

/**
 * @param {any} plan
 * @param {number[]} point x, y
 * @returns {Holding[]} nearest first
 */
export function holdings(plan, point) {
  const supports = (plan.supports ?? []).filter((/** @type {any} */ one) => one.pullLimit !== 0).map((/** @type {any} */ one) => ({
    on: one.id, at: one.at, lowest: one.lowest, highest: one.highest, base: 0,
  }));
  const brackets = (plan.bracketLines ?? []).map((/** @type {any} */ one) => ({
    on: one.id, at: nearest(point, one.path, false), lowest: one.lowest, highest: one.highest, base: 0,
  }));
  const zones = (plan.mastZones ?? []).map((/** @type {any} */ one) => ({
    on: one.id, at: contains(point, one.area) ? [point[0], point[1]] : nearest(point, one.area, true),
    lowest: (one.base ?? 0) + LEAST_MAST, highest: one.highest, base: one.base ?? 0,
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
    (k === index ? { on: to.on, at: [to.at[0], to.at[1], to.z] } : { on: hold.on, at: hold.at }));
  const { conductor, fraction, line } = placement.feed;
  return {
    shape: placement.shape,
    attachments,
    conductors: placement.conductors.map((/** @type {any} */ one) => ({ points: carried(one.points, placement.attachments, attachments), wire: one.wire })),
    feed: { conductor, fraction, line },
  };
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
