// @ts-check
import { svg, pathOf } from '../draw/svg.js';

/** A placement on its plot, small, for a row of the list. */

/**
 * Fits the plot into a box, north of the plan up.
 * @param {number[][]} points
 * @param {{width: number, height: number}} size
 * @returns {(point: number[]) => number[]}
 */
export function fitInto(points, { width, height }) {
  const xs = points.map((point) => point[0]);
  const ys = points.map((point) => point[1]);
  const [x0, x1, y0, y1] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const pad = 3;
  const scale = Math.min((width - 2 * pad) / Math.max(x1 - x0, 1e-6), (height - 2 * pad) / Math.max(y1 - y0, 1e-6));
  const [cx, cy] = [(x0 + x1) / 2, (y0 + y1) / 2];
  return ([x, y]) => [width / 2 + (x - cx) * scale, height / 2 - (y - cy) * scale];
}

/**
 * @param {any} plan
 * @param {any} placement
 * @param {{width: number, height: number}} size
 * @returns {SVGElement}
 */
export function thumbnail(plan, placement, size) {
  const boundary = plan.boundary ?? [];
  const wires = placement.conductors.map((/** @type {any} */ conductor) => conductor.points);
  const fit = fitInto([...boundary, ...wires.flat()], size);
  const draw = (/** @type {number[][]} */ points, /** @type {boolean} */ closed) => pathOf(points.map(fit), closed);
  const [feedX, feedY] = fit(placement.feed.at);
  return svg(
    'svg',
    {
      class: 'chart thumbnail',
      viewBox: `0 0 ${size.width} ${size.height}`,
      width: size.width,
      height: size.height,
      'aria-hidden': 'true',
    },
    [
      ...(plan.buildings ?? []).map((/** @type {any} */ building) =>
        svg('path', { class: 'thumb-building', d: draw(building.footprint, true) }),
      ),
      ...(plan.overheadLines ?? [])
        .filter((/** @type {any} */ line) => line.kind !== 'telephone')
        .map((/** @type {any} */ line) => svg('path', { class: 'thumb-line', d: draw(line.path, false) })),
      svg('path', { class: 'thumb-boundary', d: draw(boundary, true) }),
      ...wires.map((/** @type {number[][]} */ wire) => svg('path', { class: 'thumb-wire', d: draw(wire, false) })),
      ...placement.attachments.map((/** @type {any} */ hold) => {
        const [x, y] = fit(hold.at);
        return svg('circle', { class: 'thumb-hold', cx: x, cy: y, r: 1.8 });
      }),
      svg('rect', { class: 'thumb-feed', x: feedX - 2, y: feedY - 2, width: 4, height: 4 }),
    ],
  );
}
