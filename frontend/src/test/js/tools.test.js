// @ts-check
import { createStore } from '../../state/store.js';
import { newPlan } from '../../state/made.js';
import { createDesk } from '../../tools/desk.js';
import { parseDirectionFrom } from '../../units/angle.js';
import { parseLength } from '../../units/length.js';
import { assert, test } from './harness.js';

function bench() {
  const store = createStore(/** @type {any} */ ({
    plan: newPlan(), place: 'survey', tool: 'select', draft: null, selection: null, units: 'm', cursor: null,
  }));
  const desk = createDesk({
    store, say: () => {}, length: (text) => parseLength(text, 'm'), direction: parseDirectionFrom,
    middle: () => ({ at: [0.3, 0.2], ppm: 50 }),
  });
  const event = (/** @type {string} */ type, /** @type {number[]} */ at, more = {}) => desk.pointer(/** @type {any} */ ({
    type, at, ppm: 50, ref: null, vertex: null, edge: null, shift: false, free: false, touch: false, again: false, ...more,
  }));
  const key = (/** @type {string} */ name, more = {}) => desk.key({ key: name, shift: false, ctrl: false, alt: false, ...more });
  const tap = (/** @type {number[]} */ at, more = {}) => event('tap', at, more);
  return { store, desk, event, key, tap };
}

test('a boundary is drawn by typed lengths and directions', () => {
  const { store, desk, key, tap } = bench();
  desk.take('boundary');
  tap([0, 0]);
  for (const [length, way] of [['9.35', '90'], ['21.8', '0'], ['9.35', 'L']]) {
    desk.type('length', length);
    desk.type('direction', way);
    key('Enter');
  }
  key('c');
  assert.same(store.get().plan.boundary, [[0, 0], [9.35, 0], [9.35, 21.8], [0, 21.8]]);
  assert.same(store.get().selection?.ref, 'boundary/');
  store.undo();
  assert.same(store.get().plan.boundary, []);
});

test('a building closes on a click at its first corner', () => {
  const { store, desk, tap } = bench();
  desk.take('buildings');
  for (const p of [[1, 1], [5, 1], [5, 4], [1, 4], [1.05, 1.05]]) tap(p);
  assert.same(store.get().plan.buildings[0].footprint, [[1, 1], [5, 1], [5, 4], [1, 4]]);
});

test('all of it by keys: arrows move, Enter sets, Backspace takes back', () => {
  const { store, desk, key } = bench();
  desk.take('boundary');
  key('ArrowRight', { shift: true });
  key('Enter');
  for (let i = 0; i < 5; i++) key('ArrowRight', { shift: true });
  key('Enter');
  key('ArrowUp', { shift: true });
  key('Enter');
  key('Backspace');
  for (let i = 0; i < 4; i++) key('ArrowUp', { shift: true });
  key('Enter');
  key('c');
  assert.same(store.get().plan.boundary.length, 3);
  assert.same(store.get().plan.boundary[1], [6, 0]);
});

test('digits begin a length', () => {
  const { store, desk, key, tap } = bench();
  desk.take('buildings');
  tap([0, 0]);
  key('4');
  assert.same([store.get().draft.typed.length, store.get().draft.focus], ['4', 'length']);
});

test('a support is placed by a point and selected', () => {
  const { store, desk, tap } = bench();
  desk.take('supports');
  tap([3.04, 7.01]);
  assert.same(store.get().plan.supports[0].at, [3, 7]);
  assert.same(store.get().selection?.ref, 'supports/mast-1');
  assert.same(store.get().tool, 'select');
});

test('an overhead line carries the height typed for each point', () => {
  const { store, desk, key, tap } = bench();
  desk.take('overheadLines');
  desk.type('height', '7.5');
  tap([0, 0]);
  desk.type('height', '5.2');
  tap([10, 0]);
  key('c');
  assert.same(store.get().plan.overheadLines[0].path, [[0, 0, 7.5], [10, 0, 5.2]]);
});

test('two tapes place the next corner of what is being drawn', () => {
  const { store, desk, tap } = bench();
  desk.take('datums');
  tap([0, 0]);
  desk.take('datums');
  tap([6, 0]);
  desk.take('boundary');
  tap([0, -3]);
  tap([6, -3]);
  desk.take('twotapes');
  tap([0, 0]);
  desk.type('first', '5');
  tap([6, 0]);
  desk.type('second', '5');
  assert.same(store.get().draft.tapes.answers, [[3, 4], [3, -4]]);
  tap([3, 3.5]);
  assert.same(store.get().draft.points, [[0, -3], [6, -3], [3, 4]]);
  assert.same(store.get().tool, 'boundary');
});

test('a thing is dragged once it is selected, as one step', () => {
  const { store, desk, event, tap } = bench();
  desk.take('trees');
  tap([4, 4]);
  const ref = store.get().selection?.ref;
  assert.same(event('down', [4, 4], { ref, vertex: 0 }), true);
  event('drag', [4.6, 4.2], { ref });
  event('drag', [5.01, 5.02], { ref });
  event('up', [5, 5]);
  assert.same(store.get().plan.trees[0].at, [5, 5]);
  store.undo();
  assert.same(store.get().plan.trees[0].at, [4, 4]);
});

test('arrow keys nudge a decimetre, with Shift a metre', () => {
  const { store, desk, key, tap } = bench();
  desk.take('trees');
  tap([4, 4]);
  key('ArrowUp');
  key('ArrowUp');
  key('ArrowRight', { shift: true });
  assert.same(store.get().plan.trees[0].at, [5, 4.2]);
  key('Delete');
  assert.same(store.get().plan.trees, []);
  key('z', { ctrl: true });
  assert.same(store.get().plan.trees.length, 1);
});

test('Escape first gives up the corners, then the tool', () => {
  const { store, desk, key, tap } = bench();
  desk.take('zones');
  tap([0, 0]);
  key('Escape');
  assert.same([store.get().tool, store.get().draft.points.length], ['zones', 0]);
  key('Escape');
  assert.same(store.get().tool, 'select');
});
