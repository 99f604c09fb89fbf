// @ts-check
/** Edits of a plan as pure functions: plan in, another plan out; nothing is changed in place. */
import { defaultRidge } from '../geometry/roof.js';
import { distance, moved, tidyPoint } from '../geometry/vector.js';
import { find, KINDS, listOf, nameOf, partsOf, pointsOf, refOf, withPoints } from './kinds.js';

/** @typedef {import('./types.js').Plan} Plan */
/** @typedef {number[]} Point */

/** @param {Plan} plan @param {string} kind @param {any[]} list @returns {Plan} */
function withList(plan, kind, list) {
  if (kind === 'boundary') return { ...plan, boundary: list[0] ?? [], ...(list[0] ? {} : { boundaryRules: [] }) };
  if (kind === 'entry') {
    if (list[0]) return { ...plan, entry: list[0] };
    const { entry: _gone, ...rest } = plan;
    return rest;
  }
  if (kind === 'spots') {
    const { terrain: _gone, ...site } = plan.site ?? {};
    return { ...plan, site: list.length ? { ...site, terrain: { spots: list } } : site };
  }
  return { ...plan, [kind]: list };
}

/** @param {Plan} plan @param {string} ref @param {(thing: any) => any} change @returns {Plan} */
export function changeThing(plan, ref, change) {
  const found = find(plan, ref);
  if (!found) return plan;
  const next = change(found.thing);
  if (next === found.thing) return plan;
  const list = [...listOf(plan, found.kind)];
  list[found.index] = next;
  return withList(plan, found.kind, list);
}

/** @param {Plan} plan @param {string} ref @param {string} field may be `canopy.radius` @param {any} value undefined takes the field away @returns {Plan} */
export const setField = (plan, ref, field, value) =>
  changeThing(plan, ref, (thing) => withField(thing, field.split('.'), value));

/** @param {any} thing @param {string[]} path @param {any} value @returns {any} */
export function withField(thing, path, value) {
  const [head, ...rest] = path;
  if (rest.length) return { ...thing, [head]: withField(thing?.[head] ?? {}, rest, value) };
  if (Object.is(thing?.[head], value)) return thing;
  const next = { ...thing, [head]: value };
  if (value === undefined) delete next[head];
  return next;
}

/** @param {Plan} plan @param {string} kind @param {any} thing @returns {{plan: Plan, ref: string}} */
export function add(plan, kind, thing) {
  const { kept } = KINDS[kind];
  const list = kept === 'single' ? [thing] : [...listOf(plan, kind), thing];
  const id = kept === 'list' ? thing.id : kept === 'index' ? list.length - 1 : '';
  return { plan: withList(plan, kind, list), ref: refOf(kind, id) };
}

/** @param {Plan} plan @param {string} ref @returns {Plan} */
export function remove(plan, ref) {
  const found = find(plan, ref);
  if (!found) return plan;
  return withList(plan, found.kind, listOf(plan, found.kind).filter((_, i) => i !== found.index));
}

/** @param {Plan} plan @param {string} ref @param {number} dx @param {number} dy @returns {Plan} */
export function moveThing(plan, ref, dx, dy) {
  if (!dx && !dy) return plan;
  const { kind } = partsOf(ref);
  return changeThing(plan, ref, (thing) => {
    const shifted = pointsOf(kind, thing).map((p) => tidyPoint(moved(p, dx, dy)));
    const next = withPoints(kind, thing, shifted);
    if (!thing.ridgeLine?.length) return next;
    return { ...next, ridgeLine: thing.ridgeLine.map((/** @type {Point} */ p) => tidyPoint(moved(p, dx, dy))) };
  });
}

/** @param {Plan} plan @param {string} ref @param {number} vertex @param {Point} at keeps the height the corner has unless a third number is given @returns {Plan} */
export function moveVertex(plan, ref, vertex, at) {
  const { kind } = partsOf(ref);
  return changeThing(plan, ref, (thing) => {
    const points = pointsOf(kind, thing);
    const old = points[vertex];
    if (!old) return thing;
    const next = tidyPoint([at[0], at[1], ...(at.length > 2 ? at.slice(2) : old.slice(2))]);
    if (next.every((value, i) => value === old[i])) return thing;
    return ridgeFollows(thing, withPoints(kind, thing, points.map((p, i) => (i === vertex ? next : p))), old, next);
  });
}

/**
 * A ridge that was the footprint's own default stays so; else its ends on a moved corner go with it.
 * @param {any} before @param {any} after @param {Point} [old] @param {Point} [next]
 */
function ridgeFollows(before, after, old, next) {
  if (before.ridgeLine?.length !== 2 || !before.footprint) return after;
  for (const beside of [undefined, ...before.footprint.keys()]) {
    const own = defaultRidge(before.footprint, before.roof, beside);
    if (!own || !sameLine(own, before.ridgeLine)) continue;
    const keep = beside === undefined || before.footprint.length === after.footprint.length;
    return { ...after, ridgeLine: defaultRidge(after.footprint, before.roof, keep ? beside : undefined) ?? [] };
  }
  if (!old || !next) return after;
  const line = before.ridgeLine.map((/** @type {Point} */ p) => (distance(p, old) < 1e-3 ? next.slice(0, 2) : p));
  return { ...after, ridgeLine: line };
}

/** @param {Point[]} a @param {Point[]} b */
const sameLine = (a, b) =>
  (distance(a[0], b[0]) < 2e-3 && distance(a[1], b[1]) < 2e-3) ||
  (distance(a[0], b[1]) < 2e-3 && distance(a[1], b[0]) < 2e-3);

/** @param {Plan} plan @param {string} ref @param {number} edge the new corner comes after this one @param {Point} at @returns {Plan} */
export function insertVertex(plan, ref, edge, at) {
  const { kind } = partsOf(ref);
  const next = changeThing(plan, ref, (thing) => {
    const points = pointsOf(kind, thing);
    const a = points[edge];
    const b = points[(edge + 1) % points.length];
    const height = KINDS[kind].heights ? [tidyPoint([((a[2] ?? 0) + (b[2] ?? 0)) / 2])[0]] : [];
    const corner = tidyPoint([at[0], at[1], ...height]);
    return ridgeFollows(thing, withPoints(kind, thing, [...points.slice(0, edge + 1), corner, ...points.slice(edge + 1)]));
  });
  return kind === 'boundary' ? shiftRules(next, edge, 1) : next;
}

/** @param {Plan} plan @param {string} ref @param {number} vertex @returns {Plan} unchanged when the thing needs every point it has */
export function removeVertex(plan, ref, vertex) {
  const found = find(plan, ref);
  if (!found) return plan;
  const points = pointsOf(found.kind, found.thing);
  if (points.length <= KINDS[found.kind].least) return plan;
  const next = changeThing(plan, ref, (thing) =>
    ridgeFollows(thing, withPoints(found.kind, thing, points.filter((_, i) => i !== vertex))),
  );
  return found.kind === 'boundary' ? shiftRules(next, vertex, -1) : next;
}

/** Keeps each rule with its edge when a corner comes or goes. @param {Plan} plan @param {number} edge @param {1|-1} by */
function shiftRules(plan, edge, by) {
  const rules = plan.boundaryRules ?? [];
  if (!rules.length) return plan;
  const kept = by < 0 ? rules.filter((/** @type {any} */ r) => r.edge !== edge) : rules;
  const next = kept.map((/** @type {any} */ r) => (r.edge > edge ? { ...r, edge: r.edge + by } : r));
  return { ...plan, boundaryRules: next };
}

/** @param {Plan} plan @param {number} edge @param {{overhang: string, agreedBy?: string}} rule overhang `none` takes it away @returns {Plan} */
export function setBoundaryRule(plan, edge, rule) {
  const others = (plan.boundaryRules ?? []).filter((/** @type {any} */ r) => r.edge !== edge);
  const next = rule.overhang === 'none' ? others : [...others, { edge, ...rule }];
  next.sort((/** @type {any} */ a, /** @type {any} */ b) => a.edge - b.edge);
  return { ...plan, boundaryRules: next };
}

/** @param {Plan} plan @returns {Set<string>} every id in use */
function idsOf(plan) {
  const ids = new Set();
  for (const [kind, { kept }] of Object.entries(KINDS)) {
    if (kept === 'list') for (const thing of listOf(plan, kind)) ids.add(thing.id);
  }
  return ids;
}

/** @param {Plan} plan @param {string} stem @returns {string} `stem-1`, `stem-2` …, free in this plan */
export function freshId(plan, stem) {
  const ids = idsOf(plan);
  let n = 1;
  while (ids.has(`${stem}-${n}`)) n += 1;
  return `${stem}-${n}`;
}

/** @param {Plan} plan @param {string} kind @param {string} stem @returns {string} the stem itself, or with a number no other of the kind has */
export function freshName(plan, kind, stem) {
  const names = new Set(listOf(plan, kind).map((thing, i) => nameOf(kind, thing, i).toLowerCase()));
  if (!names.has(stem.toLowerCase())) return stem;
  let n = 2;
  while (names.has(`${stem} ${n}`.toLowerCase())) n += 1;
  return `${stem} ${n}`;
}

/** @param {Plan} plan @param {string} ref @returns {{plan: Plan, ref: string}|null} a copy a metre to the south-east; null where there can be only one */
export function duplicate(plan, ref) {
  const found = find(plan, ref);
  if (!found || KINDS[found.kind].kept === 'single') return null;
  let copy = structuredClone(found.thing);
  if (KINDS[found.kind].kept === 'list') {
    copy.id = freshId(plan, String(copy.id).replace(/-\d+$/, ''));
    copy.name = freshName(plan, found.kind, nameOf(found.kind, found.thing, found.index).replace(/ \d+$/, ''));
  } else if (found.kind === 'datums') {
    copy.name = nextDatumName(plan);
  }
  const added = add(plan, found.kind, copy);
  return { plan: moveThing(added.plan, added.ref, 1, -1), ref: added.ref };
}

/** @param {Plan} plan @returns {string} A, B … Z, then D27 … */
export function nextDatumName(plan) {
  const names = new Set(listOf(plan, 'datums').map((d) => d.name));
  for (const letter of 'ABCDEFGHIJKLMNOPQRSTUVWXYZ') if (!names.has(letter)) return letter;
  return `D${names.size + 1}`;
}
