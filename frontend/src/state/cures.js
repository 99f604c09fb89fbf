// @ts-check
/**
 * Cures that one click can take for faults of a plan. Each looks at the plan itself, not at the
 * sentence of the fault, so that it is offered only where it would help.
 */
import { nearestOnPath } from '../geometry/line.js';
import { centre, contains, labelPlace, selfCrossings, uncrossed } from '../geometry/polygon.js';
import { tidyPoint } from '../geometry/vector.js';
import { changeThing, freshId, moveVertex, remove } from './edits.js';
import { find, KINDS, nameOf, pointsOf, refOfPath, withPoints } from './kinds.js';

/** @typedef {import('./types.js').Plan} Plan */
/** @typedef {{label: string, change: (plan: Plan) => Plan}} Cure */

/** @param {Plan} plan @param {{path: string}} fault @returns {Cure[]} */
export function curesFor(plan, fault) {
  const where = refOfPath(plan, fault.path);
  const found = where && find(plan, where.ref);
  if (!where || !found) return [];
  const { kind, thing, index } = found;
  const { ref } = where;
  const points = pointsOf(kind, thing);
  const name = nameOf(kind, thing, index);
  /** @type {Cure[]} */
  const cures = [];
  if (KINDS[kind].shape === 'ring' && selfCrossings(points).length) {
    cures.push({
      label: 'Uncross it',
      change: (now) => changeThing(now, ref, (t) => withPoints(kind, t, uncrossed(pointsOf(kind, t)))),
    });
  }
  const boundary = plan.boundary ?? [];
  if (kind !== 'boundary' && boundary.length > 2 && ['supports', 'entry', 'mastZones', 'bracketLines'].includes(kind)) {
    const outside = points.map((p, i) => ({ p, i })).filter(({ p }) => beyond(p, boundary));
    if (outside.length) {
      cures.push({
        label: points.length > 1 ? 'Bring it inside the boundary' : 'Move it to the boundary',
        change: (now) => outside.reduce((so, { p, i }) => moveVertex(so, ref, i, inward(p, boundary)), now),
      });
    }
  }
  for (const [low, high] of [['lowest', 'highest'], ['eaves', 'ridge'], ['from', 'to'], ['base', 'highest']]) {
    if (typeof thing[low] === 'number' && typeof thing[high] === 'number' && thing[low] > thing[high]) {
      cures.push({
        label: 'Swap the two heights',
        change: (now) => changeThing(now, ref, (t) => ({ ...t, [low]: t[high], [high]: t[low] })),
      });
    }
  }
  if (thing.canopy && thing.canopy.from > thing.canopy.to) {
    cures.push({
      label: 'Swap the heights of the crown',
      change: (now) => changeThing(now, ref, (t) => ({ ...t, canopy: { ...t.canopy, from: t.canopy.to, to: t.canopy.from } })),
    });
  }
  if (fault.path.endsWith('.id')) {
    cures.push({ label: 'Give it another id', change: (now) => renamed(now, kind, index) });
  }
  if (/ridgeLine/.test(fault.path)) {
    cures.push({ label: 'Draw the ridge by itself', change: (now) => changeThing(now, ref, ({ ridgeLine: _gone, ...rest }) => rest) });
  }
  if (kind !== 'boundary') cures.push({ label: `Delete ${name}`, change: (now) => remove(now, ref) });
  return cures;
}

/** Further outside than a decimetre. @param {number[]} p @param {number[][]} ring */
const beyond = (p, ring) => !contains(p, ring) && (nearestOnPath(p, ring, true)?.distance ?? 0) > 0.005;

/** The nearest place of the boundary, a hand's breadth inside. @param {number[]} p @param {number[][]} ring */
function inward(p, ring) {
  const at = nearestOnPath(p, ring, true)?.point ?? p;
  const middle = contains(centre(ring), ring) ? centre(ring) : labelPlace(ring);
  const d = Math.hypot(middle[0] - at[0], middle[1] - at[1]) || 1;
  return tidyPoint([at[0] + ((middle[0] - at[0]) / d) * 0.1, at[1] + ((middle[1] - at[1]) / d) * 0.1]);
}

/** @param {Plan} plan @param {string} kind @param {number} index @returns {Plan} */
function renamed(plan, kind, index) {
  const list = [...(plan[kind] ?? [])];
  if (!list[index]) return plan;
  list[index] = { ...list[index], id: freshId(plan, String(list[index].id || kind)) };
  return { ...plan, [kind]: list };
}

/**
 * Where a fault is shown on the plan.
 * @param {Plan} plan @param {{path: string}} fault
 * @returns {{ref: string, vertex: number|null, at: number[]}|null}
 */
export function placeOf(plan, fault) {
  const where = refOfPath(plan, fault.path);
  const found = where && find(plan, where.ref);
  if (!where || !found) return null;
  const points = pointsOf(found.kind, found.thing);
  if (!points.length) return null;
  if (where.vertex !== null && points[where.vertex]) return { ...where, at: points[where.vertex] };
  const cross = KINDS[found.kind].shape === 'ring' ? selfCrossings(points)[0] : null;
  if (cross) return { ...where, at: cross.at };
  return { ...where, at: points.length > 2 ? labelPlace(points) : points[0] };
}
