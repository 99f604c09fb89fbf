// @ts-check
import { svg } from '../draw/svg.js';

/** The marks of the three states, drawn on a box of 12, so that no state rests on hue or on a font. */

/** @type {Record<string, string>} */
const PATHS = {
  clear: 'M2 6.6 4.8 9.6 10.4 2.6',
  tight: 'M6 1.6V7.4M6 9.4V11',
  foul: 'M2.4 2.4 9.6 9.6M9.6 2.4 2.4 9.6',
};

/**
 * @param {string} state clear, tight or foul
 * @param {string} [label] said by a screen reader; left out where the word stands beside the mark
 * @returns {SVGElement}
 */
export function stateMark(state, label) {
  return svg('svg', {
    class: `mark mark-${state}`, viewBox: '0 0 12 12', width: 12, height: 12,
    role: label ? 'img' : null, 'aria-label': label ?? null, 'aria-hidden': label ? null : 'true',
  }, [svg('path', { d: PATHS[state] ?? PATHS.tight })]);
}

/**
 * The same mark inside another drawing.
 * @param {string} state
 * @param {number} x centre
 * @param {number} y centre
 * @returns {SVGElement}
 */
export function markAt(state, x, y) {
  return svg('path', {
    class: `mark mark-${state}`, d: PATHS[state] ?? PATHS.tight, transform: `translate(${x - 6} ${y - 6})`,
  });
}

/** Worst last, as they are ranked. */
const ORDER = ['clear', 'tight', 'foul'];

/**
 * @param {ReadonlyArray<string>} states
 * @returns {string} the worst of them, clear when there are none
 */
export function worst(states) {
  return ORDER[Math.max(0, ...states.map(state => ORDER.indexOf(state)))];
}
