// @ts-check
/** Places a spot height of sloping ground. */
import { placing } from './placing.js';

export const spot = placing({ name: 'spots', kind: 'spots', label: 'spot height', height: '0' });
