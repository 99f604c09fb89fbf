// @ts-check
/** What the survey holds and still lacks: the rows of "On this plot". */
import { area } from '../geometry/polygon.js';
import { listOf, refOfPath } from './kinds.js';

/** @typedef {import('./types.js').Plan} Plan */
/** @typedef {import('./types.js').Fault} Fault */
/**
 * @typedef {object} Row
 * @property {string} what
 * @property {string} held in words
 * @property {'held'|'lacks'|'fault'|'may'} state `may`: can be left out
 * @property {string} tool the tool that adds one
 * @property {number} faults
 */

/** @param {number} n @param {string} one @param {string} [many] */
const count = (n, one, many = `${one}s`) => `${n} ${n === 1 ? one : many}`;

/**
 * @param {Plan} plan
 * @param {Fault[]} faults
 * @param {(metres: number) => string} length as text with its unit
 * @returns {Row[]}
 */
export function ledger(plan, faults, length) {
  const n = (/** @type {string} */ kind) => listOf(plan, kind).length;
  /** @type {Record<string, number>} */
  const bad = {};
  for (const fault of faults) {
    const kind = refOfPath(plan, fault.path)?.ref.split('/')[0];
    if (kind && listOf(plan, kind).length) bad[kind] = (bad[kind] ?? 0) + 1;
  }
  /** @param {string} what @param {string} held @param {boolean} enough @param {boolean} needed @param {string} tool @param {string[]} kinds @returns {Row} */
  const row = (what, held, enough, needed, tool, kinds) => {
    const wrong = kinds.reduce((sum, kind) => sum + (bad[kind] ?? 0), 0);
    return { what, held, tool, faults: wrong, state: wrong ? 'fault' : enough ? 'held' : needed ? 'lacks' : 'may' };
  };
  const places = n('supports') + n('bracketLines') + n('mastZones');
  const tallest = Math.max(0, ...listOf(plan, 'supports').map((s) => s.highest ?? 0));
  const corners = plan.boundary?.length ?? 0;
  return [
    row('Boundary', corners ? count(corners, 'corner') : 'to draw first', corners > 2, true, 'boundary', ['boundary']),
    row('Buildings', n('buildings') ? count(n('buildings'), 'building') : 'none drawn', n('buildings') > 0, false, 'buildings', ['buildings']),
    row('Supports', n('supports') ? `${n('supports')}, tallest ${length(tallest)}` : placesLack(places), n('supports') > 0 && places > 1, places < 2, 'supports', ['supports']),
    row('Places for masts', mastWords(n('mastZones'), n('bracketLines')), n('mastZones') + n('bracketLines') > 0, false, 'mastZones', ['mastZones', 'bracketLines']),
    row('Overhead lines', n('overheadLines') ? `${n('overheadLines')}, with heights` : 'none drawn: look up', n('overheadLines') > 0, false, 'overheadLines', ['overheadLines']),
    row('Station entry', plan.entry ? `${length(plan.entry.height ?? 0)} up` : 'where the feed line comes in', Boolean(plan.entry), true, 'entry', ['entry']),
    row('Datums', n('datums') ? listOf(plan, 'datums').map((d) => d.name).join(', ') : 'two, to set out from', n('datums') > 1, false, 'datums', ['datums']),
    row('Ground', groundWords(plan), true, false, 'site', ['spots']),
  ];
}

/** @param {number} places */
const placesLack = (places) => (places ? 'none drawn' : 'two places to hang a wire');

/** @param {number} zones @param {number} lines */
function mastWords(zones, lines) {
  const words = [];
  if (zones) words.push(count(zones, 'zone'));
  if (lines) words.push(count(lines, 'bracket line'));
  return words.join(', ') || 'none drawn';
}

/** @param {Plan} plan */
function groundWords(plan) {
  const ground = plan.site?.ground ?? { permittivity: 13, conductivity: 0.005 };
  const spots = listOf(plan, 'spots').length;
  return `${ground.permittivity}, ${ground.conductivity} S/m${spots ? `, ${count(spots, 'spot')}` : ', level'}`;
}

/** @param {Plan} plan @returns {number} m² inside the boundary */
export const plotArea = (plan) => ((plan.boundary?.length ?? 0) > 2 ? area(plan.boundary) : 0);

/**
 * The one sentence that names the next step, or null when the plot can be searched.
 * @param {Plan} plan @param {Fault[]} faults
 * @returns {string|null}
 */
export function nextStep(plan, faults) {
  if ((plan.boundary?.length ?? 0) < 3) {
    return 'Begin with the boundary: take its tool, click the first corner, type the length of the first side and press Enter.';
  }
  const places = listOf(plan, 'supports').length + listOf(plan, 'bracketLines').length + listOf(plan, 'mastZones').length;
  if (!listOf(plan, 'buildings').length && places === 0) return 'Next the house: walk round it with the building tool.';
  if (places < 2) {
    return places
      ? 'One more place to hang a wire: a support (a strong tree is one too), a bracket line, or a zone where a mast may stand.'
      : 'Two places to hang a wire: supports (a strong tree is one too), a bracket line, or a zone where a mast may stand.';
  }
  if (!plan.entry) return 'Show where the feed line comes into the station.';
  if (faults.length) return 'Mend what is marked, then the plot can be searched.';
  return null;
}
