// @ts-check
/** Places a point to measure from. */
import { placing } from './placing.js';

export const datum = placing({ name: 'datums', kind: 'datums', label: 'datum' });
