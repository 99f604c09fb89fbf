// @ts-check
import { ringRadius, roseGeometry, screenDirection } from '../../charts/reach-rose.js';
import { svg, pathOf } from '../svg.js';
import { lettering, toPixels } from './labels.js';

/** The reach rose round the wire and the bearings of the targets out to the frame. Pixels about the view's north-west corner. */

/**
 * @param {any} placement
 * @param {import('./labels.js').View} view
 * @returns {{middle: [number, number], ring: number}} px
 */
export function roseFrame(placement, view) {
  const points = placement.conductors.flatMap((/** @type {any} */ one) => one.points).map((/** @type {number[]} */ point) => toPixels(view, point));
  const xs = points.map((/** @type {number[]} */ point) => point[0]);
  const ys = points.map((/** @type {number[]} */ point) => point[1]);
  /** @type {[number, number]} */
  const middle = [(Math.min(...xs) + Math.max(...xs)) / 2, (Math.min(...ys) + Math.max(...ys)) / 2];
  const half = Math.max(...points.map((/** @type {number[]} */ point) => Math.hypot(point[0] - middle[0], point[1] - middle[1])));
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
 * @param {{name: string, bearing: number, distance: string}[]} targets
 * @param {{middle: [number, number], ring: number}} frame
 * @param {{width: number, height: number}} size px in sight
 * @param {number} planNorth
 * @param {ReturnType<typeof import('./labels.js').labelRoom>} room
 * @returns {SVGElement[]}
 */
export function bearings(targets, { middle, ring }, size, planNorth, room) {
  return targets.flatMap((target) => {
    const [ux, uy] = screenDirection(target.bearing, planNorth);
    const end = toFrame(middle, [ux, uy], size.width, size.height, 4);
    const reach = Math.hypot(end[0] - middle[0], end[1] - middle[1]);
    const start = Math.min(ring, reach * 0.8);
    const from = [middle[0] + ux * start, middle[1] + uy * start];
    const head = `M${(end[0] - ux * 11 - uy * 4).toFixed(1)} ${(end[1] - uy * 11 + ux * 4).toFixed(1)}L${end[0].toFixed(1)} ${end[1].toFixed(1)}L${(end[0] - ux * 11 + uy * 4).toFixed(1)} ${(end[1] - uy * 11 - ux * 4).toFixed(1)}Z`;
    const foot = [end[0] - ux * 30, end[1] - uy * 30];
    const spot = room.place(foot[0], foot[1], [target.name, target.distance], 12);
    return [
      svg('path', { class: 'bearing-inside', d: pathOf([middle, from]) }),
      svg('path', { class: 'bearing', d: pathOf([from, end]) }),
      svg('path', { class: 'bearing-head', d: head }),
      ...(spot ? [
        lettering(spot.x, spot.y, [target.name], 'bold', spot.anchor),
        lettering(spot.x, spot.y + 13, [target.distance], 'soft', spot.anchor),
      ] : []),
    ];
  });
}

/**
 * Keeps lettering off the bearings outside the rose.
 * @param {{bearing: number}[]} targets
 * @param {{middle: [number, number], ring: number}} frame
 * @param {{width: number, height: number}} size
 * @param {number} planNorth
 * @param {ReturnType<typeof import('./labels.js').labelRoom>} room
 */
export function blockBearings(targets, { middle, ring }, size, planNorth, room) {
  for (const { bearing } of targets) {
    const unit = screenDirection(bearing, planNorth);
    const end = toFrame(middle, unit, size.width, size.height, 4);
    const reach = Math.hypot(end[0] - middle[0], end[1] - middle[1]);
    for (let far = Math.min(ring, reach); far <= reach; far += 10) {
      const [x, y] = [middle[0] + unit[0] * far, middle[1] + unit[1] * far];
      room.block({ x0: x - 3, y0: y - 3, x1: x + 3, y1: y + 3 });
    }
  }
}
