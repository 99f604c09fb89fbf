// @ts-check
/** A tape: measures between points without leaving anything on the plan. */
import { drawing } from './drawing.js';

export const tape = drawing({
  name: 'tape',
  kind: null,
  shape: 'path',
  label: 'tape',
  done: (bench) => bench.store.set({ draft: null, tool: 'select' }),
});
