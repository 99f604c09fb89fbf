// @ts-check
/** Supports by their kind, and trees that only stand in the way: symbols, crowns, heights. */
import { scallops } from '../../geometry/figures.js';
import { direction, distance } from '../../geometry/vector.js';
import { nearestOnPath } from '../../geometry/line.js';
import { formatLength } from '../../units/length.js';
import { nameOf } from '../../state/kinds.js';
import { span } from '../words.js';
import { svg } from '../svg.js';

/**
 * The symbol of a support about (0, 0), pixels, y down.
 * @param {string} kind @param {number} [turn] degrees clockwise on the screen, for a wall's half disc
 * @returns {SVGElement}
 */
export function supportSymbol(kind, turn = 0) {
  const parts = {
    tree: () => [svg('circle', { r: 5.6, class: 'symbol' }), svg('circle', { r: 2.1, class: 'symbol-fill' })],
    mast: () => [svg('circle', { r: 5.2, class: 'symbol' }), svg('path', { d: 'M-8 0H8M0-8V8', class: 'symbol' })],
    pole: () => [svg('circle', { r: 5.6, class: 'symbol' }), svg('circle', { r: 3.3, class: 'symbol-fill' })],
    chimney: () => [svg('rect', { x: -5.5, y: -4, width: 11, height: 8, class: 'symbol' }), svg('circle', { r: 2, class: 'symbol-fill' })],
    wall: () => [svg('path', { d: 'M-5.5 0A5.5 5.5 0 0 1 5.5 0Z', class: 'symbol-fill', transform: `rotate(${turn})` })],
    other: () => [svg('path', { d: 'M0-6 6 0 0 6-6 0Z', class: 'symbol' }), svg('circle', { r: 1.8, class: 'symbol-fill' })],
  };
  return svg('g', { class: 'symbol-group' }, (parts[/** @type {'tree'} */ (kind)] ?? parts.other)());
}

/** @param {number[]} at @param {any} canopy @param {number} px @returns {SVGElement[]} */
export function crown(at, canopy, px) {
  if (!canopy || !(canopy.radius > 0)) return [];
  return [
    svg('path', { d: scallops(at, canopy.radius, Math.max(canopy.radius * 0.24, 13 * px)), class: 'canopy' }),
    svg('circle', { cx: at[0], cy: at[1], r: canopy.radius * 0.55, class: 'canopy-inner' }),
  ];
}

/** The way a wall faces: away from the nearest wall's building. @param {number[]} at @param {any} plan @returns {number} degrees clockwise on the screen */
function wallTurn(at, plan) {
  let best = null;
  for (const b of plan.buildings ?? []) {
    const near = nearestOnPath(at, b.footprint ?? [], true);
    if (near && (!best || near.distance < best.distance)) best = { ...near, ring: b.footprint };
  }
  if (!best || best.distance > 1.5) return 0;
  const a = best.ring[best.edge];
  const b = best.ring[(best.edge + 1) % best.ring.length];
  const along = direction(a, b);
  // The half disc bulges to the left of its base line turned by this much; outside is where `at` lies.
  const area = best.ring.reduce((/** @type {number} */ s, /** @type {number[]} */ p, /** @type {number} */ i) => {
    const q = best.ring[(i + 1) % best.ring.length];
    return s + p[0] * q[1] - q[0] * p[1];
  }, 0);
  return along - 90 + (area > 0 ? 180 : 0);
}

/** @param {any} support @param {import('./env.js').Env} env @returns {import('./env.js').Drawn} */
export function drawSupport(support, env) {
  const at = support.at;
  const turn = support.kind === 'wall' ? wallTurn(at, env.plan) : 0;
  const place = `translate(${at[0]} ${at[1]}) scale(${env.px} ${-env.px})`;
  return {
    layer: 'supports',
    nodes: [
      svg('circle', { cx: at[0], cy: at[1], r: 13 * env.px, class: 'hit-area' }),
      svg('g', { transform: place, class: support.ropeOnly ? 'rope-only' : '' }, [supportSymbol(support.kind, turn)]),
    ],
    under: [{ layer: 'canopies', nodes: crown(at, support.canopy, env.px) }],
  };
}

/** @param {any} support @param {import('./env.js').Env} env @param {number} index @returns {import('./env.js').Label[]} */
export function labelSupport(support, env, index) {
  const word = support.ropeOnly ? 'rope only ' : support.kind === 'tree' ? 'rope ' : '';
  return [
    {
      id: `supports:${support.id}`,
      weight: 80,
      at: support.at,
      lines: [
        { text: nameOf('supports', support, index), bold: true },
        { text: `${word}${span(support.lowest ?? 0, support.highest ?? 0, env.units)}` },
      ],
      sit: 'around',
      gap: env.selected ? 16 : 10,
    },
    {
      id: `supports-short:${support.id}`,
      weight: 79,
      at: support.at,
      lines: [{ text: nameOf('supports', support, index), bold: true }],
      sit: 'around',
      gap: env.selected ? 16 : 10,
      insteadOf: `supports:${support.id}`,
    },
  ];
}

/** @param {any} tree @param {import('./env.js').Env} env @returns {import('./env.js').Drawn} */
export function drawTree(tree, env) {
  return {
    layer: 'canopies',
    nodes: [
      ...crown(tree.at, tree.canopy, env.px),
      svg('circle', { cx: tree.at[0], cy: tree.at[1], r: 2 * env.px, class: 'tree-stem' }),
    ],
  };
}

/** @param {any} tree @param {import('./env.js').Env} env @param {number} index @returns {import('./env.js').Label[]} */
export function labelTree(tree, env, index) {
  const canopy = tree.canopy ?? { from: 0, to: 0 };
  return [
    {
      id: `trees:${tree.id}`,
      weight: 30,
      at: tree.at,
      lines: [
        { text: nameOf('trees', tree, index) },
        { text: `crown ${formatLength(canopy.from, env.units)}–${formatLength(canopy.to, env.units)}` },
      ],
      look: 'second',
      sit: 'below',
      gap: 6,
      also: [[tree.at[0], tree.at[1] + 34 * env.px]],
    },
  ];
}

/** @param {number[]} a @param {number[]} b @param {number} px @returns {boolean} near enough on the screen to be one place */
export const together = (a, b, px) => distance(a, b) < 6 * px;
