// @ts-check
/**
 * Snapping: the tolerance is asked in pixels, the answer is in metres, and it says why.
 * Order: corners, then crossings of a guide with an edge, edges, guides (right angles, straight
 * on, level with the first corner), whole decimetres.
 */
import { nearestOnSegment } from './line.js';
import { direction, distance, left, onGrid, same, tidyPoint, unit } from './vector.js';

/** @typedef {import('./vector.js').Point} Point */
/** @typedef {{at: Point, name: string}} Corner a known point and what it is called */
/** @typedef {{a: Point, b: Point, name: string}} Edge */
/** @typedef {{through: Point, along: Point, name: string}} Guide an endless straight line, `along` of length 1 */
/** @typedef {{point: Point, reason: string, guide: Guide|null}} Snapped */

/**
 * @param {Point} p where the pointer is
 * @param {{corners: Corner[], edges: Edge[], guides: Guide[]}} near
 * @param {{ppm: number, pixels?: number, step?: number, free?: boolean}} options
 *   `ppm` pixels per metre, `step` the raster in metres, `free` holds everything off
 * @returns {Snapped}
 */
export function snap(p, near, options) {
  if (options.free) return { point: tidyPoint(p), reason: 'free', guide: null };
  const reach = (options.pixels ?? 10) / options.ppm;
  const corner = nearest(near.corners, (c) => distance(p, c.at), reach);
  if (corner) return { point: corner.at.slice(0, 2), reason: corner.name, guide: null };

  const edge = nearest(near.edges, (e) => nearestOnSegment(p, e.a, e.b).distance, reach);
  const guide = nearest(near.guides, (g) => distance(p, foot(p, g)), reach);
  if (edge && guide) {
    const at = along(guide, edge);
    if (at && distance(at, p) < reach * 1.8) {
      return { point: tidyPoint(at), reason: `${guide.name}, ${edge.name}`, guide };
    }
  }
  if (edge) {
    const { point } = nearestOnSegment(p, edge.a, edge.b);
    return { point: stepFrom(edge.a, edge.b, point, options.step ?? 0.1), reason: edge.name, guide: null };
  }
  if (guide) {
    const other = nearest(
      near.guides.filter((g) => g !== guide),
      (g) => distance(p, foot(p, g)),
      reach,
    );
    const both = other ? crossingOf(guide, other) : null;
    if (both && distance(both, p) < reach * 1.8) {
      return { point: tidyPoint(both), reason: `${guide.name}, ${other?.name}`, guide };
    }
    const to = [guide.through[0] + guide.along[0], guide.through[1] + guide.along[1]];
    return {
      point: stepFrom(guide.through, to, foot(p, guide), options.step ?? 0.1),
      reason: guide.name,
      guide,
    };
  }
  return { point: onGrid(p, options.step ?? 0.1), reason: 'whole decimetres', guide: null };
}

/**
 * Guides for the next corner of something being drawn.
 * @param {Point[]} drawn corners so far
 * @returns {Guide[]}
 */
export function guidesFor(drawn) {
  const last = drawn[drawn.length - 1];
  if (!last) return [];
  /** @type {Guide[]} */
  const guides = [];
  const before = drawn[drawn.length - 2];
  if (before && !same(before, last)) {
    const u = unit(before, last);
    guides.push({ through: last, along: left(u), name: 'square to the last wall' });
    guides.push({ through: last, along: u, name: 'straight on' });
  }
  const axes = before ? direction(before, last) % 90 : 0;
  if (!before || Math.min(axes, 90 - axes) > 0.5) {
    guides.push({ through: last, along: [0, 1], name: 'due plan north' });
    guides.push({ through: last, along: [1, 0], name: 'due plan east' });
  }
  if (drawn.length > 2) {
    const u = unit(drawn[0], drawn[1]);
    guides.push({ through: drawn[0], along: left(u), name: 'square to the first wall' });
    guides.push({ through: drawn[0], along: u, name: 'in line with the first wall' });
  }
  return guides;
}

/**
 * @template T
 * @param {T[]} all @param {(one: T) => number} far @param {number} reach
 * @returns {T|null}
 */
function nearest(all, far, reach) {
  let best = null;
  let least = reach;
  for (const one of all) {
    const d = far(one);
    if (d <= least) {
      least = d;
      best = one;
    }
  }
  return best;
}

/** @param {Point} p @param {Guide} g @returns {Point} */
function foot(p, g) {
  const t = (p[0] - g.through[0]) * g.along[0] + (p[1] - g.through[1]) * g.along[1];
  return [g.through[0] + t * g.along[0], g.through[1] + t * g.along[1]];
}

/** A place on the line a→b at whole steps from a; the corner b itself wins when near. @param {Point} a @param {Point} b @param {Point} p @param {number} step */
function stepFrom(a, b, p, step) {
  const u = unit(a, b);
  const s = (p[0] - a[0]) * u[0] + (p[1] - a[1]) * u[1];
  const whole = Math.round(s / step) * step;
  return tidyPoint([a[0] + u[0] * whole, a[1] + u[1] * whole]);
}

/** @param {Guide} g @param {Edge} e @returns {Point|null} where the guide crosses the edge */
function along(g, e) {
  const at = crossingOf(g, { through: e.a, along: unit(e.a, e.b), name: '' });
  return at && nearestOnSegment(at, e.a, e.b).distance < 1e-6 ? at : null;
}

/** @param {Guide} g @param {Guide} h @returns {Point|null} */
function crossingOf(g, h) {
  const d = g.along[0] * h.along[1] - g.along[1] * h.along[0];
  if (Math.abs(d) < 1e-6) return null;
  const dx = h.through[0] - g.through[0];
  const dy = h.through[1] - g.through[1];
  const t = (dx * h.along[1] - dy * h.along[0]) / d;
  return [g.through[0] + t * g.along[0], g.through[1] + t * g.along[1]];
}
