// @ts-check
/** Draws an area where a new mast may stand. */
import { drawing } from './drawing.js';

export const mastZone = drawing({ name: 'mastZones', kind: 'mastZones', shape: 'ring', label: 'mast zone' });
