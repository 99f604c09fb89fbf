// @ts-check
/** Things along a path: bracket lines, overhead lines with their kept distance, metalwork. */
import { corridor } from '../../geometry/corridor.js';
import { keptDistance } from './kept.js';
import { barbs, beads, zigzag } from '../../geometry/figures.js';
import { pathLength, placeAlong } from '../../geometry/line.js';
import { distance } from '../../geometry/vector.js';
import { formatLength } from '../../units/length.js';
import { nameOf } from '../../state/kinds.js';
import { readingTurn } from '../dimension.js';
import { LINE_WORDS, span } from '../words.js';
import { pathOf, svg } from '../svg.js';

/** @typedef {import('./env.js').Env} Env */
/** @typedef {import('./env.js').Drawn} Drawn */
/** @typedef {import('./env.js').Label} Label */

/** @param {any} line @param {Env} env @returns {Drawn} */
export function drawBracketLine(line, env) {
  const path = line.path ?? [];
  return {
    layer: 'boundary',
    nodes: [
      svg('path', { d: pathOf(path), class: 'hit' }),
      svg('path', { d: barbs(path, 7 * env.px, 6 * env.px).map((b) => pathOf(b)).join(''), class: 'bracket-barbs' }),
      svg('path', { d: pathOf(path), class: 'bracket-line' }),
    ],
  };
}

/** @param {any} line @param {Env} env @param {number} index @returns {Label[]} */
export function labelBracketLine(line, env, index) {
  const path = line.path ?? [];
  if (path.length < 2) return [];
  const { point, edge } = placeAlong(path, pathLength(path) / 2);
  return beside({
    id: `bracketLines:${line.id}`,
    weight: 66,
    at: point,
    lines: [{ text: `${nameOf('bracketLines', line, index)}, ${span(line.lowest ?? 0, line.highest ?? 0, env.units)}`, bold: true }],
    look: 'copper',
    sit: 'middle',
    turn: readingTurn(path[edge], path[edge + 1]),
  }, path[edge], path[edge + 1], 12 * env.px);
}

/** The same label on either side of a line, then along it. @param {Label} label @param {number[]} a @param {number[]} b @param {number} off metres @returns {Label[]} */
function beside(label, a, b, off) {
  const length = Math.max(distance(a, b), 1e-9);
  const n = [-(b[1] - a[1]) / length, (b[0] - a[0]) / length];
  const flip = n[1] < 0 || (Math.abs(n[1]) < 1e-9 && n[0] > 0) ? -1 : 1;
  const places = [];
  for (const t of [0, 0.2, -0.2, 0.35, -0.35]) {
    for (const s of [flip, -flip]) {
      places.push([
        label.at[0] + n[0] * off * s + (b[0] - a[0]) * t,
        label.at[1] + n[1] * off * s + (b[1] - a[1]) * t,
      ]);
    }
  }
  return [{ ...label, at: places[0], also: places.slice(1) }];
}

/** @param {any} line @param {Env} env @returns {Drawn} */
export function drawOverheadLine(line, env) {
  const path = line.path ?? [];
  const telephone = line.kind === 'telephone';
  const kept = keptDistance(line);
  const ring = path.length > 1 ? corridor(path, kept) : [];
  return {
    layer: 'lines',
    nodes: [
      svg('path', { d: pathOf(path), class: 'hit' }),
      svg('path', {
        d: pathOf(path.length > 1 ? zigzag(path, 58 * env.px, (telephone ? 3.5 : 5) * env.px) : path),
        class: telephone ? 'overhead telephone' : 'overhead',
      }),
      ...path.map((/** @type {number[]} */ p) =>
        svg('circle', { cx: p[0], cy: p[1], r: (telephone ? 1.8 : 2.8) * env.px, class: 'overhead-point' }),
      ),
    ],
    under: [
      {
        layer: 'corridors',
        nodes: ring.length
          ? [svg('path', { d: pathOf(ring, true), class: 'kept-wash' }), svg('path', { d: pathOf(ring, true), class: 'kept-edge' })]
          : [],
      },
    ],
  };
}

/** @param {any} line @param {Env} env @param {number} index @returns {Label[]} */
export function labelOverheadLine(line, env, index) {
  const path = line.path ?? [];
  if (path.length < 2) return [];
  const weighty = line.kind !== 'telephone';
  const base = weighty ? 100 : 55;
  /** @type {Label[]} */
  const labels = path.map((/** @type {number[]} */ p, /** @type {number} */ i) => ({
    id: `height:${line.id}:${i}`,
    weight: base + 5,
    at: p,
    lines: [{ text: formatLength(p[2] ?? 0, env.units), bold: weighty }],
    look: weighty ? '' : 'second',
    sit: 'around',
    gap: 7,
  }));
  const longest = path.slice(1).reduce((/** @type {number} */ best, /** @type {number[]} */ _, /** @type {number} */ i) =>
    distance(path[i], path[i + 1]) > distance(path[best], path[best + 1]) ? i : best, 0);
  const a = path[longest];
  const b = path[longest + 1];
  const name = nameOf('overheadLines', line, index);
  const said = LINE_WORDS[line.kind] ?? '';
  const text = name.toLowerCase().includes(said) ? name : `${name}, ${said}`;
  labels.push(...beside({
    id: `overheadLines:${line.id}`,
    weight: base,
    at: [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2],
    lines: [{ text, bold: weighty }],
    look: weighty ? '' : 'second',
    sit: 'middle',
    turn: readingTurn(a, b),
  }, a, b, 14 * env.px));
  const kept = keptDistance(line);
  if (weighty && kept / env.px > 9) {
    labels.push(...beside({
      id: `kept:${line.id}`,
      weight: 90,
      at: [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2],
      lines: [{ text: `kept distance ${formatLength(kept, env.units, 2)}` }],
      look: 'kept',
      sit: 'middle',
      turn: readingTurn(a, b),
    }, a, b, kept - 9 * env.px));
  }
  return labels;
}

/** @param {any} metal @param {Env} env @returns {Drawn} */
export function drawMetalwork(metal, env) {
  const path = metal.path ?? [];
  return {
    layer: 'metal',
    nodes: [
      svg('path', { d: pathOf(path), class: 'hit' }),
      svg('path', { d: pathOf(path), class: 'metalwork' }),
      ...(path.length > 1 ? beads(path, 24 * env.px).map((p) =>
        svg('circle', { cx: p[0], cy: p[1], r: 1.75 * env.px, class: 'metal-bead' })) : []),
    ],
  };
}

/** @param {any} metal @param {Env} env @param {number} index @returns {Label[]} */
export function labelMetalwork(metal, env, index) {
  const path = metal.path ?? [];
  if (path.length < 2) return [];
  const { point, edge } = placeAlong(path, pathLength(path) / 2);
  return beside({
    id: `metalwork:${metal.id}`,
    weight: 28,
    at: point,
    lines: [{ text: `${nameOf('metalwork', metal, index)}, metal ${formatLength(path[0][2] ?? 0, env.units)}` }],
    look: 'rope',
    sit: 'middle',
    turn: readingTurn(path[edge], path[edge + 1]),
  }, path[edge], path[edge + 1], 10 * env.px);
}
