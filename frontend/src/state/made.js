// @ts-check
/** New things with figures that are a fair start, and new plots that can be finished. */
import { defaultRidge } from '../geometry/roof.js';
import { add, freshId, freshName, nextDatumName } from './edits.js';

/** @typedef {import('./types.js').Plan} Plan */
/** @typedef {number[]} Point */

/** Kept distances taken when a line says nothing else, metres (contract of the plan format). */
export const KEPT = {
  telephone: 0.6,
  'low-voltage': 3.05,
  'medium-voltage': 3.05,
  'high-voltage': 6.1,
  unknown: 6.1,
};

/** @type {Record<string, {stem: string, name: string, rest: (points: Point[], variant?: string) => any}>} */
const MAKERS = {
  buildings: {
    stem: 'building', name: 'Building',
    rest: (footprint) => ({
      footprint, eaves: 2.5, ridge: 4, roof: 'gable', ridgeLine: defaultRidge(footprint, 'gable') ?? [], metalRoof: false,
    }),
  },
  supports: {
    stem: 'support', name: 'Mast',
    rest: ([at], variant) => ({ at, accuracy: 0.3, sway: 0, ...SUPPORTS[variant ?? 'mast'] }),
  },
  trees: { stem: 'tree', name: 'Tree', rest: ([at]) => ({ at, canopy: { radius: 2.5, from: 2, to: 8 } }) },
  bracketLines: { stem: 'bracket-line', name: 'Bracket line', rest: (path) => ({ path, lowest: 2.3, highest: 2.5 }) },
  mastZones: { stem: 'mast-zone', name: 'Mast zone', rest: (area) => ({ area, base: 0, highest: 8, guyRadius: 2 }) },
  overheadLines: {
    stem: 'overhead-line', name: 'Overhead line', rest: (path) => ({ path, kind: 'unknown', clearance: KEPT.unknown }),
  },
  zones: { stem: 'zone', name: 'Zone', rest: (area) => ({ area, rule: 'no-mast' }) },
  people: { stem: 'people', name: 'Place for people', rest: (area) => ({ area, from: 0, to: 2.5 }) },
  metalwork: { stem: 'metalwork', name: 'Metalwork', rest: (path) => ({ path, radius: 0.02 }) },
  noise: { stem: 'noise', name: 'Noise source', rest: ([at]) => ({ at }) },
};

/** @type {Record<string, any>} */
const SUPPORTS = {
  tree: { kind: 'tree', lowest: 3, highest: 7, accuracy: 0.5, sway: 0.5, canopy: { radius: 3, from: 2.5, to: 10 } },
  mast: { kind: 'mast', lowest: 3, highest: 8 },
  pole: { kind: 'pole', lowest: 2, highest: 6 },
  chimney: { kind: 'chimney', lowest: 7, highest: 8 },
  wall: { kind: 'wall', lowest: 3, highest: 5 },
  other: { kind: 'other', lowest: 2, highest: 5 },
};

/** @type {Record<string, string>} */
const SUPPORT_NAMES = { tree: 'Tree', mast: 'Mast', pole: 'Pole', chimney: 'Chimney', wall: 'Wall', other: 'Support' };

/**
 * Adds a thing of a kind with sensible figures, its own id and name.
 * @param {Plan} plan @param {string} kind @param {Point[]} points with heights where the kind has them
 * @param {string} [variant] kind of support
 * @returns {{plan: Plan, ref: string}}
 */
export function make(plan, kind, points, variant) {
  // Rules of the old sides do not fit the new ones.
  if (kind === 'boundary') return add({ ...plan, boundaryRules: [] }, kind, points);
  if (kind === 'entry') return add(plan, kind, { at: points[0], height: plan.entry?.height ?? 1.2 });
  if (kind === 'datums') return add(plan, kind, { name: nextDatumName(plan), at: points[0] });
  if (kind === 'spots') return add(plan, kind, [points[0][0], points[0][1], points[0][2] ?? 0]);
  const maker = MAKERS[kind];
  const name = kind === 'supports' ? SUPPORT_NAMES[variant ?? 'mast'] : maker.name;
  const thing = {
    id: freshId(plan, kind === 'supports' ? (variant ?? 'mast') : maker.stem),
    name: freshName(plan, kind, name),
    ...maker.rest(points, variant),
  };
  return add(plan, kind, thing);
}

/** @param {string} kind of support @returns {any} the figures a support of this kind starts with */
export const supportStart = (kind) => SUPPORTS[kind] ?? SUPPORTS.other;

/** @param {string} [title] @returns {Plan} an empty plot whose brief is already enough for a search */
export function newPlan(title = 'New plot') {
  return {
    format: 'spanwright-plan/1',
    title,
    notes: '',
    site: { planNorth: 0, magneticVariation: 0, ground: { permittivity: 13, conductivity: 0.005 } },
    boundary: [],
    boundaryRules: [],
    buildings: [], supports: [], trees: [], bracketLines: [], mastZones: [], overheadLines: [],
    zones: [], people: [], noise: [], metalwork: [], datums: [],
    brief: {
      bands: [
        { name: '40 m', frequencies: [7.05, 7.1, 7.175], weight: 1, receiveOnly: false },
        { name: '20 m', frequencies: [14.05, 14.175, 14.3], weight: 1, receiveOnly: false },
        { name: '15 m', frequencies: [21.05, 21.225, 21.4], weight: 0.7, receiveOnly: false },
      ],
      targets: [{ name: 'Around home', nearVerticalKm: 500, weight: 1, bands: ['40 m'] },
        { name: 'Far off', bearing: 270, distanceKm: 5000, weight: 1, bands: ['20 m', '15 m'] }],
      power: 100,
      duty: 0.5,
      lineLengths: 'free',
      newMasts: 1,
      rules: { overrides: {}, wind: 25, ice: 0 },
    },
  };
}

/**
 * Sets a figure that others follow: a roof's form brings its ridge, an overhead line's kind its kept
 * distance, a support's kind its crown, a zone's rule its height.
 * @param {any} thing @param {string} kind of thing @param {string} path @param {any} value
 * @returns {any} the thing with the figure and what follows it, or null where nothing follows
 */
export function withFollowing(thing, kind, path, value) {
  if (kind === 'buildings' && path === 'roof') {
    const ridge = value === 'flat' ? thing.eaves : thing.ridge > thing.eaves ? thing.ridge : thing.eaves + 1.5;
    return { ...thing, roof: value, ridge, ridgeLine: defaultRidge(thing.footprint, value) ?? [] };
  }
  if (kind === 'buildings' && path === 'eaves' && thing.roof === 'flat') {
    return { ...thing, eaves: value, ridge: value };
  }
  if (kind === 'overheadLines' && path === 'kind') {
    return { ...thing, kind: value, clearance: KEPT[/** @type {'unknown'} */ (value)] };
  }
  if (kind === 'supports' && path === 'kind') {
    const fresh = thing.canopy || value !== 'tree' ? {} : { canopy: SUPPORTS.tree.canopy };
    const own = Object.values(SUPPORT_NAMES).find((name) => new RegExp(`^${name}( \\d+)?$`).test(thing.name ?? ''));
    const name = own ? { name: thing.name.replace(own, SUPPORT_NAMES[value]) } : {};
    const { canopy: _crown, ...bare } = thing;
    return value === 'tree' ? { ...thing, ...name, kind: value, ...fresh } : { ...bare, ...name, kind: value };
  }
  if (kind === 'supports' && path === 'canopy') {
    const { canopy: _gone, ...bare } = thing;
    return value ? { ...thing, canopy: { ...SUPPORTS.tree.canopy } } : bare;
  }
  if (kind === 'zones' && path === 'rule') {
    const { height, ...bare } = thing;
    return value === 'headroom' ? { ...bare, rule: value, height: height ?? 5 } : { ...bare, rule: value };
  }
  return null;
}

/** A ridge turned to run the other way of its building. @param {any} building @returns {any} */
export function ridgeTurned(building) {
  const { footprint, roof } = building;
  const [a, b] = building.ridgeLine ?? [];
  if (!a || !b) return { ...building, ridgeLine: defaultRidge(footprint, roof) ?? [] };
  // The longest wall that runs rather across the ridge than along it.
  let beside = -1;
  let longest = 0;
  footprint.forEach((/** @type {Point} */ p, /** @type {number} */ i) => {
    const q = footprint[(i + 1) % footprint.length];
    const length = Math.hypot(q[0] - p[0], q[1] - p[1]);
    const along = Math.abs((q[0] - p[0]) * (b[0] - a[0]) + (q[1] - p[1]) * (b[1] - a[1]));
    if (length > longest + 1e-6 && along < 0.5 * length * Math.hypot(b[0] - a[0], b[1] - a[1])) {
      beside = i;
      longest = length;
    }
  });
  if (beside < 0) return building;
  return { ...building, ridgeLine: defaultRidge(footprint, roof, beside) ?? building.ridgeLine };
}
