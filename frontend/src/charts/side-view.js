// @ts-check
import { svg, pathOf } from '../draw/svg.js';
import { markAt } from './marks.js';
import { ticks } from './scale.js';

/**
 * Side view along the wire: true heights, heights and lengths at one scale. Takes what `along.js` unrolled.
 *
 * @typedef {ReturnType<typeof import('./along.js').alongWire>} Along
 * @typedef {{width: number, height: number, ppm: number, length: (metres: number) => string, title: string,
 *   notes: string[], unit: number, stateOf: (to: string) => string|null}} SideOptions
 *   `ppm`: pixels per metre of the plan, taken when the view fits; `length` writes a length without its unit;
 *   `unit`: metres between whole figures of the height axis
 */

const MARGIN = { left: 34, right: 12, top: 18, foot: 36 };
/** The title has a line to itself: heights are written over the highest points. */
const TITLE_LINE = 15;
const LETTER = 5.3;
/** A low wire is not blown up beyond a view this high, metres. */
const LEAST_HEIGHT = 7;
/** A narrower view is described under it instead. */
export const ROOM_FOR_TITLE = 520;

/**
 * @param {Along} along
 * @param {{width: number, height: number, ppm: number}} size
 */
export function sideScale(along, { width, height, ppm }) {
  const heights = [
    ...along.runs.flat(),
    ...along.holds.map((hold) => [0, hold.top]),
    ...along.ground,
    ...along.buildings.flatMap((building) => building.outline),
  ].map((station) => station[1]);
  const [low, high] = [Math.min(...along.ground.map((one) => one[1]), 0), Math.max(...heights) + 0.4];
  const top = width < ROOM_FOR_TITLE ? MARGIN.top : MARGIN.top + TITLE_LINE;
  const room = { x: width - MARGIN.left - MARGIN.right, y: height - top - MARGIN.foot };
  const span = along.length + 5;
  const fit = Math.min(room.x / span, room.y / Math.max(high - low, LEAST_HEIGHT));
  const same = ppm <= fit && ppm * span > room.x * 0.4;
  const scale = same ? ppm : fit;
  const start = MARGIN.left + (room.x - along.length * scale) / 2;
  const base = height - MARGIN.foot;
  return {
    scale,
    same,
    low,
    high,
    x: (/** @type {number} */ s) => start + s * scale,
    y: (/** @type {number} */ z) => base - (z - low) * scale,
  };
}

/**
 * A scalloped outline about a rounded block, as canopies are drawn.
 * @param {number} x0
 * @param {number} y0
 * @param {number} x1
 * @param {number} y1
 * @returns {string} path data
 */
export function scallops(x0, y0, x1, y1) {
  const [a, b] = [Math.max(2, (x1 - x0) / 2), Math.max(2, (y1 - y0) / 2)];
  const [cx, cy] = [(x0 + x1) / 2, (y0 + y1) / 2];
  const around = Math.max(8, Math.round((2 * (a + b) * 1.6) / 12));
  const points = Array.from({ length: around }, (_, index) => {
    const turn = (index / around) * 2 * Math.PI;
    const [c, s] = [Math.cos(turn), Math.sin(turn)];
    const shape = (/** @type {number} */ v) => Math.sign(v) * Math.sqrt(Math.abs(v));
    const round = 0.5;
    return [cx + a * (round * c + (1 - round) * shape(c)), cy + b * (round * s + (1 - round) * shape(s))];
  });
  const step = (/** @type {number[]} */ [px, py]) => `${px.toFixed(1)} ${py.toFixed(1)}`;
  return `M${step(points[0])}${[...points.slice(1), points[0]].map((point) => `A6 6 0 0 1 ${step(point)}`).join('')}Z`;
}

/**
 * @param {Along} along
 * @param {SideOptions} options
 * @returns {SVGElement}
 */
export function sideView(along, options) {
  const { width, height } = options;
  const frame = sideScale(along, options);
  const { x, y } = frame;
  const at = (/** @type {number[]} */ [s, z]) => [x(s), y(z)];
  const inView = along.ground.filter(([s]) => x(s) >= MARGIN.left - 2 && x(s) <= width - MARGIN.right + 2);
  return svg(
    'svg',
    {
      class: 'chart side-view',
      viewBox: `0 0 ${width} ${height}`,
      width,
      height,
      role: 'img',
      'aria-label': `${options.title}: ${along.holds.map((hold) => `${hold.name} ${options.length(hold.aboveGround)}`).join(', ')}`,
    },
    [
      svg('defs', {}, [
        svg(
          'pattern',
          { id: 'side-hatch', width: 5.5, height: 5.5, patternUnits: 'userSpaceOnUse', patternTransform: 'rotate(45)' },
          [svg('path', { class: 'hatch', d: 'M0 0V6' })],
        ),
      ]),
      ...heightLines(frame, width, options),
      ...along.canopies.map((tree) =>
        svg('path', {
          class: tree.own ? 'side-canopy' : 'side-canopy beside',
          d: scallops(x(tree.s0), y(tree.to), x(tree.s1), y(tree.from)),
        }),
      ),
      ...along.buildings.flatMap(({ outline }) => [
        svg('path', { class: 'side-building', d: pathOf(outline.map(at), true) }),
        svg('path', { class: 'side-hatching', fill: 'url(#side-hatch)', d: pathOf(outline.map(at), true) }),
      ]),
      svg('path', { class: 'side-ground-hatch', d: groundHatch(inView.map(at)) }),
      svg('path', { class: 'side-ground', d: pathOf(inView.map(at)) }),
      ...along.guys.map((guy) => svg('path', { class: 'side-rope', d: pathOf(guy.map(at)) })),
      ...along.holds.map((hold) => holdMark(hold, frame)),
      ...along.runs.map((run) => svg('path', { class: 'side-rope run', d: pathOf(run.map(at)) })),
      svg('path', { class: 'side-feed-line', d: pathOf(along.feedLine.map(at)) }),
      ...along.wires.map((/** @type {number[][]} */ wire) =>
        svg('path', { class: 'side-wire', d: pathOf(wire.map(at)) }),
      ),
      ...along.lines.flatMap((line) => overhead(line, frame)),
      ...apart(along.drops, frame).flatMap((drop) => dropMark(drop, frame, options)),
      feedMark(at(along.feed)),
      ...holdLabels(along.holds, frame, options),
      ...footLabels(along.holds, frame, options, height),
      ...titleBlock(options, frame, width),
    ],
  );
}

/**
 * @param {ReturnType<typeof sideScale>} frame
 * @param {number} width
 * @param {SideOptions} options
 */
function heightLines(frame, width, options) {
  return ticks(frame.low / options.unit, frame.high / options.unit, 4)
    .map((height) => height * options.unit)
    .flatMap((z) => [
      svg('path', { class: 'side-grid', d: `M${MARGIN.left} ${frame.y(z)}H${width - MARGIN.right}` }),
      svg('text', { class: 'axis end', x: MARGIN.left - 6, y: frame.y(z) + 4 }, [
        options.length(z).replace(/\.0+$/, ''),
      ]),
    ]);
}

/** @param {number[][]} ground */
function groundHatch(ground) {
  if (ground.length < 2) return '';
  let d = '';
  for (
    let index = 0;
    index < ground.length;
    index += Math.max(1, Math.round(9 / Math.max(1, ground[1][0] - ground[0][0])))
  ) {
    d += `M${ground[index][0].toFixed(1)} ${ground[index][1].toFixed(1)}l-5 6`;
  }
  return d;
}

/**
 * @param {Along['holds'][number]} hold
 * @param {ReturnType<typeof sideScale>} frame
 */
function holdMark(hold, { x, y }) {
  const [px, top, foot] = [x(hold.s), y(hold.top), y(hold.foot)];
  if (hold.kind === 'tree')
    return svg('path', { class: 'side-trunk', d: `M${px - 2} ${foot}V${top}M${px + 2} ${foot}V${top}` });
  if (hold.kind === 'mast' || hold.kind === 'pole') {
    return svg('path', { class: hold.isNew ? 'side-mast new' : 'side-mast', d: `M${px} ${foot}V${top}` });
  }
  return svg('path', { class: 'side-mast', d: `M${px - 4} ${top}h8M${px} ${top}v7` });
}

/** @param {number[]} at */
function feedMark([px, py]) {
  return svg('rect', { class: 'side-feed', x: px - 4, y: py - 4, width: 8, height: 8 });
}

/**
 * @param {Along['lines'][number]} line
 * @param {ReturnType<typeof sideScale>} frame
 */
function overhead(line, { x, y }) {
  const [px, py] = [x(line.s), y(line.z)];
  return [
    svg('path', { class: 'side-overhead', d: `M${px - 13} ${py}h8l3 -5 4 10 3 -5h8` }),
    svg('text', { class: 'drawn bold halo middle', x: px, y: py - 9 }, [line.name]),
  ];
}

/**
 * Of two heights so near that their figures would touch, the lesser is shown.
 * @param {Along['drops']} drops
 * @param {ReturnType<typeof sideScale>} frame
 * @returns {Along['drops']}
 */
function apart(drops, { x }) {
  const least = [...drops].sort((a, b) => a.top - a.bottom - (b.top - b.bottom));
  return least.filter((drop, index) => !least.slice(0, index).some((kept) => Math.abs(x(kept.s) - x(drop.s)) < 56));
}

/**
 * @param {Along['drops'][number]} drop
 * @param {ReturnType<typeof sideScale>} frame
 * @param {SideOptions} options
 */
function dropMark(drop, { x, y }, options) {
  const [px, top, bottom] = [x(drop.s), y(drop.top), y(drop.bottom)];
  if (bottom - top < 12) return [];
  const state = options.stateOf(drop.to);
  const middle = (top + bottom) / 2;
  const words = options.length(drop.top - drop.bottom);
  return [
    svg('path', {
      class: 'dimension',
      d: `M${px} ${top}V${bottom}M${px - 4} ${top + 4}l8 -8M${px - 4} ${bottom + 4}l8 -8`,
    }),
    svg('text', { class: 'drawn bold halo', x: px + 6, y: middle + 4 }, [words]),
    state ? markAt(state, px + 14 + words.length * LETTER * 1.1, middle) : null,
  ].filter((node) => node !== null);
}

/**
 * Heights stand over the holding points; of two that would touch, the later one moves up.
 * @param {Along['holds']} holds
 * @param {ReturnType<typeof sideScale>} frame
 * @param {SideOptions} options
 */
function holdLabels(holds, { x, y }, options) {
  /** @type {number[][]} */
  const taken = [];
  return holds.map((hold) => {
    const px = x(hold.s);
    let py = y(hold.top) - 9;
    while (taken.some(([ox, oy]) => Math.abs(ox - px) < 30 && Math.abs(oy - py) < 13)) py -= 13;
    taken.push([px, py]);
    return svg('text', { class: 'drawn bold halo middle', x: px, y: Math.max(11, py) }, [
      options.length(hold.aboveGround),
    ]);
  });
}

/**
 * Names under the ground, with the distance between them where there is room for it.
 * @param {Along['holds']} holds
 * @param {ReturnType<typeof sideScale>} frame
 * @param {SideOptions} options
 * @param {number} height
 */
function footLabels(holds, { x }, options, height) {
  const row = height - 8;
  const sorted = [...holds].sort((a, b) => a.s - b.s);
  /** @type {{x0: number, x1: number}[]} */
  const boxes = [];
  /** @type {SVGElement[]} */
  const labels = [];
  sorted.forEach((hold, index) => {
    const half = (hold.name.length * LETTER) / 2 + 4;
    const px = Math.min(Math.max(x(hold.s), MARGIN.left + half), options.width - half - 4);
    const step = boxes.some((box) => px - half < box.x1 && px + half > box.x0) ? -11 : 0;
    if (!step) boxes.push({ x0: px - half, x1: px + half });
    labels.push(svg('text', { class: 'drawn middle halo', x: px, y: row + step }, [hold.name]));
    const next = sorted[index + 1];
    if (!next) return;
    const gap = x(next.s) - x(hold.s) - half - (next.name.length * LETTER) / 2;
    const words = options.length(next.s - hold.s);
    if (gap < words.length * LETTER + 10 || step) return;
    const start = x(hold.s) + half;
    labels.push(svg('text', { class: 'drawn bold middle', x: start + gap / 2, y: row }, [words]));
    boxes.push({ x0: start + gap / 2 - 14, x1: start + gap / 2 + 14 });
  });
  return labels;
}

/**
 * @param {SideOptions} options
 * @param {ReturnType<typeof sideScale>} frame
 * @param {number} width
 */
function titleBlock(options, frame, width) {
  if (width < ROOM_FOR_TITLE) return [];
  const scale = frame.same ? 'same scale as the plan' : 'heights and lengths at one scale';
  return [
    svg('text', { class: 'side-title halo', x: 8, y: 15 }, [options.title]),
    svg('text', { class: 'drawn soft end halo', x: width - MARGIN.right, y: 15 }, [[scale, ...options.notes].join('; ')]),
  ];
}
