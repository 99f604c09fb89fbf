// @ts-check
/** Draws an area where people walk or sit. */
import { drawing } from './drawing.js';

export const people = drawing({ name: 'people', kind: 'people', shape: 'ring', label: 'place for people' });
