// @ts-check
/** Draws a line of metal: a gutter, a fence, a rail. */
import { drawing } from './drawing.js';

export const metalwork = drawing({ name: 'metalwork', kind: 'metalwork', shape: 'path', label: 'metalwork', height: '2.5' });
