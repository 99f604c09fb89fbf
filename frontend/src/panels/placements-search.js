// @ts-check
import { forgetSearch, recallSearch, rememberSearch } from '../api/keep.js';
import { bestFirst, scoreWords } from './placement-facts.js';

/**
 * Starting, following and stopping a search. Everything known of it is in `state.search`.
 *
 * @typedef {import('../state/store.js').Store} Store
 * @typedef {'quick'|'normal'|'thorough'} Effort
 * @typedef {{api: typeof import('../api/client.js'), saveNow: () => Promise<string>, planView: any,
 *   go: (place: string) => void, say: (sentence: string) => void, sideView?: HTMLElement}} Shell
 */

/** Ends the listening to the search that is followed now. One page follows one search. */
/** @type {WeakMap<Store, () => void>} */
const following = new WeakMap();

/**
 * @param {Store} store
 * @param {object} patch
 */
function patchSearch(store, patch) {
  store.set({ search: { ...store.get().search, ...patch } });
}

/**
 * Saves the plan and starts a search of it.
 * @param {Store} store
 * @param {Shell} shell
 * @param {Effort} effort
 */
export async function startSearch(store, shell, effort) {
  following.get(store)?.();
  const planAtSearch = store.get().plan;
  store.set({
    chosen: null,
    pinned: null,
    shownRefusal: null,
    search: /** @type {any} */ ({
      id: null,
      state: 'running',
      progress: 0,
      what: 'saving the plan',
      found: [],
      own: [],
      result: null,
      error: null,
      faults: [],
      planAtSearch,
      effort,
      considered: 0,
      refused: 0,
    }),
  });
  shell.say('Search started.');
  try {
    const planId = await shell.saveNow();
    const id = await shell.api.startSearch(planId, { effort });
    if (store.get().search.planAtSearch !== planAtSearch || store.get().search.state !== 'running') {
      await shell.api.cancelSearch(id);
      return;
    }
    patchSearch(store, { id, what: 'laying out what the plot holds' });
    follow(store, shell, id);
  } catch (problem) {
    const { message, faults } = /** @type {any} */ (problem);
    patchSearch(store, { state: 'failed', error: message, faults: faults ?? [] });
    shell.say(`The search did not start. ${message}`);
  }
}

/**
 * @param {Store} store
 * @param {Shell} shell
 * @param {string} id
 */
function follow(store, shell, id) {
  const mine = () => store.get().search.id === id;
  const stop = shell.api.followSearch(id, {
    progress(data) {
      if (!mine()) return;
      patchSearch(store, {
        progress: data.progress,
        what: data.what,
        considered: data.considered,
        refused: data.refused,
        broken: false,
      });
    },
    found(placement) {
      if (!mine()) return;
      const found = [...store.get().search.found.filter((one) => one.id !== placement.id), placement];
      patchSearch(store, { found });
    },
    done(result) {
      if (!mine()) return;
      const before = store.get();
      const was = before.search.found.find((one) => one.id === before.chosen);
      const kept = was && result.placements.find((/** @type {any} */ one) => sameHolds(one, was));
      patchSearch(store, { state: 'done', progress: 1, result });
      const { planId, search } = store.get();
      if (planId) rememberSearch({ planId, id, plan: JSON.stringify(search.planAtSearch) });
      store.set({ chosen: (kept ?? result.placements[0])?.id ?? null });
      const count = result.placements.length;
      shell.say(
        count
          ? `Search done: ${count} placement${count === 1 ? '' : 's'}, the best ${scoreWords(result.placements[0].score)}.`
          : 'Search done: no placement is allowed.',
      );
    },
    failed(problem) {
      if (!mine()) return;
      const message = problem.detail || problem.title || 'The search stopped without saying why.';
      patchSearch(store, { state: 'failed', error: message, faults: problem.faults ?? [] });
      shell.say(`The search failed. ${message}`);
    },
    lost() {
      if (!mine() || store.get().search.state !== 'running') return;
      patchSearch(store, { broken: true });
      void recover(store, shell, id);
    },
  });
  following.set(store, stop);
}

/**
 * After a broken stream: the browser listens again by itself, but a search the server has forgotten never ends.
 * @param {Store} store
 * @param {Shell} shell
 * @param {string} id
 */
async function recover(store, shell, id) {
  try {
    const search = await shell.api.readSearch(id);
    if (store.get().search.id !== id || search.state === 'running') return;
    if (search.state === 'done' && search.result) {
      patchSearch(store, { state: 'done', progress: 1, result: search.result, broken: false });
      if (!store.get().chosen) store.set({ chosen: search.result.placements[0]?.id ?? null });
    } else {
      patchSearch(store, {
        state: search.state,
        error: 'The search ended on the server without a result. Start it again.',
      });
    }
    following.get(store)?.();
  } catch (problem) {
    if (/** @type {any} */ (problem).status === 404 && store.get().search.id === id) {
      following.get(store)?.();
      patchSearch(store, {
        state: 'failed',
        error: 'The server was started anew and no longer knows this search. Start it again.',
        faults: [],
      });
    }
  }
}

/**
 * After a reload: the last search of this tab, while the server still holds it and the same plot is open.
 * @param {Store} store
 * @param {Shell} shell
 */
export async function regainSearch(store, shell) {
  const searched = recallSearch();
  const here = () => store.get().planId === searched?.planId && store.get().search.state === 'none';
  if (!searched || !here()) return;
  try {
    const held = await shell.api.readSearch(searched.id);
    if (!here() || held.state !== 'done' || !held.result) return;
    const { plan } = store.get();
    const same = JSON.stringify(plan) === searched.plan;
    patchSearch(store, {
      id: searched.id,
      state: 'done',
      progress: 1,
      result: held.result,
      found: [],
      own: [],
      planAtSearch: same ? plan : JSON.parse(searched.plan),
    });
    store.set({ chosen: held.result.placements[0]?.id ?? null });
  } catch {
    forgetSearch();
  }
}

/** @param {any} a @param {any} b */
function sameHolds(a, b) {
  const key = (/** @type {any} */ one) =>
    one.shape +
    one.attachments
      .map((/** @type {any} */ hold) => hold.on + hold.at.map((/** @type {number} */ v) => v.toFixed(1)))
      .join();
  return key(a) === key(b);
}

/**
 * Stops the search that runs; what was found stays.
 * @param {Store} store
 * @param {Shell} shell
 */
export async function cancelSearch(store, shell) {
  const { id } = store.get().search;
  following.get(store)?.();
  patchSearch(store, { state: 'cancelled' });
  const best = [...store.get().search.found].sort(bestFirst)[0];
  if (best && !store.get().chosen) store.set({ chosen: best.id });
  shell.say('Search cancelled.');
  if (!id) return;
  try {
    await shell.api.cancelSearch(id);
  } catch {
    // It has ended by itself or the server is gone: nothing is left to stop.
  }
}
