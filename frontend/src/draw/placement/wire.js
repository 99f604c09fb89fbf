// @ts-check
import { readingTurn } from '../dimension.js';
import { atPlace, pathOf, svg } from '../svg.js';

/** The chosen placement on the plan: wire, ropes, feed line, guys, envelope in the wind, symbols. Plan metres. */

/**
 * The two lines between which a span swings in the gust.
 * @param {{points: number[][], blowOut: number}} span
 * @returns {number[][]} closed outline, plan metres
 */
export function windEnvelope({ points, blowOut }) {
  const [first, last] = [points[0], points[points.length - 1]];
  const [dx, dy] = [last[0] - first[0], last[1] - first[1]];
  const length = Math.hypot(dx, dy);
  if (length < 1e-6) return [];
  const shift = (/** @type {number[]} */ point, /** @type {number} */ way) => {
    const share = ((point[0] - first[0]) * dx + (point[1] - first[1]) * dy) / (length * length);
    const out = way * blowOut * 4 * Math.max(0, share * (1 - share));
    return [point[0] + (-dy / length) * out, point[1] + (dx / length) * out];
  };
  return [...points.map((point) => shift(point, 1)), ...points.map((point) => shift(point, -1)).reverse()];
}

/**
 * @param {any} placement
 * @param {number} ppm
 * @returns {SVGElement[]} below the labels
 */
export function chosenWire(placement, ppm) {
  const line = (/** @type {string} */ name, /** @type {number[][]} */ points, closed = false) =>
    svg('path', { class: name, d: pathOf(points, closed) });
  const ends = placement.conductors.flatMap((/** @type {any} */ conductor) => endsOf(conductor.points));
  return [
    ...placement.spans.map((/** @type {any} */ span) => line('wind-envelope', windEnvelope(span), true)),
    ...placement.ropes.map((/** @type {any} */ rope) => line(rope.what === 'guy' ? 'guy' : 'tail', rope.points)),
    line('feed-run', placement.feed.path ?? []),
    ...placement.conductors.map((/** @type {any} */ conductor) => line('wire-gap', conductor.points)),
    ...placement.conductors.map((/** @type {any} */ conductor) => line('wire-chosen', conductor.points)),
    ...placement.masts.map((/** @type {any} */ mast) =>
      atPlace(mast.foot, ppm, [
        svg('circle', { class: 'new-mast', r: 8 }),
        svg('path', { class: 'new-mast-cross', d: 'M-11 0H11M0 -11V11' }),
      ]),
    ),
    ...ends.map((/** @type {number[]} */ end) => atPlace(end, ppm, [svg('circle', { class: 'insulator', r: 3.4 })])),
    atPlace(placement.feed.at, ppm, [svg('rect', { class: 'feedpoint', x: -4, y: -4, width: 8, height: 8 })]),
  ];
}

/** @param {number[][]} points @returns {number[][]} none for a closed loop */
function endsOf(points) {
  const [first, last] = [points[0], points[points.length - 1]];
  const closed = Math.hypot(first[0] - last[0], first[1] - last[1], first[2] - last[2]) < 1e-3;
  return closed ? [] : [first, last];
}

/**
 * The finished length of wire in each span, to be written along it where the span is long enough on the screen.
 * @param {any} placement
 * @param {number} ppm
 * @param {(metres: number) => string} length
 * @returns {import('../kinds/env.js').Label[]}
 */
export function wireLengths(placement, ppm, length) {
  return placement.spans.flatMap((/** @type {any} */ span, /** @type {number} */ index) => {
    const [a, b] = [span.points[0], span.points[span.points.length - 1]];
    const pixels = Math.hypot(b[0] - a[0], b[1] - a[1]) * ppm;
    if (pixels < 90 || span.wireLength < 0.05) return [];
    const side = [-(b[1] - a[1]) / pixels, (b[0] - a[0]) / pixels].map((part) => part * 12);
    const at = (/** @type {number} */ share, /** @type {number} */ way) =>
      [0, 1].map((k) => a[k] + (b[k] - a[k]) * share + way * side[k]);
    return [
      {
        id: `span-${index}`,
        weight: Infinity,
        at: at(0.55, 1),
        also: [at(0.45, -1), at(0.35, 1), at(0.65, -1), at(0.3, -1)],
        lines: [{ text: `${length(span.wireLength)} wire`, bold: true }],
        look: 'copper',
        sit: 'middle',
        turn: readingTurn(a, b),
      },
    ];
  });
}
