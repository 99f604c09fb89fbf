// @ts-check
/**
 * Sets the scale of the traced picture: click two of its points, type how far apart they are in
 * truth (and in which direction, where that is known), Enter.
 */
import { scaled } from '../geometry/picture.js';
import { tidyPoint } from '../geometry/vector.js';

/** @typedef {import('./types.js').Draft} Draft */

/** @returns {Draft} */
const fresh = () => ({
  tool: 'scale', kind: null, shape: 'path', points: [], at: null, reason: '', guide: null,
  fields: [{ name: 'length', label: 'True length', unit: 'length' }, { name: 'direction', label: 'Direction', unit: 'direction' }],
  typed: { length: '', direction: '' }, focus: null,
});

/** @type {import('./types.js').Tool} */
export const scale = {
  name: 'scale',
  start: (bench) => bench.store.set({ draft: fresh(), selection: null }),
  pointer(bench, event) {
    const draft = /** @type {Draft} */ (bench.store.get().draft ?? fresh());
    if (event.type !== 'move' && event.type !== 'tap') return false;
    // No snapping: the picture's points are not yet where the plan's are.
    const at = tidyPoint(event.at);
    if (draft.points.length > 1) return false;
    if (event.type === 'move') bench.store.set({ draft: { ...draft, at } });
    else {
      const points = [...draft.points, at];
      bench.store.set({ draft: { ...draft, points, at: points.length > 1 ? null : at, focus: points.length > 1 ? 'length' : null } });
    }
    return false;
  },
  key(bench, event) {
    const { draft, trace } = bench.store.get();
    if (!draft || !trace) return false;
    if (event.key === 'Backspace') {
      bench.store.set({ draft: { ...draft, points: draft.points.slice(0, -1), focus: null } });
      return true;
    }
    if (event.key !== 'Enter' || draft.points.length < 2) return event.key === 'Enter';
    const length = bench.length(draft.typed.length);
    const way = draft.typed.direction === '' ? null : bench.direction(draft.typed.direction, null);
    if (length === null || !(length > 0)) {
      bench.say('Type how far apart the two points are in truth.');
      return true;
    }
    bench.store.set({ trace: { ...trace, ...scaled(trace, draft.points[0], draft.points[1], length, way) } });
    bench.take('select');
    bench.say('The picture is to scale.');
    return true;
  },
  type(bench, field, text) {
    const { draft } = bench.store.get();
    if (draft) bench.store.set({ draft: { ...draft, typed: { ...draft.typed, [field]: text }, focus: field } });
  },
};
