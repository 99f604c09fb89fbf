// @ts-check
import { ringRadius, roseGeometry, screenDirection } from '../../charts/reach-rose.js';
import { svg, pathOf } from '../svg.js';
import { along, toMetres, toPixels, WEIGHT } from './labels.js';

/** The reach rose round the wire and the bearings of the targets out to the frame. Pixels about the view's north-west corner. */

/**
 * @param {any} placement
 * @param {import('./labels.js').View} view
 * @returns {{middle: [number, number], ring: number}} px
 */
export function roseFrame(placement, view) {
  const points = placement.conductors
    .flatMap((/** @type {any} */ one) => one.points)
    .map((/** @type {number[]} */ point) => toPixels(view, point));
  const xs = points.map((/** @type {number[]} */ point) => point[0]);
  const ys = points.map((/** @type {number[]} */ point) => point[1]);
  /** @type {[number, number]} */
  const middle = [(Math.min(...xs) + Math.max(...xs)) / 2, (Math.min(...ys) + Math.max(...ys)) / 2];
  const half = Math.max(
    ...points.map((/** @type {number[]} */ point) => Math.hypot(point[0] - middle[0], point[1] - middle[1])),
  );
  const [width, height] = [view.width * view.ppm, view.height * view.ppm];
  const space = Math.min(middle[0], middle[1], width - middle[0], height - middle[1]);
  return { middle, ring: ringRadius(half, Math.max(space, Math.min(width, height) * 0.3)) };
}

/**
 * @param {any} rose of the band shown
 * @param {{middle: [number, number], ring: number}} frame
 * @param {number} planNorth
 * @returns {SVGElement}
 */
export function roseNode(rose, { middle, ring }, planNorth) {
  const { outline, better, worse } = roseGeometry(rose, ring, planNorth);
  const strokes = (/** @type {number[][][]} */ list) => list.map((stroke) => pathOf(stroke)).join('');
  return svg('g', { class: 'rose', transform: `translate(${middle[0].toFixed(1)} ${middle[1].toFixed(1)})` }, [
    svg('path', { class: 'rose-worse', d: strokes(worse) }),
    svg('path', { class: 'rose-better', d: strokes(better) }),
    svg('circle', { class: 'rose-ring', r: ring }),
    svg('path', { class: 'rose-outline', d: pathOf(outline, true) }),
  ]);
}

/**
 * Where a ray from the middle meets the frame.
 * @param {number[]} middle px
 * @param {number[]} unit direction
 * @param {number} width px
 * @param {number} height px
 * @param {number} inset px kept from the frame
 * @returns {[number, number]}
 */
export function toFrame(middle, [ux, uy], width, height, inset) {
  const reach = [
    ux > 1e-9 ? (width - inset - middle[0]) / ux : ux < -1e-9 ? (inset - middle[0]) / ux : Infinity,
    uy > 1e-9 ? (height - inset - middle[1]) / uy : uy < -1e-9 ? (inset - middle[1]) / uy : Infinity,
  ];
  const far = Math.max(0, Math.min(...reach));
  return [middle[0] + ux * far, middle[1] + uy * far];
}

/**
 * @typedef {{name: string, bearing: number, distance: string}} Aim
 * @param {Aim[]} targets
 * @param {{middle: [number, number], ring: number}} frame
 * @param {import('./labels.js').View} view
 * @param {number} planNorth
 * @returns {{nodes: SVGElement[], labels: import('../kinds/env.js').Label[], symbols: number[][]}}
 */
export function bearings(targets, { middle, ring }, view, planNorth) {
  const [width, height] = [view.width * view.ppm, view.height * view.ppm];
  const drawn = targets.map((target) => {
    const [ux, uy] = screenDirection(target.bearing, planNorth);
    const end = toFrame(middle, [ux, uy], width, height, 4);
    const reach = Math.hypot(end[0] - middle[0], end[1] - middle[1]);
    const start = Math.min(ring, reach * 0.8);
    const from = [middle[0] + ux * start, middle[1] + uy * start];
    const back = (/** @type {number} */ far) => [end[0] - ux * far, end[1] - uy * far];
    const head = [-1, 0, 1].map((way) =>
      way ? [end[0] - ux * 11 + way * uy * 4, end[1] - uy * 11 - way * ux * 4] : end,
    );
    return {
      nodes: [
        svg('path', { class: 'bearing-inside', d: pathOf([middle, from]) }),
        svg('path', { class: 'bearing', d: pathOf([from, end]) }),
        svg('path', { class: 'bearing-head', d: pathOf(head, true) }),
      ],
      label: bearingLabel(target, view, [34, 60, 90, 20].map(back), [ux, uy]),
      symbols: along(view, from, end),
    };
  });
  return {
    nodes: drawn.flatMap((one) => one.nodes),
    labels: drawn.map((one) => one.label),
    symbols: drawn.flatMap((one) => one.symbols),
  };
}

/**
 * Beside the line near the frame; wherever there is room along it.
 * @param {Aim} target
 * @param {import('./labels.js').View} view
 * @param {number[][]} feet places along the line, px
 * @param {number[]} unit direction of the line on the screen
 * @returns {import('../kinds/env.js').Label}
 */
function bearingLabel(target, view, feet, [ux, uy]) {
  const half = Math.max(target.name.length, target.distance.length) * 2.9;
  // Far enough to the side that the lettering's own box clears the line whatever its slope.
  const aside = 12 + Math.abs(uy) * half + Math.abs(ux) * 12;
  const beside = (/** @type {number[]} */ [x, y], /** @type {number} */ way) =>
    toMetres(view, [x - uy * way * aside, y + ux * way * aside]);
  const [first, ...others] = feet.flatMap((foot) => [beside(foot, 1), beside(foot, -1)]);
  return {
    id: `bearing-${target.name}`,
    weight: WEIGHT.bearing,
    at: first,
    also: others,
    sit: 'middle',
    lines: [{ text: target.name, bold: true }, { text: target.distance }],
  };
}
