// @ts-check
import { atPlace, svg } from '../svg.js';

/**
 * Lettering that gives way: a label tries places about its anchor and takes the first that hits no other label and
 * stays in sight; the greater labels are asked for first. Pixels about the view's north-west corner, y down.
 *
 * @typedef {{x0: number, y0: number, x1: number, y1: number}} Box
 * @typedef {{x: number, y: number, width: number, height: number, ppm: number}} View plan metres, south-west corner
 */

const LETTER = 5.6;
const LINE = 14;

/**
 * @param {number} width px in sight
 * @param {number} height px in sight
 */
export function labelRoom(width, height) {
  /** @type {Box[]} */
  const taken = [];
  const free = (/** @type {Box} */ box) => box.x0 > 2 && box.y0 > 2 && box.x1 < width - 2 && box.y1 < height - 2
    && !taken.some((other) => box.x0 < other.x1 && box.x1 > other.x0 && box.y0 < other.y1 && box.y1 > other.y0);
  return {
    /** @param {Box} box */
    block: (box) => { taken.push(box); },
    /**
     * @param {number} x anchor
     * @param {number} y anchor
     * @param {string[]} lines
     * @param {number} gap px kept from the anchor
     * @returns {{x: number, y: number, anchor: 'start'|'middle'|'end'}|null} foot of the first line; null for no room
     */
    place(x, y, lines, gap) {
      const wide = Math.max(...lines.map((line) => line.length)) * LETTER;
      const tall = lines.length * LINE;
      /** @type {{x: number, y: number, anchor: 'start'|'middle'|'end'}[]} */
      const tries = [
        { x: x + gap, y: y + 4, anchor: 'start' }, { x: x - gap, y: y + 4, anchor: 'end' },
        { x: x + gap, y: y - gap, anchor: 'start' }, { x: x - gap, y: y - gap, anchor: 'end' },
        { x: x + gap, y: y + gap + 8, anchor: 'start' }, { x: x - gap, y: y + gap + 8, anchor: 'end' },
        { x, y: y - gap - tall + LINE, anchor: 'middle' }, { x, y: y + gap + 11, anchor: 'middle' },
        { x: x + gap * 3, y: y - gap * 3, anchor: 'start' }, { x: x - gap * 3, y: y - gap * 3, anchor: 'end' },
        { x: x + gap * 3, y: y + gap * 3, anchor: 'start' }, { x: x - gap * 3, y: y + gap * 3, anchor: 'end' },
      ];
      for (const spot of tries) {
        const x0 = spot.anchor === 'start' ? spot.x : spot.anchor === 'end' ? spot.x - wide : spot.x - wide / 2;
        const box = { x0, y0: spot.y - 11, x1: x0 + wide, y1: spot.y - 11 + tall };
        if (!free(box)) continue;
        taken.push(box);
        return spot;
      }
      return null;
    },
  };
}

/**
 * Screen pixels of a plan point.
 * @param {View} view
 * @param {number[]} point
 * @returns {[number, number]}
 */
export function toPixels(view, point) {
  return [(point[0] - view.x) * view.ppm, (view.y + view.height - point[1]) * view.ppm];
}

/**
 * @param {View} view
 * @param {number} x px
 * @param {number} y px
 * @returns {[number, number]} plan metres
 */
export function toMetres(view, x, y) {
  return [view.x + x / view.ppm, view.y + view.height - y / view.ppm];
}

/**
 * A group in pixels about the view's north-west corner.
 * @param {View} view
 * @param {(Node|null)[]} children
 * @param {string} className
 */
export function inPixels(view, children, className) {
  return atPlace([view.x, view.y + view.height], view.ppm, children, { class: className });
}

/**
 * @param {number} x
 * @param {number} y
 * @param {string[]} lines
 * @param {string} className
 * @param {string} [anchor] start, middle or end
 * @returns {SVGElement}
 */
export function lettering(x, y, lines, className, anchor = 'start') {
  return svg('text', { class: `drawn halo ${className}`, x, y, 'text-anchor': anchor },
    lines.map((line, index) => svg('tspan', { x, dy: index ? LINE : 0 }, [line])));
}
