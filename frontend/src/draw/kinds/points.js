// @ts-check
/** Single places: station entry, datums, noise sources, spot heights. */
import { nearestOnPath } from '../../geometry/line.js';
import { direction } from '../../geometry/vector.js';
import { formatLength } from '../../units/length.js';
import { nameOf } from '../../state/kinds.js';
import { number, signed } from '../../units/figures.js';
import { svg } from '../svg.js';

/** @typedef {import('./env.js').Env} Env */
/** @typedef {import('./env.js').Drawn} Drawn */
/** @typedef {import('./env.js').Label} Label */

/** @param {number[]} at @param {Env} env @param {Node[]} nodes @returns {Drawn} */
const placed = (at, env, nodes) => ({
  layer: 'points',
  nodes: [
    svg('circle', { cx: at[0], cy: at[1], r: 13 * env.px, class: 'hit-area' }),
    svg('g', { transform: `translate(${at[0]} ${at[1]}) scale(${env.px} ${-env.px})` }, nodes),
  ],
});

/** An arrow onto a bar, pointing east at (0, 0). @param {number} turn degrees clockwise on the screen @returns {SVGElement} */
export const entrySymbol = (turn = 0) =>
  svg('g', { transform: `rotate(${turn})`, class: 'entry' }, [
    svg('path', { d: 'M-15 0H-3M-8-4.5-2.5 0-8 4.5M0-6.5V6.5' }),
  ]);

/** @returns {SVGElement} a triangle with a dot */
export const datumSymbol = () =>
  svg('g', { class: 'datum' }, [
    svg('path', { d: 'M0-8 7 5.5H-7Z' }),
    svg('circle', { cy: 1, r: 1.5, class: 'symbol-fill' }),
  ]);

/** @returns {SVGElement} three waves going out from a dot */
export const noiseSymbol = () =>
  svg('g', { class: 'noise' }, [
    svg('circle', { r: 1.8, class: 'symbol-fill' }),
    svg('path', { d: 'M-4-3.5A6 6 0 0 0-4 3.5M4-3.5A6 6 0 0 1 4 3.5M-6.8-5.8A9 9 0 0 0-6.8 5.8M6.8-5.8A9 9 0 0 1 6.8 5.8' }),
  ]);

/** @param {any} entry @param {Env} env @returns {Drawn} */
export function drawEntry(entry, env) {
  return placed(entry.at, env, [entrySymbol(inward(entry.at, env.plan))]);
}

/** Which way the line goes in: toward the wall it stands at. @param {number[]} at @param {any} plan @returns {number} degrees clockwise on the screen from east */
function inward(at, plan) {
  let best = null;
  for (const b of plan.buildings ?? []) {
    const near = nearestOnPath(at, b.footprint ?? [], true);
    if (near && (!best || near.distance < best.distance)) best = { ...near, ring: b.footprint };
  }
  if (!best || best.distance > 3) return 0;
  const { ring, edge } = best;
  const anticlockwise = ring.reduce((/** @type {number} */ s, /** @type {number[]} */ p, /** @type {number} */ i) => {
    const q = ring[(i + 1) % ring.length];
    return s + p[0] * q[1] - q[0] * p[1];
  }, 0) > 0;
  const wall = direction(ring[edge], ring[(edge + 1) % ring.length]);
  return wall + (anticlockwise ? -90 : 90) - 90;
}

/** @param {any} entry @param {Env} env @returns {Label[]} */
export function labelEntry(entry, env) {
  return [
    {
      id: 'entry:',
      weight: 68,
      at: entry.at,
      lines: [{ text: 'Entry', bold: true }, { text: `${formatLength(entry.height ?? 0, env.units)} up` }],
      look: 'rope',
      sit: 'around',
      gap: 18,
    },
  ];
}

/** @param {any} datum @param {Env} env @returns {Drawn} */
export const drawDatum = (datum, env) => placed(datum.at, env, [datumSymbol()]);

/** @param {any} datum @param {Env} env @param {number} index @returns {Label[]} */
export function labelDatum(datum, env, index) {
  return [
    {
      id: `datums:${index}`,
      weight: 72,
      at: datum.at,
      lines: [{ text: datum.name || String(index + 1), bold: true }],
      look: 'big',
      sit: 'around',
      gap: 9,
    },
  ];
}

/** @param {any} noise @param {Env} env @returns {Drawn} */
export const drawNoise = (noise, env) => placed(noise.at, env, [noiseSymbol()]);

/** @param {any} noise @param {Env} env @param {number} index @returns {Label[]} */
export function labelNoise(noise, env, index) {
  const name = nameOf('noise', noise, index);
  return [
    {
      id: `noise:${noise.id}`,
      weight: 26,
      at: noise.at,
      lines: [{ text: name.length > 30 ? `${name.slice(0, 28).trim()}…` : name }],
      look: 'second',
      sit: 'around',
      gap: 11,
    },
  ];
}

/** @param {number[]} spot @param {Env} env @returns {Drawn} */
export const drawSpot = (spot, env) => placed(spot, env, [svg('path', { d: 'M-4-4 4 4M4-4-4 4', class: 'spot' })]);

/** @param {number[]} spot @param {Env} env @param {number} index @returns {Label[]} */
export function labelSpot(spot, env, index) {
  const text = env.units === 'm' ? signed(spot[2] ?? 0, 2) : formatLength(spot[2] ?? 0, 'ft', 1);
  return [
    {
      id: `spots:${index}`,
      weight: 24,
      at: spot,
      lines: [{ text: (spot[2] ?? 0) === 0 && env.units === 'm' ? number(0, 1) : text }],
      look: 'second',
      sit: 'around',
      gap: 6,
    },
  ];
}
