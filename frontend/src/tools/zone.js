// @ts-check
/** Draws an area with a rule. */
import { drawing } from './drawing.js';

export const zone = drawing({ name: 'zones', kind: 'zones', shape: 'ring', label: 'zone' });
