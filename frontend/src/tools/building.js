// @ts-check
/** Draws a building by walking round its walls. */
import { drawing } from './drawing.js';

export const building = drawing({ name: 'buildings', kind: 'buildings', shape: 'ring', label: 'building' });
