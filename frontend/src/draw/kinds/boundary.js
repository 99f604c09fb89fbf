// @ts-check
/** The boundary: dash-dot line, open circles at its corners, the length of every side outside. */
import { dimension, dimensionLabel } from '../dimension.js';
import { pathOf, svg } from '../svg.js';
import { walls, signedArea } from '../../geometry/polygon.js';

/** @param {number[][]} ring @param {import('./env.js').Env} env @returns {import('./env.js').Drawn} */
export function drawBoundary(ring, env) {
  const outward = signedArea(ring) > 0 ? -1 : 1;
  const rules = new Map((env.plan.boundaryRules ?? []).map((/** @type {any} */ r) => [r.edge, r.overhang]));
  return {
    layer: 'boundary',
    nodes: [
      svg('path', { d: pathOf(ring, true), class: 'hit' }),
      svg('path', { d: pathOf(ring, true), class: 'boundary' }),
      ...walls(ring, true).map((side) =>
        side.length / env.px > 34
          ? dimension(ring[side.from], ring[side.to], outward * 17 * env.px, env.px, 'dimension')
          : null,
      ),
      ...walls(ring, true).map((side) => {
        if (!rules.has(side.from)) return null;
        const a = ring[side.from];
        const b = ring[side.to];
        return svg('path', { d: pathOf([a, b]), class: 'boundary-open' });
      }),
      ...ring.map((p) => svg('circle', { cx: p[0], cy: p[1], r: 2.6 * env.px, class: 'boundary-corner' })),
    ],
  };
}

/** @param {number[][]} ring @param {import('./env.js').Env} env @returns {import('./env.js').Label[]} */
export function labelBoundary(ring, env) {
  const outward = signedArea(ring) > 0 ? -1 : 1;
  return walls(ring, true)
    .filter((side) => side.length / env.px > 34)
    .map((side) =>
      dimensionLabel(`boundary:${side.from}`, ring[side.from], ring[side.to], outward * 17 * env.px, env, 46),
    );
}
