// @ts-check
/** Keeping plots against a server of a few lines whose answers can be held back or refused. */
import { createKeeper } from '../../state/keeper.js';
import { createStore } from '../../state/store.js';
import { assert, test } from './harness.js';

const EMPTY = { plan: {}, planId: null, etag: '', saved: { state: 'saved', at: null }, plots: [], demos: [], notice: null };

class Refusal extends Error {
  /** @param {string} name @param {number} [status] */
  constructor(name, status) {
    super('The server said no.');
    this.name = name;
    this.status = status;
  }
}

/** A server, a page and its keeper. @param {Record<string, any>} kept plans by id */
function page(kept) {
  const server = {
    kept,
    offline: false,
    /** @type {(() => Promise<void>)|null} what happens before a save is answered */
    before: null,
    version: 1,
    async write(/** @type {string} */ id, /** @type {any} */ plan) {
      const { before } = server;
      server.before = null;
      await before?.();
      if (server.offline) throw new Refusal('Offline');
      kept[id] = plan;
      server.version += 1;
      return { id, etag: `"${server.version}"` };
    },
  };
  const api = {
    listPlans: async () => Object.keys(kept).map((id) => ({ id, title: kept[id].title })),
    readPlan: async (/** @type {string} */ id) => {
      if (server.offline) throw new Refusal('Offline');
      return { plan: kept[id], etag: '"1"' };
    },
    createPlan: (/** @type {any} */ plan) => server.write(`new-${Object.keys(kept).length}`, plan),
    savePlan: async (/** @type {string} */ id, /** @type {any} */ plan) => {
      const { etag } = await server.write(id, plan);
      return { etag };
    },
    deletePlan: async (/** @type {string} */ id) => delete kept[id],
  };
  const store = createStore(/** @type {any} */ (EMPTY));
  const keeper = createKeeper(store, api, { read: () => null, write: () => true }, () => {});
  const note = (/** @type {string} */ notes) => store.edit('Note', (plan) => ({ ...plan, notes }));
  return { server, api, store, keeper, note };
}

test('what is drawn while a save is under way is saved too before another plot is shown', async () => {
  const { server, store, keeper, note } = page({ a: { title: 'A' }, b: { title: 'B' } });
  await keeper.open('a');
  note('first');
  server.before = async () => note('second');
  await keeper.open('b');
  assert.same([server.kept.a.notes, store.get().planId, store.get().plan.title], ['second', 'b', 'B']);
});

test('a plot that cannot be saved is not left', async () => {
  const { server, store, keeper, note } = page({ a: { title: 'A' } });
  await keeper.open('a');
  note('only here');
  server.offline = true;
  let said = '';
  await keeper.begin().catch((/** @type {Error} */ problem) => {
    said = problem.message;
  });
  assert(said.includes('kept in this browser'), said);
  assert.same([store.get().planId, store.get().plan.notes], ['a', 'only here']);
  server.offline = false;
  await keeper.saveNow();
  assert.same(server.kept.a.notes, 'only here');
});

test('the answer to a save does not reach the plot that is shown meanwhile', async () => {
  const { server, store, keeper, note } = page({ a: { title: 'A' }, b: { title: 'B' } });
  await keeper.open('a');
  note('late');
  /** @type {any} */
  let dropped;
  server.before = async () => {
    dropped = await keeper.drop('a');
  };
  await keeper.saveNow().catch(() => {});
  assert.same(dropped.title, 'A');
  assert.same([store.get().planId, store.get().etag], ['b', '"1"']);
});

test('what is drawn while a copy is set aside stays in the copy', async () => {
  const { server, api, store, keeper, note } = page({ a: { title: 'A' } });
  await keeper.open('a');
  note('mine');
  api.savePlan = async () => {
    throw new Refusal('Problem', 412);
  };
  server.before = async () => note('mine, and more');
  await keeper.retry();
  api.savePlan = (id, plan) => server.write(id, plan);
  await keeper.saveNow();
  const { planId, plan } = store.get();
  assert.same([planId, plan.notes], ['new-1', 'mine, and more']);
  assert.same(server.kept['new-1'].notes, 'mine, and more');
  assert(plan.title.startsWith('A (copy'), plan.title);
});
