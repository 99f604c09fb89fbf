// @ts-check
/** Places a source of noise. */
import { placing } from './placing.js';

export const noise = placing({ name: 'noise', kind: 'noise', label: 'noise source' });
