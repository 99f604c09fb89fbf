// @ts-check
/** Lettering of the plan: measured, placed without collisions, drawn with a halo of paper. */
import { placeLabels } from '../geometry/labels.js';
import { markPath } from './mark.js';
import { set, svg } from './svg.js';

/** @typedef {import('./kinds/env.js').Label} Label */

const LINE = 13;
const SIZE = 11.5;
const MARK = 15;
/** How far outside the frame a thing may lie whose label could still reach in, pixels. */
const BEYOND = 240;

/**
 * @param {import('./planview.js').PlanView} view
 */
export function createLettering(view) {
  const layer = view.layer('labels');
  set(layer, { 'aria-hidden': 'true' });
  const measure = createMeasure();
  /** @type {Label[]} */
  let labels = [];
  /** @type {number[][]} */
  let symbols = [];
  /** @type {number[][][]} */
  let lines = [];
  /** @type {number|undefined} */
  let waiting;

  function place() {
    const sight = view.sight();
    const frame = view.frame();
    const local = (/** @type {number[]} */ p) => {
      const [left, top] = view.toScreen(p);
      return [left - frame.left, top - frame.top];
    };
    const near = labels.filter((label) => {
      const [x, y] = local(label.at);
      return x > -BEYOND && y > -BEYOND && x < frame.width + BEYOND && y < frame.height + BEYOND;
    });
    const wanted = near.map((label) => {
      const spots = spotsOf(label, local, measure);
      return { label, spots, id: label.id, weight: label.weight, insteadOf: label.insteadOf, places: spots.map((s) => s.boxes) };
    });
    const taken = symbols.map((p) => {
      const [x, y] = local(p);
      return { left: x - 6, top: y - 6, width: 12, height: 12 };
    });
    // The north point, the scale bar and the buttons have their corners to themselves.
    taken.push({ left: 0, top: 0, width: frame.left ? 104 : 142, height: frame.left ? 46 : 50 });
    taken.push({ left: frame.width - 84, top: 6, width: 80, height: 112 });
    taken.push({ left: frame.width - 220, top: frame.height - 36, width: 216, height: 34 });
    const soft = lines.flatMap(([a, b]) => along(local(a), local(b), frame));
    const whole = { left: 2, top: 2, width: frame.width - 4, height: frame.height - 4 };
    const placed = placeLabels(wanted, taken, whole, soft);
    const px = 1 / sight.ppm;
    layer.replaceChildren(
      ...wanted.flatMap(({ label, spots }) => {
        const spot = spots[placed.get(label.id) ?? -1];
        return spot ? [letter(label, spot, sight, px, measure)] : [];
      }),
    );
  }

  return {
    /** @param {Label[]} all @param {number[][]} points of symbols @param {number[][][]} segments better not covered */
    show(all, points, segments) {
      labels = all;
      symbols = points;
      lines = segments;
      place();
    },
    /** The view moved at the same scale: lettering moves with the plan, and is placed anew when it rests. */
    moved() {
      clearTimeout(waiting);
      waiting = setTimeout(place, 120);
    },
  };
}

/** Small boxes along a line, those in sight. @param {number[]} a @param {number[]} b @param {{width: number, height: number}} frame */
function along(a, b, frame) {
  const count = Math.min(400, Math.ceil(Math.hypot(b[0] - a[0], b[1] - a[1]) / 8));
  const boxes = [];
  for (let i = 0; i <= count; i++) {
    const x = a[0] + ((b[0] - a[0]) * i) / Math.max(1, count);
    const y = a[1] + ((b[1] - a[1]) * i) / Math.max(1, count);
    if (x > 0 && y > 0 && x < frame.width && y < frame.height) boxes.push({ left: x - 2, top: y - 2, width: 4, height: 4 });
  }
  return boxes;
}

/**
 * @typedef {{x: number, y: number, anchor: 'start'|'middle'|'end', boxes: import('../geometry/labels.js').Box[]}} Spot
 *   x, y: pixels in the frame; y is the middle of the lettering
 */

/**
 * @param {Label} label @param {(p: number[]) => number[]} local
 * @param {(text: string, bold: boolean, big: boolean) => number} measure
 * @returns {Spot[]}
 */
function spotsOf(label, local, measure) {
  const big = label.look === 'big';
  const width = Math.max(...label.lines.map((l) => measure(l.text, Boolean(l.bold), big) + (label.mark ? MARK : 0))) + 4;
  const height = label.lines.length * LINE + 2;
  const gap = label.gap ?? 8;
  const [x, y] = local(label.at);
  const spots = [];
  if (label.sit === 'around') {
    const up = height / 2 + gap - 2;
    spots.push(
      spot(x + gap, y, 'start'), spot(x - gap, y, 'end'), spot(x, y - up, 'middle'), spot(x, y + up, 'middle'),
      spot(x + gap * 0.7, y - up, 'start'), spot(x + gap * 0.7, y + up, 'start'),
      spot(x - gap * 0.7, y - up, 'end'), spot(x - gap * 0.7, y + up, 'end'),
    );
  } else if (label.sit === 'right') {
    spots.push(spot(x + gap, y, 'start'), spot(x - gap, y, 'end'));
  } else if (label.sit === 'above' || label.sit === 'below') {
    const up = (label.sit === 'above' ? -1 : 1) * (height / 2 + gap);
    spots.push(spot(x, y + up, 'middle'), spot(x, y - up, 'middle'));
  } else {
    spots.push(spot(x, y, 'middle'));
  }
  for (const p of label.also ?? []) {
    const [u, v] = local(p);
    spots.push(spot(u, v, 'middle'));
  }
  return spots;

  /** @param {number} u @param {number} v @param {'start'|'middle'|'end'} anchor @returns {Spot} */
  function spot(u, v, anchor) {
    const left = anchor === 'start' ? u : anchor === 'end' ? u - width : u - width / 2;
    const box = { left, top: v - height / 2, width, height };
    return { x: u, y: v, anchor, boxes: label.turn ? turnedBoxes(u, v, width, height, label.turn) : [box] };
  }
}

/** Small upright boxes along turned lettering: one about the whole would hold far too much. @param {number} u @param {number} v @param {number} w @param {number} h @param {number} turn */
function turnedBoxes(u, v, w, h, turn) {
  const a = (turn * Math.PI) / 180;
  const count = Math.max(1, Math.ceil(w / h));
  const part = w / count;
  const width = Math.abs(part * Math.cos(a)) + Math.abs(h * Math.sin(a));
  const height = Math.abs(part * Math.sin(a)) + Math.abs(h * Math.cos(a));
  return Array.from({ length: count }, (_, i) => {
    const t = (i + 0.5) * part - w / 2;
    return { left: u + t * Math.cos(a) - width / 2, top: v + t * Math.sin(a) - height / 2, width, height };
  });
}

/**
 * @param {Label} label @param {Spot} spot @param {import('./planview.js').Sight} sight @param {number} px
 * @param {(text: string, bold: boolean, big: boolean) => number} measure
 */
function letter(label, spot, sight, px, measure) {
  const x = sight.x + spot.x * px;
  const y = sight.y + sight.height - spot.y * px;
  const first = (-(label.lines.length - 1) * LINE) / 2 + 4;
  const transform = `translate(${x} ${y}) scale(${px} ${-px})${label.turn ? ` rotate(${label.turn.toFixed(2)})` : ''}`;
  const shift = !label.mark || spot.anchor === 'end' ? 0 : spot.anchor === 'start' ? MARK : MARK / 2;
  const text = svg(
    'text',
    { class: `lettering ${label.look ?? ''}`, 'text-anchor': spot.anchor, transform: label.mark ? null : transform },
    label.lines.map((line, i) =>
      svg('tspan', { x: i ? 0 : shift, y: first + i * LINE, class: line.bold ? 'bold' : null }, [line.text]),
    ),
  );
  if (!label.mark) return text;
  const wide = measure(label.lines[0].text, Boolean(label.lines[0].bold), label.look === 'big');
  const left = spot.anchor === 'start' ? 6 : spot.anchor === 'end' ? -wide - 9 : -wide / 2 - 2;
  return svg('g', { transform }, [text, svg('g', { transform: `translate(${left} ${first - 4})` }, [markPath(label.mark)])]);
}

/** @returns {(text: string, bold: boolean, big: boolean) => number} width in pixels, remembered */
function createMeasure() {
  const context = document.createElement('canvas').getContext('2d');
  const family = getComputedStyle(document.documentElement).getPropertyValue('--narrow') || 'sans-serif';
  /** @type {Map<string, number>} */
  const known = new Map();
  return (text, bold, big) => {
    const font = `${bold ? 700 : 400} ${big ? 13 : SIZE}px ${family}`;
    const key = `${font} ${text}`;
    let width = known.get(key);
    if (width === undefined) {
      if (context) context.font = font;
      width = context ? context.measureText(text).width : text.length * 6;
      known.set(key, width);
    }
    return width;
  };
}
