// @ts-check
import { curesFor, placeOf } from '../../state/cures.js';
import { changeThing, duplicate, insertVertex, moveThing, moveVertex, remove, removeVertex, setBoundaryRule, setField } from '../../state/edits.js';
import { extentOf, find, nameOf, refOfPath, things } from '../../state/kinds.js';
import { ledger, nextStep } from '../../state/ledger.js';
import { make, newPlan, ridgeTurned, withFollowing } from '../../state/made.js';
import { createStore } from '../../state/store.js';
import { assert, test } from './harness.js';

const HOUSE = [[2, 2], [8, 2], [8, 6], [2, 6]];

/** @returns {any} a plan with a boundary, a house and a mast */
function garden() {
  let plan = newPlan('Garden');
  plan = make(plan, 'boundary', [[0, 0], [10, 0], [10, 20], [0, 20]]).plan;
  plan = make(plan, 'buildings', HOUSE).plan;
  return make(plan, 'supports', [[5, 15]], 'mast').plan;
}

test('an edit can be undone and done again, without end', () => {
  const store = createStore({ plan: { n: 0 } });
  for (let i = 1; i <= 300; i++) store.edit(`step ${i}`, (p) => ({ ...p, n: i }));
  for (let i = 0; i < 300; i++) store.undo();
  assert.same(store.get().plan.n, 0);
  assert.same(store.get().undoLabel, null);
  assert.same(store.get().redoLabel, 'step 1');
  for (let i = 0; i < 400; i++) store.redo();
  assert.same(store.get().plan.n, 300);
});

test('a drag is one undo step, and the next drag another', () => {
  const store = createStore({ plan: { n: 0 } });
  for (let i = 1; i < 9; i++) store.edit('Move', (p) => ({ ...p, n: i }), 'drag');
  store.endGroup();
  store.edit('Move', (p) => ({ ...p, n: 99 }), 'drag');
  store.undo();
  assert.same(store.get().plan.n, 8);
  store.undo();
  assert.same(store.get().plan.n, 0);
});

test('a new edit forgets what was undone', () => {
  const store = createStore({ plan: { n: 0 } });
  store.edit('a', () => ({ n: 1 }));
  store.undo();
  store.edit('b', () => ({ n: 2 }));
  store.redo();
  assert.same(store.get().plan.n, 2);
});

test('listeners hear at once and only when their part changes', () => {
  const store = createStore({ plan: {}, units: 'm', tool: 'select' });
  /** @type {any[]} */
  const heard = [];
  const stop = store.subscribe((s) => [s.units, s.plan], ([units]) => heard.push(units));
  store.set({ tool: 'tape' });
  store.set({ units: 'ft' });
  stop();
  store.set({ units: 'm' });
  assert.same(heard, ['m', 'ft']);
});

test('new things have their own id and name and figures that are a fair start', () => {
  let plan = garden();
  plan = make(plan, 'supports', [[1, 1]], 'tree').plan;
  plan = make(plan, 'supports', [[2, 1]], 'tree').plan;
  const ids = things(plan).map((t) => t.ref);
  assert.same(new Set(ids).size, ids.length);
  const house = plan.buildings[0];
  assert.same([house.eaves, house.roof, house.ridgeLine.length], [2.5, 'gable', 2]);
  assert(plan.supports[1].name !== plan.supports[2].name);
});

test('moving a house moves its ridge; stretching it keeps the ridge amid', () => {
  const moved = moveThing(garden(), 'buildings/building-1', 1, -1);
  assert.same(moved.buildings[0].footprint[0], [3, 1]);
  assert.same(moved.buildings[0].ridgeLine, [[3, 3], [9, 3]]);
  let wide = moveVertex(garden(), 'buildings/building-1', 1, [9, 2]);
  wide = moveVertex(wide, 'buildings/building-1', 2, [9, 6]);
  assert.same(wide.buildings[0].ridgeLine, [[2, 4], [9, 4]]);
});

test('rules of the boundary stay with their side when a corner comes or goes', () => {
  let plan = setBoundaryRule(garden(), 2, { overhang: 'ropes', agreedBy: 'the owner next door' });
  plan = insertVertex(plan, 'boundary/', 0, [5, 0]);
  assert.same(plan.boundaryRules[0].edge, 3);
  plan = removeVertex(plan, 'boundary/', 1);
  assert.same(plan.boundaryRules[0].edge, 2);
  assert.same(setBoundaryRule(plan, 2, { overhang: 'none' }).boundaryRules, []);
});

test('a corner that is needed stays', () => {
  const plan = make(newPlan(), 'boundary', [[0, 0], [1, 0], [0, 1]]).plan;
  assert(removeVertex(plan, 'boundary/', 0) === plan);
});

test('heights of a line stay with their points', () => {
  const plan = make(newPlan(), 'overheadLines', [[0, 0, 6], [10, 0, 5]]).plan;
  const moved = moveVertex(plan, 'overheadLines/overhead-line-1', 1, [12, 1]);
  assert.same(moved.overheadLines[0].path[1], [12, 1, 5]);
  const more = insertVertex(moved, 'overheadLines/overhead-line-1', 0, [6, 0]);
  assert.same(more.overheadLines[0].path[1], [6, 0, 5.5]);
});

test('edits leave the old plan as it was', () => {
  const plan = garden();
  const before = JSON.stringify(plan);
  moveVertex(plan, 'boundary/', 0, [1, 1]);
  setField(plan, 'supports/mast-1', 'highest', 12);
  remove(plan, 'supports/mast-1');
  duplicate(plan, 'buildings/building-1');
  assert.same(JSON.stringify(plan), before);
});

test('deleting and undoing entries, datums and spot heights', () => {
  let plan = make(garden(), 'entry', [[2, 3]]).plan;
  plan = make(plan, 'datums', [[0, 0]]).plan;
  plan = make(plan, 'datums', [[1, 0]]).plan;
  plan = make(plan, 'spots', [[1, 1, 0.4]]).plan;
  assert.same(plan.datums.map((/** @type {any} */ d) => d.name), ['A', 'B']);
  assert.same(plan.site.terrain.spots, [[1, 1, 0.4]]);
  assert.same(remove(plan, 'entry/').entry, undefined);
  assert.same(remove(plan, 'datums/0').datums[0].name, 'B');
  assert.same(remove(plan, 'spots/0').site.terrain, undefined);
});

test('what follows a figure follows it', () => {
  const line = make(newPlan(), 'overheadLines', [[0, 0, 6], [9, 0, 6]]).plan.overheadLines[0];
  assert.same(withFollowing(line, 'overheadLines', 'kind', 'telephone').clearance, 0.6);
  const house = garden().buildings[0];
  assert.same(withFollowing(house, 'buildings', 'roof', 'flat').ridge, house.eaves);
  assert.same(withFollowing({ rule: 'no-mast' }, 'zones', 'rule', 'headroom').height, 5);
  assert.same(withFollowing({ rule: 'headroom', height: 4 }, 'zones', 'rule', 'no-wire').height, undefined);
});

test('a fault is shown at the thing its path names', () => {
  const plan = garden();
  assert.same(refOfPath(plan, 'supports[0].highest'), { ref: 'supports/mast-1', vertex: null });
  assert.same(refOfPath(plan, '/buildings/0/footprint/2'), { ref: 'buildings/building-1', vertex: 2 });
  assert.same(refOfPath(plan, 'boundary[3]'), { ref: 'boundary/', vertex: 3 });
  assert.same(refOfPath(plan, 'brief.bands[0]'), null);
  assert.same(refOfPath(plan, 'supports[7]'), null);
  assert.same(placeOf(plan, { path: 'supports[0]' })?.at, [5, 15]);
});

test('cures mend what they say they mend', () => {
  let plan = garden();
  plan = moveThing(plan, 'supports/mast-1', 8, 0);
  const [move] = curesFor(plan, { path: 'supports[0].at' });
  assert.same(move.label, 'Move it to the boundary');
  assert(move.change(plan).supports[0].at[0] < 10);
  plan = changeThing(plan, 'supports/mast-1', (s) => ({ ...s, lowest: 9, highest: 3 }));
  const swap = curesFor(plan, { path: 'supports[0].highest' }).find((c) => c.label.startsWith('Swap'));
  assert.same(swap?.change(plan).supports[0].highest, 9);
});

test('the ledger and the next step lead a newcomer through', () => {
  const length = (/** @type {number} */ v) => `${v} m`;
  let plan = newPlan();
  assert(nextStep(plan, [])?.startsWith('Begin with the boundary'));
  plan = garden();
  assert(nextStep(plan, [])?.startsWith('One more place'));
  plan = make(plan, 'supports', [[1, 19]], 'tree').plan;
  assert(nextStep(plan, [])?.includes('feed line'));
  plan = make(plan, 'entry', [[2, 3]]).plan;
  assert.same(nextStep(plan, []), null);
  const rows = ledger(plan, [{ path: 'supports[0].at', message: 'x' }], length);
  assert.same(rows.find((r) => r.what === 'Supports')?.state, 'fault');
  assert.same(rows.find((r) => r.what === 'Boundary')?.state, 'held');
});

test('a new plot has a brief a search can work with', () => {
  const { brief } = newPlan();
  assert.same([brief.bands.length, brief.targets.length > 0], [3, true]);
  const names = new Set(brief.bands.map((/** @type {any} */ b) => b.name));
  for (const t of brief.targets) for (const b of t.bands) assert(names.has(b), b);
});

test('every thing has a name and is found again by its ref', () => {
  const plan = garden();
  for (const { ref, kind, thing, index } of things(plan)) {
    assert.same(find(plan, ref)?.thing === thing, true, ref);
    assert(nameOf(kind, thing, index).length > 0);
  }
  assert(extentOf(plan).length > 8);
});

test('a ridge can be turned to run the other way, and back', () => {
  const house = garden().buildings[0];
  const once = ridgeTurned(house);
  assert.same(once.ridgeLine, [[5, 2], [5, 6]]);
  assert.same([...ridgeTurned(once).ridgeLine].sort(), [...house.ridgeLine].sort());
});

test('a support that is given another kind takes the name of its kind, unless it has its own', () => {
  const mast = garden().supports[0];
  const tree = withFollowing(mast, 'supports', 'kind', 'tree');
  assert.same([tree.name, tree.kind, tree.canopy.radius], ['Tree', 'tree', 3]);
  assert.same(withFollowing({ ...mast, name: 'Old mast' }, 'supports', 'kind', 'pole').name, 'Old mast');
});
