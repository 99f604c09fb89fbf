// @ts-check
/** Places a tree that holds nothing but is in the way. */
import { placing } from './placing.js';

export const tree = placing({ name: 'trees', kind: 'trees', label: 'tree' });
