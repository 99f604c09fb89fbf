// @ts-check
/** Asks the server what is wrong with the plan, a moment after it changed; old answers are dropped. */
import { placeOf } from './cures.js';

const REST = 350;

/**
 * @param {import('./store.js').Store} store
 * @param {(plan: any, signal: AbortSignal) => Promise<{path: string, message: string}[]>} check
 */
export function createChecker(store, check) {
  /** @type {number|undefined} */
  let timer;
  /** @type {AbortController|null} */
  let asking = null;

  async function ask() {
    asking?.abort();
    const mine = new AbortController();
    asking = mine;
    const { plan } = store.get();
    try {
      const faults = await check(plan, mine.signal);
      if (store.get().plan === plan) store.set({ faults });
    } catch (problem) {
      const faults = /** @type {any} */ (problem)?.faults;
      if (Array.isArray(faults) && faults.length && store.get().plan === plan) store.set({ faults });
    }
  }

  store.subscribe((s) => s.plan, (plan, before) => {
    // What was missing and has just been drawn is not marked as faulty until the answer comes.
    const { faults } = store.get();
    const still = faults.filter((fault) => !before || placeOf(before, fault) || !placeOf(plan, fault));
    if (still.length < faults.length) store.set({ faults: still });
    clearTimeout(timer);
    timer = setTimeout(ask, REST);
  });
}
