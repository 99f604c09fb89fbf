// @ts-check
/** Samples of what each tool draws, 38 × 22 px: the strip is the drawing's key. */
import { scallops } from '../geometry/figures.js';
import { datumSymbol, entrySymbol, noiseSymbol } from './kinds/points.js';
import { supportSymbol } from './kinds/support.js';
import { svg } from './svg.js';

/** @param {number} x @param {number} y @param {SVGElement} node */
const at = (x, y, node) => svg('g', { transform: `translate(${x} ${y})` }, [node]);
/** @param {string} d @param {string} look */
const line = (d, look) => svg('path', { d, class: look });

/** @type {Record<string, () => Node[]>} */
const SAMPLES = {
  select: () => [line('M14 3V18L18 14.5 21 20 23.5 18.7 20.7 13.2H26Z', 'sample-arrow')],
  boundary: () => [line('M1 11H37', 'boundary')],
  buildings: () => [line('M5 3.5H33V18.5H5Z', 'building'), line('M6 12 14 4M6 18 20 4M12 18 26 4M18 18 32 4M24 18 32 10', 'sample-hatch')],
  supports: () => [at(11, 11, supportSymbol('tree')), at(28, 11, supportSymbol('mast'))],
  trees: () => [svg('path', { d: scallops([19, 11], 9.5, 5), class: 'canopy' }), svg('circle', { cx: 19, cy: 11, r: 1.6, class: 'tree-stem' })],
  bracketLines: () => [line('M2 9H36', 'bracket-line'), line('M5.500 9V15M12.500 9V15M19.500 9V15M26.500 9V15M33.500 9V15', 'bracket-barbs')],
  mastZones: () => [line('M4 3.500H34V18.500H4Z', 'mast-zone'), line('M10 11H15M12.500 8.500V13.500M23 11H28M25.500 8.500V13.500', 'mast-zone-plus')],
  overheadLines: () => [svg('rect', { x: 0, y: 1, width: 38, height: 20, class: 'kept-wash' }), line('M0 11H15L17 6 21 16 23 11H38', 'overhead')],
  zones: () => [line('M4 3.500H34V18.500H4Z', 'zone')],
  people: () => [svg('rect', { x: 4, y: 5, width: 30, height: 12, class: 'people' })],
  metalwork: () => [line('M2 11H36', 'metalwork'), ...[4, 19, 34].map((x) => svg('circle', { cx: x, cy: 11, r: 1.8, class: 'metal-bead' }))],
  noise: () => [at(19, 11, noiseSymbol())],
  entry: () => [at(25, 11, entrySymbol())],
  datums: () => [at(19, 12, datumSymbol())],
  spots: () => [line('M11 7 19 15M19 7 11 15', 'spot'), svg('text', { x: 23, y: 15, class: 'sample-figure' }, ['0.3'])],
  tape: () => [line('M5 11H33', 'dimension-line'), line('M2.500 13.500 7.500 8.500M30.500 13.500 35.500 8.500', 'dimension-tick')],
  twotapes: () => [line('M7 18 21 5 32 18', 'dimension-line'), svg('circle', { cx: 21, cy: 5, r: 3, class: 'tape-answer' })],
};

/** @param {string} name of a tool @returns {SVGElement} */
export const sample = (name) =>
  svg('svg', { class: 'key plan-look', viewBox: '0 0 38 22', width: 38, height: 22, 'aria-hidden': 'true' }, SAMPLES[name]?.() ?? []);
