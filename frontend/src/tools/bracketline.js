// @ts-check
/** Draws an edge along which a bracket may be fixed. */
import { drawing } from './drawing.js';

export const bracketLine = drawing({ name: 'bracketLines', kind: 'bracketLines', shape: 'path', label: 'bracket line' });
