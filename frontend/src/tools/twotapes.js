// @ts-check
/**
 * A point by two tape distances from two known points: point at the first, type its tape, point at
 * the second, type its tape; both answers are shown and one is taken. Taken up while something is
 * being drawn, the answer becomes its next corner; else a support is placed there.
 */
import { twoTapes, crossingAngle } from '../geometry/twotapes.js';
import { tidyPoint } from '../geometry/vector.js';
import { make } from '../state/made.js';
import { stepped } from './drawing.js';
import { snapOn } from './snapping.js';

/** @typedef {import('./types.js').Draft} Draft */
/** @typedef {import('./types.js').Bench} Bench */

/** @type {import('./types.js').Field[]} */
const FIELDS = [
  { name: 'first', label: 'From 1', unit: 'length' },
  { name: 'second', label: 'From 2', unit: 'length' },
];

/** @param {Draft|undefined} then @returns {Draft} */
const fresh = (then) => ({
  tool: 'twotapes', kind: null, shape: 'tapes', points: [], at: null, reason: '', guide: null,
  fields: [], typed: { first: '', second: '' }, focus: null, tapes: { answers: [], gap: 0, chosen: 0, angle: null }, then,
});

/** The answers for what is known so far. @param {Bench} bench @param {Draft} draft @returns {Draft} */
function reckoned(bench, draft) {
  const [a, b] = draft.points;
  const first = bench.length(draft.typed.first);
  const second = bench.length(draft.typed.second);
  const fields = FIELDS.slice(0, draft.points.length);
  if (!a || !b || first === null || second === null) {
    return { ...draft, fields, tapes: { ...draft.tapes, first, second, answers: [], gap: 0, angle: null } };
  }
  const { points, gap } = twoTapes(a, first, b, second);
  const answers = points.map(tidyPoint);
  const chosen = Math.min(draft.tapes.chosen, Math.max(0, answers.length - 1));
  const angle = answers[0] ? crossingAngle(answers[0], a, b) : null;
  return { ...draft, fields, tapes: { first, second, answers, gap, chosen, angle } };
}

/** @param {Bench} bench @param {Draft} draft */
function accept(bench, draft) {
  const at = draft.tapes.answers[draft.tapes.chosen];
  if (!at) return;
  if (draft.then) {
    const height = draft.then.fields.some((f) => f.name === 'height') ? [bench.length(draft.then.typed.height ?? '') ?? 0] : [];
    const next = { ...draft.then, points: [...draft.then.points, [...at, ...height]], at: null, reason: 'by two tapes' };
    if (draft.then.shape !== 'point') {
      bench.store.set({ tool: draft.then.tool, draft: next });
      return;
    }
  }
  const kind = draft.then?.kind ?? 'supports';
  let ref = '';
  bench.store.edit('Place by two tapes', (plan) => {
    const made = make(plan, kind, [at], draft.then?.variant);
    ref = made.ref;
    return made.plan;
  });
  bench.store.set({ selection: { ref, vertex: null }, draft: null, tool: 'select' });
}

/** @type {import('./types.js').Tool} */
export const twotapes = {
  name: 'twotapes',
  start(bench) {
    const before = /** @type {Draft|null} */ (bench.store.get().draft);
    const waits = before && before.tool !== 'twotapes' && before.kind ? before : undefined;
    bench.store.set({ draft: fresh(waits), selection: null });
  },
  pointer(bench, event) {
    const draft = /** @type {Draft} */ (bench.store.get().draft);
    if (!draft || (event.type !== 'move' && event.type !== 'tap')) return false;
    const snapped = snapOn(bench.store.get().plan, event.at, event, { drawn: [...(draft.then?.points ?? []), [1e9, 1e9]] });
    bench.store.set({ cursor: { point: snapped.point, reason: snapped.reason } });
    const { answers } = draft.tapes;
    if (answers.length) {
      const near = answers.map((/** @type {number[]} */ p) => Math.hypot(p[0] - event.at[0], p[1] - event.at[1]));
      const chosen = near.length > 1 && near[1] < near[0] ? 1 : 0;
      const next = { ...draft, tapes: { ...draft.tapes, chosen } };
      bench.store.set({ draft: next });
      if (event.type === 'tap') accept(bench, next);
      return false;
    }
    const next = { ...draft, at: snapped.point, reason: snapped.reason };
    if (event.type === 'tap') setKnown(bench, next);
    else bench.store.set({ draft: next });
    return false;
  },
  key(bench, event) {
    const draft = /** @type {Draft|null} */ (bench.store.get().draft);
    if (!draft) return false;
    const { answers, chosen } = draft.tapes;
    if (event.key.startsWith('Arrow')) {
      if (answers.length > 1) bench.store.set({ draft: { ...draft, tapes: { ...draft.tapes, chosen: 1 - chosen } } });
      else {
        const at = stepped(bench, draft, event);
        bench.store.set({ draft: { ...draft, at }, cursor: { point: at, reason: 'by arrow keys' } });
      }
      return true;
    }
    if (event.key === 'Enter') {
      if (answers.length) accept(bench, draft);
      else if (draft.points.length < 2 && draft.at) setKnown(bench, draft);
      return true;
    }
    if (event.key === 'Backspace') {
      bench.store.set({ draft: reckoned(bench, { ...draft, points: draft.points.slice(0, -1) }) });
      return true;
    }
    return false;
  },
  type(bench, field, text) {
    const draft = /** @type {Draft|null} */ (bench.store.get().draft);
    if (draft) bench.store.set({ draft: reckoned(bench, { ...draft, typed: { ...draft.typed, [field]: text }, focus: field }) });
  },
};

/** @param {Bench} bench @param {Draft} draft */
function setKnown(bench, draft) {
  if (draft.points.length > 1 || !draft.at) return;
  const points = [...draft.points, draft.at];
  const focus = points.length === 1 ? 'first' : 'second';
  bench.store.set({ draft: reckoned(bench, { ...draft, points, focus }) });
}
