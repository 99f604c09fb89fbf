// @ts-check
/** The marks ✓ ! ✕ as drawn paths on a 12 px box, so that no font decides how they look. */
import { svg } from './svg.js';

/** @type {Record<'clear'|'tight'|'foul', string>} */
const PATHS = {
  clear: 'M1.8 6.6 4.7 9.6 10.2 2.8',
  tight: 'M6 1.4V7.6M6 9.6V11',
  foul: 'M2 2 10 10M10 2 2 10',
};

/**
 * @param {'clear'|'tight'|'foul'} state
 * @returns {SVGElement} inside an SVG: a path about (0, 0), 12 px
 */
export const markPath = (state) =>
  svg('path', { d: PATHS[state], transform: 'translate(-6 -6)', class: `mark mark-${state}` });

/**
 * @param {'clear'|'tight'|'foul'} state
 * @returns {SVGElement} a picture of its own, for text; hidden from screen readers: the word stands beside it
 */
export const mark = (state) =>
  svg('svg', { class: 'mark-box', viewBox: '0 0 12 12', width: 12, height: 12, 'aria-hidden': 'true' }, [
    svg('path', { d: PATHS[state], class: `mark mark-${state}` }),
  ]);
