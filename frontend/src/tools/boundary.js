// @ts-check
/** Draws the plot's boundary. */
import { drawing } from './drawing.js';

export const boundary = drawing({ name: 'boundary', kind: 'boundary', shape: 'ring', label: 'boundary' });
