// @ts-check
/** Things of a plan in words: short for the drawing, full for people who listen to it. */
import { keptDistance } from './kinds/kept.js';
import { area, walls } from '../geometry/polygon.js';
import { pathLength } from '../geometry/line.js';
import { area as areaText, formatLength, lengthWithUnit } from '../units/length.js';
import { KINDS, nameOf, pointsOf } from '../state/kinds.js';

/** @typedef {'m'|'ft'} Units */

/** @param {number} a @param {number} b @param {Units} units @returns {string} "4.0–9.5" or "13′–31′ 2″" */
export const span = (a, b, units) =>
  a === b ? formatLength(a, units) : `${formatLength(a, units)}–${formatLength(b, units)}`;

/** @type {Record<string, string>} */
export const LINE_WORDS = {
  telephone: 'telephone',
  'low-voltage': 'low-voltage',
  'medium-voltage': 'medium-voltage',
  'high-voltage': 'high-voltage',
  unknown: 'kind not known',
};

/** @param {any} zone @param {Units} units @returns {string} */
export const ruleWords = (zone, units) =>
  zone.rule === 'headroom'
    ? `headroom ${formatLength(zone.height ?? 0, units)}`
    : zone.rule === 'no-wire'
      ? 'no wire'
      : 'no mast';

/** @param {string} kind @param {any} thing @param {Units} units @returns {string} its figures in a few words */
export function shortFigures(kind, thing, units) {
  const f = (/** @type {number} */ v) => lengthWithUnit(v, units);
  switch (kind) {
    case 'boundary':
      return `${thing.length} corners, ${areaText(area(thing), units)}`;
    case 'buildings':
      return `${thing.roof} roof, eaves ${f(thing.eaves)}${thing.ridge > thing.eaves ? `, ridge ${f(thing.ridge)}` : ''}`;
    case 'supports':
      return `${thing.kind}, ${thing.kind === 'tree' ? 'rope' : 'fixing'} from ${f(thing.lowest)} to ${f(thing.highest)}${thing.ropeOnly ? ', rope only' : ''}`;
    case 'trees':
      return `crown ${f(thing.canopy?.radius ?? 0)} about it, from ${f(thing.canopy?.from ?? 0)} to ${f(thing.canopy?.to ?? 0)}`;
    case 'bracketLines':
      return `${f(pathLength(thing.path ?? []))} long, fixing from ${f(thing.lowest)} to ${f(thing.highest)}`;
    case 'mastZones':
      return `masts to ${f(thing.highest)}${thing.guyRadius ? `, guys ${f(thing.guyRadius)} out` : ''}`;
    case 'overheadLines': {
      const z = (thing.path ?? []).map((/** @type {number[]} */ p) => p[2] ?? 0);
      return `${LINE_WORDS[thing.kind] ?? thing.kind}, ${f(Math.min(...z))} to ${f(Math.max(...z))} up, kept distance ${f(keptDistance(thing))}`;
    }
    case 'zones':
      return thing.rule === 'headroom' ? `headroom ${f(thing.height ?? 0)}` : ruleWords(thing, units);
    case 'people':
      return `from ${f(thing.from ?? 0)} to ${f(thing.to ?? 0)} above the ground`;
    case 'metalwork':
      return `${f(pathLength(thing.path ?? []))} long, ${f(thing.path?.[0]?.[2] ?? 0)} up`;
    case 'entry':
      return `${f(thing.height ?? 0)} up`;
    case 'spots':
      return `${f(thing[2])} above the plan's zero`;
    default:
      return thing.note ?? '';
  }
}

/** @param {string} kind @param {any} thing @param {number} index @param {Units} units @returns {string} all of it as one sentence */
export function spoken(kind, thing, index, units) {
  const points = pointsOf(kind, thing);
  const name = nameOf(kind, thing, index);
  const what = KINDS[kind].one;
  const figures = shortFigures(kind, thing, units);
  const first = points[0];
  const place = first
    ? KINDS[kind].shape === 'point'
      ? `at ${formatLength(first[0], units)} east, ${formatLength(first[1], units)} north`
      : `${points.length} corners`
    : '';
  const opening = name.toLowerCase().startsWith(what) ? name : `${name}, ${what}`;
  return [opening, figures, kind === 'boundary' ? '' : place].filter(Boolean).join(', ');
}

/** @param {number[][]} ring @param {Units} units @returns {string} "16.0 by 7.5 m" for four square corners, else its corners */
export function sizeWords(ring, units) {
  const sides = walls(ring, true);
  if (sides.length === 4 && sides.every((s) => Math.abs((s.turn ?? 0) - 90) < 1)) {
    return `${formatLength(sides[0].length, units)} × ${formatLength(sides[1].length, units)}`;
  }
  return `${ring.length} corners`;
}
