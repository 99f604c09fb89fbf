// @ts-check
import { worst } from '../charts/marks.js';
import { number, signed } from '../units/figures.js';
import { distanceFigure } from '../units/length.js';

/**
 * What the panels say of a placement, read from its result element and the plan it was found on. Pure.
 *
 * @typedef {import('../state/types.js').State} State
 * @typedef {{name: string, over: number, state: string}} BandSummary over the reference, dB, and how it matches
 * @typedef {{state: string, distance: number|null, words: string, rule: string}} Concern
 * @typedef {import('../units/length.js').Sense} Sense
 * @typedef {(metres: number, sense?: Sense) => string} Length
 */

/**
 * @param {State} state
 * @returns {any[]} the placements to list, best first: the result's, or those found so far
 */
export function listOf(state) {
  const { result, found } = state.search;
  if (result) return result.placements;
  return [...found].sort(bestFirst);
}

/**
 * @param {any} placement
 * @returns {string[]} why its radio figures are not to be relied on; empty when nothing says so
 */
export function doubtsOf(placement) {
  return placement.quality?.doubts ?? [];
}

/**
 * What is doubtful comes after everything that is not.
 * @param {any} a
 * @param {any} b
 * @returns {number}
 */
export function doubtfulLast(a, b) {
  return Number(doubtsOf(a).length > 0) - Number(doubtsOf(b).length > 0);
}

/**
 * @param {any} a
 * @param {any} b
 * @returns {number}
 */
export function bestFirst(a, b) {
  return doubtfulLast(a, b) || b.score - a.score;
}

/**
 * @param {State} state
 * @returns {any[]} placements moved by hand or cured, the newest first
 */
export function ownOf(state) {
  return /** @type {any} */ (state.search).own ?? [];
}

/**
 * @param {State} state
 * @param {string|null} [id]
 * @returns {any|null} the chosen placement, or the one with this id
 */
export function placementOf(state, id = state.chosen) {
  if (id === null) return null;
  return [...listOf(state), ...ownOf(state)].find((placement) => placement.id === id) ?? null;
}

/**
 * The plan that a placement's figures belong to.
 * @param {State} state
 * @returns {any}
 */
export function planOf(state) {
  return state.search.planAtSearch ?? state.plan;
}

/** @param {State} state @returns {boolean} whether the plan is another one than was searched */
export function isStale(state) {
  return state.search.planAtSearch !== null && state.search.planAtSearch !== state.plan;
}

const KINDS = [
  'supports',
  'mastZones',
  'bracketLines',
  'buildings',
  'trees',
  'overheadLines',
  'zones',
  'people',
  'noise',
  'metalwork',
];

/**
 * @param {any} plan
 * @param {string} id
 * @returns {string} the name the user gave it, else its id in plain words
 */
export function nameOf(plan, id) {
  for (const kind of KINDS) {
    const thing = (plan[kind] ?? []).find((/** @type {any} */ one) => one.id === id);
    if (thing) return thing.name || words(id);
  }
  if (id === 'ground') return 'the ground';
  if (id === 'boundary') return 'the boundary';
  return words(id);
}

/** @param {string} id */
const words = (id) => id.replace(/[-_]+/g, ' ');

/** @param {any} plan @param {string} id */
const isMastZone = (plan, id) => (plan.mastZones ?? []).some((/** @type {any} */ zone) => zone.id === id);

/**
 * What the placement hangs on, in order along the wire.
 * @param {any} plan
 * @param {any} placement
 * @returns {string[]} "Front oak", "new mast in Rear yard"
 */
export function hangsOn(plan, placement) {
  return placement.attachments.map((/** @type {any} */ hold) =>
    isMastZone(plan, hold.on) ? `new mast (${nameOf(plan, hold.on)})` : nameOf(plan, hold.on),
  );
}

/** @param {any} placement @returns {number} metres */
export function wireLength(placement) {
  return placement.conductors.reduce((/** @type {number} */ sum, /** @type {any} */ one) => sum + one.length, 0);
}

/** @param {any} placement @returns {string} "new: 1 mast, 2 ropes"; guys go with their mast */
export function toBuild(placement) {
  const ropes = placement.ropes.filter((/** @type {any} */ rope) => rope.what === 'tail').length;
  const masts = placement.masts.length;
  const some = (/** @type {number} */ number, /** @type {string} */ one) =>
    `${number} ${one}${number === 1 ? '' : 's'}`;
  if (masts) return `new: ${some(masts, 'mast')}, ${some(ropes, 'rope')}`;
  return ropes ? `no mast; ${some(ropes, 'rope')}` : 'nothing new';
}

/**
 * @param {any[]} rows of one band
 * @returns {any} the one the rose and profiles belong to, else the middle one
 */
export function middleRow(rows) {
  return rows.find((row) => row.rose) ?? rows[Math.floor(rows.length / 2)];
}

/**
 * @param {any} placement
 * @returns {{name: string, rows: any[], middle: any}[]} bands in the order of the brief
 */
export function bandsOf(placement) {
  /** @type {Map<string, any[]>} */
  const byName = new Map();
  for (const row of placement.bands) {
    const rows = byName.get(row.name);
    if (rows) rows.push(row);
    else byName.set(row.name, [row]);
  }
  return [...byName].map(([name, rows]) => ({ name, rows, middle: middleRow(rows) }));
}

/**
 * @param {any} plan
 * @param {any} placement
 * @returns {BandSummary[]} for each band, its targets' weighted mean on the middle frequency
 */
export function bandSummaries(plan, placement) {
  return bandsOf(placement).map(({ name, rows, middle }) => {
    const weightOf = (/** @type {string} */ target) =>
      (plan.brief?.targets ?? []).find((/** @type {any} */ one) => one.name === target)?.weight ?? 1;
    let [sum, weights] = [0, 0];
    for (const target of middle.targets) {
      const weight = weightOf(target.name);
      sum += weight * (target.deliveredDbi - target.referenceDbi);
      weights += weight;
    }
    const state = worst(rows.map((/** @type {any} */ row) => row.matching.state));
    return { name, over: weights > 0 ? sum / weights : 0, state };
  });
}

/** @type {Record<string, number>} */
const RANK = { foul: 0, tight: 1, clear: 2 };

/**
 * The worst distance or pull, for where there is room for one.
 * @param {any} plan
 * @param {any} placement
 * @param {Length} length
 * @returns {Concern|undefined}
 */
export function nearestConcern(plan, placement, length) {
  return hangingConcerns(plan, placement, length)[0];
}

/**
 * Distances and pulls, worst first.
 * @param {any} plan
 * @param {any} placement
 * @param {Length} length
 * @returns {Concern[]}
 */
function hangingConcerns(plan, placement, length) {
  const clearances = placement.clearances.map((/** @type {any} */ one) => clearanceConcern(plan, one, length));
  const pulls = placement.attachments
    .filter((/** @type {any} */ hold) => hold.state !== 'clear')
    .map((/** @type {any} */ hold) => ({
      state: hold.state,
      distance: null,
      rule: 'pull',
      words: `pull of ${pullFigure(hold.pullInWind)} N at ${nameOf(plan, hold.on)} in the gust; it may take ${Math.round(hold.pullLimit)} N`,
    }));
  return [...clearances, ...pulls].sort((a, b) => RANK[a.state] - RANK[b.state]);
}

/**
 * Everything checked that is tight or foul, worst first; when all is clear, the nearest clearance alone.
 * @param {any} plan
 * @param {any} placement
 * @param {Length} length
 * @returns {Concern[]}
 */
export function concerns(plan, placement, length) {
  const hanging = hangingConcerns(plan, placement, length);
  const matching = bandsOf(placement).flatMap(({ name, rows }) => {
    const bad = rows.find((row) => row.matching.state === 'foul') ?? rows.find((row) => row.matching.state === 'tight');
    return bad
      ? [
          {
            state: bad.matching.state,
            distance: null,
            rule: 'matching',
            words: `matching on ${name}: ${bad.matching.why}`,
          },
        ]
      : [];
  });
  const bad = [...hanging, ...matching]
    .filter((one) => one.state !== 'clear')
    .sort((a, b) => RANK[a.state] - RANK[b.state]);
  return bad.length ? bad : hanging.slice(0, 1);
}

/**
 * @param {any} plan
 * @param {any} clearance
 * @param {Length} length
 * @returns {Concern}
 */
export function clearanceConcern(plan, clearance, length) {
  const part = clearance.what && clearance.what !== 'wire' ? `, ${clearance.what}` : '';
  return {
    state: clearance.state,
    distance: clearance.distance,
    rule: clearance.rule,
    words: `${clearance.distance < 0 ? `${length(-clearance.distance, 'required')} inside` : `${length(clearance.distance, 'found')} to`} ${nameOf(plan, clearance.to)}${part}; must keep ${length(clearance.required, 'required')}`,
  };
}

/**
 * @param {number} score decibels over the reference
 * @returns {string} the headline
 */
export function scoreWords(score) {
  return score < 0 ? `${number(-score, 1)} dB below the reference` : `${signed(score, 1)} dB over the reference`;
}

/** @param {number} newtons @returns {string} a pull, never less than it is, as on the sheet */
export const pullFigure = (newtons) => number(Math.ceil(newtons), 0);

/**
 * A distance held against a rule, in a sentence.
 * @param {number} metres
 * @param {'m'|'ft'} units
 * @param {Sense} [sense] found where left out
 * @returns {string} with its unit
 */
export function distanceWords(metres, units, sense) {
  const figure = distanceFigure(metres, units, sense);
  return units === 'm' ? `${figure} m` : figure;
}

/**
 * Names of shapes as they begin a sentence.
 * @param {string} shape
 */
export function shapeTitle(shape) {
  const title = shape === 'inverted-l' ? 'inverted L' : shape === 'drooping' ? 'drooping ends' : shape;
  return title.charAt(0).toUpperCase() + title.slice(1);
}

/**
 * @param {State} state
 * @param {any} placement
 * @returns {string} "Placement 2", "Cured", "Moved from 2"
 */
export function placementTitle(state, placement) {
  if (placement.madeFrom) return placement.madeFrom;
  const index = listOf(state).findIndex((one) => one.id === placement.id);
  return `Placement ${placement.rank || index + 1}`;
}
