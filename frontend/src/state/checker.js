// @ts-check
/** Asks the server what is wrong with the plan, a moment after it changed; old answers are dropped. */

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

  store.subscribe((s) => s.plan, () => {
    clearTimeout(timer);
    timer = setTimeout(ask, REST);
  });
}
