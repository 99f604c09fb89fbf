// @ts-check
/** Selecting, dragging, nudging, deleting: the hand that holds no tool. A drag is one undo step. */
import { onGrid } from '../geometry/vector.js';
import { duplicate, insertVertex, moveThing, moveVertex, remove, removeVertex } from '../state/edits.js';
import { find, KINDS, nameOf, partsOf, pointsOf } from '../state/kinds.js';
import { guidesAround, snapOn, stepAt } from './snapping.js';

/** @typedef {import('./types.js').Bench} Bench */

/** @param {Bench} bench @returns {string} what the selected thing is called */
function selectedName(bench) {
  const { plan, selection } = bench.store.get();
  const found = selection && find(plan, selection.ref);
  return found ? nameOf(found.kind, found.thing, found.index) : '';
}

/** @param {Bench} bench */
export function deleteSelected(bench) {
  const { plan, selection } = bench.store.get();
  if (!selection) return;
  const name = selectedName(bench);
  if (selection.vertex !== null) {
    const next = removeVertex(plan, selection.ref, selection.vertex);
    if (next === plan) {
      bench.say(`${name} needs every corner it has.`);
      return;
    }
    bench.store.edit(`Take a corner from ${name}`, () => next);
    bench.store.set({ selection: { ref: selection.ref, vertex: null } });
    return;
  }
  bench.store.edit(`Delete ${name}`, (now) => remove(now, selection.ref));
  bench.store.set({ selection: null });
  bench.say(`${name} deleted. Undo brings it back.`);
}

/** @param {Bench} bench */
export function duplicateSelected(bench) {
  const { plan, selection } = bench.store.get();
  const copy = selection && duplicate(plan, selection.ref);
  if (!copy) return;
  bench.store.edit(`Duplicate ${selectedName(bench)}`, () => copy.plan);
  bench.store.set({ selection: { ref: copy.ref, vertex: null } });
}

/** @param {Bench} bench @param {import('./types.js').PointerTold} event @returns {boolean} */
function down(bench, event) {
  const { plan, selection } = bench.store.get();
  if (!selection || event.ref !== selection.ref) return false;
  bench.store.endGroup();
  if (event.edge !== null) {
    bench.store.edit(`Add a corner to ${selectedName(bench)}`, (now) =>
      insertVertex(now, selection.ref, event.edge ?? 0, event.at), 'drag');
    bench.store.set({
      selection: { ref: selection.ref, vertex: event.edge + 1 },
      draft: { tool: 'select', drag: 'vertex', vertex: event.edge + 1, start: event.at, shape: 'drag' },
    });
    return true;
  }
  const found = find(plan, selection.ref);
  if (!found) return false;
  const single = KINDS[found.kind].shape === 'point';
  const vertex = single ? 0 : event.vertex;
  bench.store.set({
    selection: { ref: selection.ref, vertex: single ? null : event.vertex },
    draft: {
      tool: 'select', drag: vertex !== null ? 'vertex' : 'thing', vertex, start: event.at,
      from: pointsOf(found.kind, found.thing)[0], gone: [0, 0], shape: 'drag',
    },
  });
  return true;
}

/** @param {Bench} bench @param {import('./types.js').PointerTold} event */
function drag(bench, event) {
  const { plan, selection, draft } = bench.store.get();
  if (!selection || draft?.shape !== 'drag') return;
  const name = selectedName(bench);
  if (draft.drag === 'vertex') {
    const found = find(plan, selection.ref);
    if (!found) return;
    const points = pointsOf(found.kind, found.thing);
    const closed = KINDS[found.kind].shape === 'ring';
    const snapped = snapOn(plan, event.at, event, {
      except: { ref: selection.ref, vertex: points.length > 1 ? draft.vertex : null },
      guides: points.length > 1 ? guidesAround(points, draft.vertex, closed) : [],
    });
    bench.store.edit(`Move ${points.length > 1 ? `a corner of ${name}` : name}`, (now) =>
      moveVertex(now, selection.ref, draft.vertex, snapped.point), 'drag');
    bench.store.set({ cursor: { point: snapped.point, reason: snapped.reason } });
    return;
  }
  const want = [draft.from[0] + event.at[0] - draft.start[0], draft.from[1] + event.at[1] - draft.start[1]];
  const to = event.free ? want : onGrid(want, stepAt(event.ppm));
  const dx = to[0] - draft.from[0] - draft.gone[0];
  const dy = to[1] - draft.from[1] - draft.gone[1];
  bench.store.edit(`Move ${name}`, (now) => moveThing(now, selection.ref, dx, dy), 'drag');
  bench.store.set({
    draft: { ...draft, gone: [draft.gone[0] + dx, draft.gone[1] + dy] },
    cursor: { point: to, reason: 'whole decimetres' },
  });
}

/** @type {import('./types.js').Tool} */
export const select = {
  name: 'select',
  start: (bench) => bench.store.set({ draft: null }),
  pointer(bench, event) {
    if (event.type === 'down') return down(bench, event);
    if (event.type === 'drag') drag(bench, event);
    if (event.type === 'up' || event.type === 'cancel') {
      bench.store.endGroup();
      if (bench.store.get().draft?.shape === 'drag') bench.store.set({ draft: null });
    }
    if (event.type === 'tap') {
      bench.store.set({ selection: event.ref ? { ref: event.ref, vertex: event.vertex } : null, draft: null });
    }
    if (event.type === 'move') {
      bench.store.set({ hovered: event.ref, cursor: { point: onGrid(event.at, stepAt(event.ppm)), reason: '' } });
    }
    if (event.type === 'leave') bench.store.set({ hovered: null, cursor: null });
    return false;
  },
  key(bench, event) {
    const { selection } = bench.store.get();
    if (!selection) return false;
    if (event.key === 'Delete' || event.key === 'Backspace') {
      deleteSelected(bench);
      return true;
    }
    if ((event.key === 'd' || event.key === 'D') && event.ctrl) {
      duplicateSelected(bench);
      return true;
    }
    if (event.key === 'Escape') {
      bench.store.set({ selection: selection.vertex === null ? null : { ref: selection.ref, vertex: null } });
      return true;
    }
    if (event.key === '[' || event.key === ']') return stepVertex(bench, event.key === ']' ? 1 : -1);
    if (!event.key.startsWith('Arrow')) return false;
    nudge(bench, event);
    return true;
  },
};

/** @param {Bench} bench @param {import('./types.js').KeyTold} event */
function nudge(bench, event) {
  const { selection } = bench.store.get();
  if (!selection) return;
  const step = event.shift ? 1 : 0.1;
  const [x, y] = { ArrowLeft: [-1, 0], ArrowRight: [1, 0], ArrowUp: [0, 1], ArrowDown: [0, -1] }[event.key] ?? [0, 0];
  const { kind } = partsOf(selection.ref);
  const group = `nudge ${selection.ref} ${selection.vertex}`;
  bench.store.edit(`Nudge ${selectedName(bench)}`, (plan) => {
    const { vertex, ref } = selection;
    const found = find(plan, ref);
    if (vertex === null || !found) return moveThing(plan, ref, x * step, y * step);
    const p = pointsOf(kind, found.thing)[vertex];
    return p ? moveVertex(plan, ref, vertex, [p[0] + x * step, p[1] + y * step]) : plan;
  }, group);
}

/** The next or last corner by key. @param {Bench} bench @param {number} by */
function stepVertex(bench, by) {
  const { plan, selection } = bench.store.get();
  const found = selection && find(plan, selection.ref);
  if (!selection || !found || KINDS[found.kind].shape === 'point') return false;
  const n = pointsOf(found.kind, found.thing).length;
  const vertex = ((selection.vertex ?? (by > 0 ? -1 : n)) + by + n) % n;
  bench.store.set({ selection: { ref: selection.ref, vertex } });
  bench.say(`Corner ${vertex + 1} of ${n}`);
  return true;
}
