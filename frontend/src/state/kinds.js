// @ts-check
/**
 * The kinds of thing a plan holds, and one way to reach them all: a `ref` is `kind/id`
 * (`supports/oak`), the index where a kind has no ids (`datums/0`, `spots/2`), and nothing after
 * the stroke where there is only one (`boundary/`, `entry/`).
 */

/** @typedef {import('./types.js').Plan} Plan */
/** @typedef {number[]} Point */
/**
 * @typedef {object} Kind
 * @property {string} one what one of them is called, in a sentence
 * @property {'ring'|'path'|'point'} shape
 * @property {string|null} field where its points are; null: it is a list of points itself
 * @property {boolean} heights whether each point carries a height
 * @property {'list'|'index'|'single'} kept
 * @property {number} least points it needs
 */

/** @type {Record<string, Kind>} */
export const KINDS = {
  boundary: { one: 'boundary', shape: 'ring', field: null, heights: false, kept: 'single', least: 3 },
  buildings: { one: 'building', shape: 'ring', field: 'footprint', heights: false, kept: 'list', least: 3 },
  supports: { one: 'support', shape: 'point', field: 'at', heights: false, kept: 'list', least: 1 },
  trees: { one: 'tree', shape: 'point', field: 'at', heights: false, kept: 'list', least: 1 },
  bracketLines: { one: 'bracket line', shape: 'path', field: 'path', heights: false, kept: 'list', least: 2 },
  mastZones: { one: 'mast zone', shape: 'ring', field: 'area', heights: false, kept: 'list', least: 3 },
  overheadLines: { one: 'overhead line', shape: 'path', field: 'path', heights: true, kept: 'list', least: 2 },
  zones: { one: 'zone', shape: 'ring', field: 'area', heights: false, kept: 'list', least: 3 },
  people: { one: 'place for people', shape: 'ring', field: 'area', heights: false, kept: 'list', least: 3 },
  metalwork: { one: 'metalwork', shape: 'path', field: 'path', heights: true, kept: 'list', least: 2 },
  noise: { one: 'noise source', shape: 'point', field: 'at', heights: false, kept: 'list', least: 1 },
  entry: { one: 'station entry', shape: 'point', field: 'at', heights: false, kept: 'single', least: 1 },
  datums: { one: 'datum', shape: 'point', field: 'at', heights: false, kept: 'index', least: 1 },
  spots: { one: 'spot height', shape: 'point', field: null, heights: true, kept: 'index', least: 1 },
};

/** @param {string} kind @param {string|number} [id] @returns {string} */
export const refOf = (kind, id = '') => `${kind}/${id}`;

/** @param {string} ref @returns {{kind: string, id: string}} */
export function partsOf(ref) {
  const cut = ref.indexOf('/');
  return { kind: ref.slice(0, cut), id: ref.slice(cut + 1) };
}

/** @param {Plan} plan @param {string} kind @returns {any[]} what the plan holds of a kind; empty when none */
export function listOf(plan, kind) {
  if (kind === 'spots') return plan.site?.terrain?.spots ?? [];
  if (kind === 'boundary') return plan.boundary?.length ? [plan.boundary] : [];
  if (kind === 'entry') return plan.entry ? [plan.entry] : [];
  return plan[kind] ?? [];
}

/** @param {string} kind @param {any} thing @param {number} index @returns {string} */
export function idOf(kind, thing, index) {
  const { kept } = KINDS[kind];
  return kept === 'list' ? String(thing.id) : kept === 'index' ? String(index) : '';
}

/**
 * @param {Plan} plan @param {string} ref
 * @returns {{kind: string, index: number, thing: any}|null}
 */
export function find(plan, ref) {
  const { kind, id } = partsOf(ref);
  if (!KINDS[kind]) return null;
  const list = listOf(plan, kind);
  const index = list.findIndex((thing, i) => idOf(kind, thing, i) === id);
  return index < 0 ? null : { kind, index, thing: list[index] };
}

/** @param {string} kind @param {any} thing @returns {Point[]} its points in order */
export function pointsOf(kind, thing) {
  const { shape, field } = KINDS[kind];
  if (kind === 'spots') return [thing];
  if (field === null) return thing;
  const value = thing[field];
  if (!value) return [];
  return shape === 'point' ? [value] : value;
}

/** @param {string} kind @param {any} thing @param {Point[]} points @returns {any} the thing with other points */
export function withPoints(kind, thing, points) {
  const { shape, field } = KINDS[kind];
  if (kind === 'spots') return points[0];
  if (field === null) return points;
  return { ...thing, [field]: shape === 'point' ? points[0] : points };
}

/**
 * Everything drawn on a plan.
 * @param {Plan} plan
 * @returns {{ref: string, kind: string, thing: any, index: number}[]}
 */
export function things(plan) {
  return Object.keys(KINDS).flatMap((kind) =>
    listOf(plan, kind).map((thing, index) => ({
      ref: refOf(kind, idOf(kind, thing, index)),
      kind,
      thing,
      index,
    })),
  );
}

/** @param {string} kind @param {any} thing @param {number} index @returns {string} what people call it */
export function nameOf(kind, thing, index) {
  if (kind === 'boundary') return 'Boundary';
  if (kind === 'entry') return 'Station entry';
  if (kind === 'datums') return `Datum ${thing.name || index + 1}`;
  if (kind === 'spots') return `Spot height ${index + 1}`;
  const name = thing.name || thing.id || KINDS[kind].one;
  return String(name).charAt(0).toUpperCase() + String(name).slice(1);
}

/** @param {Plan} plan @returns {Point[]} what a view of the whole plot must show */
export function extentOf(plan) {
  const points = [];
  for (const { kind, thing } of things(plan)) {
    for (const p of pointsOf(kind, thing)) points.push(p);
    const radius = thing.canopy?.radius;
    if (radius && thing.at) {
      const [x, y] = thing.at;
      points.push([x - radius, y - radius], [x + radius, y + radius]);
    }
  }
  const own = plan.boundary ?? [];
  if (own.length < 3) return points;
  // Lines run far off the plot: only what lies near it has to be seen.
  const xs = own.map((/** @type {Point} */ p) => p[0]);
  const ys = own.map((/** @type {Point} */ p) => p[1]);
  const size = Math.max(Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys));
  const far = Math.max(3, size * 0.22);
  const clamp = (/** @type {number} */ v, /** @type {number[]} */ all) =>
    Math.min(Math.max(...all) + far, Math.max(Math.min(...all) - far, v));
  return points.map((p) => [clamp(p[0], xs), clamp(p[1], ys)]);
}

/**
 * The thing that a fault's path speaks of: `buildings[1].footprint[2]`, `/buildings/1/footprint`.
 * @param {Plan} plan @param {string} path
 * @returns {{ref: string, vertex: number|null}|null}
 */
export function refOfPath(plan, path) {
  const parts = path.replace(/^\$/, '').split(/[.[\]/]+/).filter(Boolean);
  let [head, ...rest] = parts;
  if (head === 'site' && rest[0] === 'terrain' && rest[1] === 'spots') {
    head = 'spots';
    rest = rest.slice(2);
  }
  if (head === 'boundaryRules') return { ref: refOf('boundary'), vertex: null };
  const kind = KINDS[head];
  if (!kind) return null;
  if (head === 'boundary') return { ref: refOf('boundary'), vertex: vertexIn(rest[0]) };
  if (head === 'entry') return plan.entry ? { ref: refOf('entry'), vertex: null } : null;
  const index = Number(rest[0]);
  const thing = listOf(plan, head)[index];
  if (!Number.isInteger(index) || thing === undefined) return null;
  const vertex = rest[1] === kind.field && kind.shape !== 'point' ? vertexIn(rest[2]) : null;
  return { ref: refOf(head, idOf(head, thing, index)), vertex };
}

/** @param {string|undefined} text */
const vertexIn = (text) => (text !== undefined && /^\d+$/.test(text) ? Number(text) : null);
