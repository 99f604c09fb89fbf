// @ts-check
import { atPlace, pathOf, svg } from '../svg.js';

/** What is not the chosen placement: the other candidates, faint, and refused wires as ghosts. Plan metres. */

/**
 * @param {any[]} placements all but the chosen one
 * @param {(id: string) => void} choose
 * @returns {SVGElement[]}
 */
export function candidates(placements, choose) {
  return placements.map((placement) => {
    const d = placement.conductors.map((/** @type {any} */ conductor) => pathOf(conductor.points)).join('');
    const group = svg('g', { class: 'candidate' }, [
      svg('path', { class: 'candidate-hit', d }),
      svg('path', { class: 'candidate-line', d }),
    ]);
    group.addEventListener('click', () => choose(placement.id));
    return group;
  });
}

/**
 * @param {any[]} refusals
 * @param {any|null} shown the one read in the list
 * @param {number} ppm
 * @returns {SVGElement[]}
 */
export function ghosts(refusals, shown, ppm) {
  return refusals.map((refusal) => {
    const cross = svg('path', { class: 'ghost-cross', d: 'M-5 -5 5 5M5 -5 -5 5' });
    return svg('g', { class: refusal === shown ? 'ghost shown' : 'ghost' }, [
      ...refusal.wire.map((/** @type {number[][]} */ wire) => svg('path', { class: 'ghost-line', d: pathOf(wire) })),
      atPlace(refusal.at, ppm, refusal === shown ? [svg('circle', { class: 'ghost-ring', r: 10 }), cross] : [cross]),
    ]);
  });
}
