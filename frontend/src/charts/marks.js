// @ts-check
import { mark, markPath } from '../draw/mark.js';
import { set, svg } from '../draw/svg.js';

/** The marks of the three states beside text and inside charts. */

/** Worst last. */
const ORDER = /** @type {const} */ (['clear', 'tight', 'foul']);

/** @param {string} state @returns {typeof ORDER[number]} a state not known is shown as tight, never as clear */
const known = (state) => ORDER.find((one) => one === state) ?? 'tight';

/**
 * @param {string} state clear, tight or foul
 * @param {string} [label] said by a screen reader; left out where the word stands beside the mark
 * @returns {SVGElement}
 */
export function stateMark(state, label) {
  const box = mark(known(state));
  if (label) set(box, { role: 'img', 'aria-label': label, 'aria-hidden': null });
  return box;
}

/**
 * @param {string} state
 * @param {number} x centre
 * @param {number} y centre
 * @returns {SVGElement} inside another drawing
 */
export function markAt(state, x, y) {
  return svg('g', { transform: `translate(${x.toFixed(1)} ${y.toFixed(1)})` }, [markPath(known(state))]);
}

/**
 * @param {ReadonlyArray<string>} states
 * @returns {string} the worst of them, clear when there are none
 */
export function worst(states) {
  return ORDER[Math.max(0, ...states.map((state) => ORDER.indexOf(known(state))))];
}
