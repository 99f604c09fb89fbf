// @ts-check
/** Areas with a meaning: zones and their rule, mast zones, places for people. */
import { sprinkle } from '../../geometry/figures.js';
import { bounds, contains, labelPlace } from '../../geometry/polygon.js';
import { formatLength } from '../../units/length.js';
import { nameOf } from '../../state/kinds.js';
import { ruleWords, span } from '../words.js';
import { pathOf, svg } from '../svg.js';

/** @typedef {import('./env.js').Env} Env */
/** @typedef {import('./env.js').Drawn} Drawn */
/** @typedef {import('./env.js').Label} Label */

/** @param {any} zone @returns {Drawn} */
export function drawZone(zone) {
  const d = pathOf(zone.area ?? [], true);
  return {
    layer: 'areas',
    nodes: [svg('path', { d, class: 'hit-area' }), svg('path', { d, class: `zone zone-${zone.rule}` })],
  };
}

/** Places for a label in an area: its deepest point, then above and below it, then its corners. @param {number[][]} ring @param {number} px */
function placesIn(ring, px) {
  const at = labelPlace(ring);
  const box = bounds(ring);
  const more = box
    ? [
        [at[0], at[1] + 18 * px], [at[0], at[1] - 18 * px],
        [box.x + box.width * 0.25, at[1]], [box.x + box.width * 0.75, at[1]],
        [box.x + box.width * 0.3, box.y + box.height * 0.2], [box.x + box.width * 0.7, box.y + box.height * 0.8],
        [box.x + box.width * 0.7, box.y + box.height * 0.2], [box.x + box.width * 0.3, box.y + box.height * 0.8],
        [box.x + box.width / 2, box.y + 9 * px], [box.x + box.width / 2, box.y + box.height - 9 * px],
      ]
    : [];
  return { at, also: more };
}

/** @param {any} zone @param {Env} env @param {number} index @returns {Label[]} */
export function labelZone(zone, env, index) {
  if ((zone.area ?? []).length < 3) return [];
  return [
    {
      id: `zones:${zone.id}`,
      weight: 40,
      ...placesIn(zone.area, env.px),
      lines: [{ text: `${nameOf('zones', zone, index)}: ${ruleWords(zone, env.units)}` }],
      look: 'second',
      sit: 'middle',
      turn: standing(zone.area),
    },
  ];
}

/** Lettering runs up a narrow standing strip. @param {number[][]} ring @returns {number} degrees */
function standing(ring) {
  const box = bounds(ring);
  return box && box.height > 2.5 * box.width ? -90 : 0;
}

/** @param {any} zone @param {Env} env @returns {Drawn} */
export function drawMastZone(zone, env) {
  const ring = zone.area ?? [];
  const d = pathOf(ring, true);
  const arm = 2.6 * env.px;
  const plus = sprinkle(ring, 50 * env.px, (p) => contains(p, ring))
    .map(([x, y]) => `M${x - arm} ${y}h${2 * arm}M${x} ${y - arm}v${2 * arm}`)
    .join('');
  return {
    layer: 'areas',
    nodes: [
      svg('path', { d, class: 'hit-area' }),
      svg('path', { d, class: 'mast-zone' }),
      plus ? svg('path', { d: plus, class: 'mast-zone-plus' }) : null,
    ],
  };
}

/** @param {any} zone @param {Env} env @param {number} index @returns {Label[]} */
export function labelMastZone(zone, env, index) {
  if ((zone.area ?? []).length < 3) return [];
  const guys = zone.guyRadius ? `, guys ${formatLength(zone.guyRadius, env.units)}` : '';
  const { at, also } = placesIn(zone.area, env.px);
  return [
    {
      id: `mastZones:${zone.id}`,
      weight: 64,
      at,
      also,
      lines: [
        { text: nameOf('mastZones', zone, index), bold: true },
        { text: `masts to ${formatLength(zone.highest ?? 0, env.units)}${guys}` },
      ],
      sit: 'middle',
    },
    {
      id: `mastZones-short:${zone.id}`,
      weight: 63,
      at,
      also,
      lines: [{ text: `${nameOf('mastZones', zone, index)}, to ${formatLength(zone.highest ?? 0, env.units)}` }],
      sit: 'middle',
      insteadOf: `mastZones:${zone.id}`,
    },
  ];
}

/** @param {any} place @returns {Drawn} */
export function drawPeople(place) {
  const d = pathOf(place.area ?? [], true);
  return { layer: 'ground', nodes: [svg('path', { d, class: 'people' })] };
}

/** @param {any} place @param {Env} env @param {number} index @returns {Label[]} */
export function labelPeople(place, env, index) {
  if ((place.area ?? []).length < 3) return [];
  return [
    {
      id: `people:${place.id}`,
      weight: 25,
      ...placesIn(place.area, env.px),
      lines: [{ text: `${nameOf('people', place, index)}, people ${span(place.from ?? 0, place.to ?? 0, env.units)}` }],
      look: 'second',
      sit: 'middle',
      turn: standing(place.area),
    },
  ];
}
