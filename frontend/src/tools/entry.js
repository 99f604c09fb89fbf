// @ts-check
/** Places the point where the feed line comes into the station. */
import { placing } from './placing.js';

export const entry = placing({ name: 'entry', kind: 'entry', label: 'station entry' });
