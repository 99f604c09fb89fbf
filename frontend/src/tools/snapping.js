// @ts-check
/** What the pointer can snap to on this plan, and the snap itself. */
import { guidesFor, snap } from '../geometry/snap.js';
import { KINDS, nameOf, pointsOf, things } from '../state/kinds.js';

/** @typedef {number[]} Point */

/**
 * @param {any} plan
 * @param {{ref?: string, vertex?: number|null}} [except] a thing, or one corner of it, that is being moved
 * @returns {{corners: import('../geometry/snap.js').Corner[], edges: import('../geometry/snap.js').Edge[]}}
 */
export function targetsOf(plan, except = {}) {
  /** @type {import('../geometry/snap.js').Corner[]} */
  const corners = [];
  /** @type {import('../geometry/snap.js').Edge[]} */
  const edges = [];
  for (const { ref, kind, thing, index } of things(plan)) {
    const own = ref === except.ref;
    if (own && (except.vertex === null || except.vertex === undefined)) continue;
    const name = nameOf(kind, thing, index);
    const { shape } = KINDS[kind];
    const points = pointsOf(kind, thing);
    points.forEach((at, i) => {
      if (own && i === except.vertex) return;
      corners.push({ at, name: shape === 'point' ? name : `corner, ${name}` });
    });
    if (shape === 'point') continue;
    const count = shape === 'ring' ? points.length : points.length - 1;
    for (let i = 0; i < count; i++) {
      const j = (i + 1) % points.length;
      if (own && (i === except.vertex || j === except.vertex)) continue;
      edges.push({ a: points[i], b: points[j], name: `on ${name}` });
    }
  }
  return { corners, edges };
}

/**
 * @param {any} plan @param {Point} at
 * @param {{ppm: number, free: boolean, touch: boolean}} event
 * @param {{drawn?: Point[], except?: {ref?: string, vertex?: number|null}, guides?: import('../geometry/snap.js').Guide[]}} [options]
 * @returns {import('../geometry/snap.js').Snapped}
 */
export function snapOn(plan, at, event, options = {}) {
  const drawn = options.drawn ?? [];
  const { corners, edges } = targetsOf(plan, options.except);
  drawn.slice(0, -1).forEach((p, i) => {
    corners.push({ at: p, name: i === 0 ? 'first corner' : 'own corner' });
  });
  const guides = options.guides ?? guidesFor(drawn);
  return snap(at, { corners, edges, guides }, {
    ppm: event.ppm,
    free: event.free,
    pixels: event.touch ? 18 : 9,
    step: stepAt(event.ppm),
  });
}

/** @param {number} ppm @returns {number} raster in metres: decimetres, finer only when very near */
export const stepAt = (ppm) => (ppm >= 250 ? 0.01 : 0.1);

/**
 * Guides for a corner that is dragged: square to and in line with the walls beside it.
 * @param {Point[]} points @param {number} vertex @param {boolean} closed
 * @returns {import('../geometry/snap.js').Guide[]}
 */
export function guidesAround(points, vertex, closed) {
  const n = points.length;
  const at = (/** @type {number} */ i) => (closed ? points[((i % n) + n) % n] : points[i]);
  const one = [at(vertex - 2), at(vertex - 1)].filter(Boolean);
  const two = [at(vertex + 2), at(vertex + 1)].filter(Boolean);
  const named = (/** @type {Point[]} */ pair) =>
    guidesFor(pair).map((g) => ({ ...g, name: g.name.replace('the last wall', 'the next wall') }));
  return [...(one.length ? named(one) : []), ...(two.length ? named(two) : [])];
}
