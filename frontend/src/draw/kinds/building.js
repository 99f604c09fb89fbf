// @ts-check
/** Buildings: outline, 45° hatching (crossed for a metal roof), ridge in a cleared strip. */
import { labelPlace, walls, signedArea } from '../../geometry/polygon.js';
import { distance } from '../../geometry/vector.js';
import { formatLength } from '../../units/length.js';
import { nameOf } from '../../state/kinds.js';
import { dimension, dimensionLabel, readingTurn } from '../dimension.js';
import { pathOf, svg } from '../svg.js';

/** @param {any} building @param {import('./env.js').Env} env @returns {import('./env.js').Drawn} */
export function drawBuilding(building, env) {
  const ring = building.footprint ?? [];
  const ridge = building.ridgeLine ?? [];
  const outward = signedArea(ring) > 0 ? -1 : 1;
  return {
    layer: 'buildings',
    nodes: [
      svg('path', { d: pathOf(ring, true), class: 'building-ground' }),
      svg('path', {
        d: pathOf(ring, true),
        class: 'building',
        fill: `url(#${building.metalRoof ? 'hatch-metal' : 'hatch'})`,
      }),
      ridge.length === 2 && building.roof !== 'flat' && building.roof !== 'lean-to'
        ? svg('g', {}, [
            svg('path', { d: pathOf(ridge), class: 'ridge-strip' }),
            svg('path', { d: pathOf(ridge), class: 'ridge' }),
            ...(building.roof === 'hip' ? hips(ring, ridge) : []),
          ])
        : null,
      ridge.length === 2 && building.roof === 'lean-to' ? highSide(ridge, ring, env.px) : null,
      ...(env.selected
        ? walls(ring, true).map((side) =>
            side.length / env.px > 34
              ? dimension(ring[side.from], ring[side.to], outward * 15 * env.px, env.px, 'dimension')
              : null,
          )
        : []),
    ],
  };
}

/** @param {number[][]} ring @param {number[][]} ridge lines from each corner to the nearer end of the ridge */
function hips(ring, ridge) {
  return ring.map((p) => {
    const end = distance(p, ridge[0]) < distance(p, ridge[1]) ? ridge[0] : ridge[1];
    return svg('path', { d: pathOf([p, end]), class: 'hip' });
  });
}

/** The high side of a lean-to: a second line just inside it. @param {number[][]} ridge @param {number[][]} ring @param {number} px */
function highSide(ridge, ring, px) {
  const [a, b] = ridge;
  const middle = labelPlace(ring);
  const pull = (/** @type {number[]} */ p) => {
    const d = Math.max(distance(p, middle), 1e-6);
    return [p[0] + ((middle[0] - p[0]) / d) * 4 * px, p[1] + ((middle[1] - p[1]) / d) * 4 * px];
  };
  return svg('path', { d: pathOf([pull(a), pull(b)]), class: 'ridge' });
}

/** @param {any} building @param {import('./env.js').Env} env @param {number} index @returns {import('./env.js').Label[]} */
export function labelBuilding(building, env, index) {
  const ring = building.footprint ?? [];
  if (ring.length < 3) return [];
  const at = labelPlace(ring);
  const box = ring.map((/** @type {number[]} */ p) => p[1]);
  const west = ring.map((/** @type {number[]} */ p) => p[0]);
  const middle = (Math.min(...west) + Math.max(...west)) / 2;
  const labels = [
    {
      id: `buildings:${building.id}`,
      weight: 60,
      at,
      also: [[at[0], at[1] + 22 * env.px], [at[0], at[1] - 22 * env.px], [at[0], at[1] - 40 * env.px],
        [middle, Math.max(...box) + 16 * env.px], [middle, Math.min(...box) - 16 * env.px]],
      lines: [
        { text: nameOf('buildings', building, index), bold: true },
        { text: `eaves ${formatLength(building.eaves ?? 0, env.units)}${building.metalRoof ? ', metal roof' : ''}` },
      ],
      sit: /** @type {const} */ ('middle'),
    },
    {
      id: `buildings-short:${building.id}`,
      weight: 59,
      at,
      also: [[middle, Math.max(...box) + 10 * env.px], [middle, Math.min(...box) - 10 * env.px]],
      lines: [{ text: nameOf('buildings', building, index), bold: true }],
      sit: /** @type {const} */ ('middle'),
      insteadOf: `buildings:${building.id}`,
    },
  ];
  const ridge = building.ridgeLine ?? [];
  if (ridge.length === 2 && building.ridge > building.eaves && distance(ridge[0], ridge[1]) / env.px > 60) {
    const t = (/** @type {number} */ k) => [0, 1].map((i) => ridge[0][i] + (ridge[1][i] - ridge[0][i]) * k);
    labels.push(/** @type {any} */ ({
      id: `ridge:${building.id}`,
      weight: 42,
      at: t(0.5),
      also: [t(0.3), t(0.7), t(0.2), t(0.8)],
      lines: [{ text: `${building.roof === 'lean-to' ? 'high side' : 'ridge'} ${formatLength(building.ridge, env.units)}` }],
      sit: 'middle',
      turn: readingTurn(ridge[0], ridge[1]),
    }));
  }
  if (env.selected) {
    const outward = signedArea(ring) > 0 ? -1 : 1;
    for (const side of walls(ring, true)) {
      if (side.length / env.px <= 34) continue;
      labels.push(/** @type {any} */ (
        dimensionLabel(`wall:${building.id}:${side.from}`, ring[side.from], ring[side.to], outward * 15 * env.px, env, 70)
      ));
    }
  }
  return labels;
}
