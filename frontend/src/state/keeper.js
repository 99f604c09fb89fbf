// @ts-check
/**
 * Keeping plots: saves what is edited to the server a moment later, keeps it in the browser at
 * once, says when the server is gone and tries again, and keeps a copy when another window was
 * first. The calls are given from outside, so that this file knows no network.
 */
import { newPlan } from './made.js';

/** @typedef {import('./store.js').Store} Store */

const REST = 900;
const RETRY = 5000;

/**
 * @param {Store} store
 * @param {any} api calls to the server (api/client.js)
 * @param {any} keep the browser's own memory (api/keep.js)
 * @param {(sentence: string) => void} say
 */
export function createKeeper(store, api, keep, say) {
  /** @type {any} the plan as the server has it */
  let onServer = null;
  /** @type {number|undefined} */
  let timer;
  /** @type {number|undefined} */
  let noting;
  /** @type {Promise<void>|null} */
  let saving = null;
  let opened = -1;

  const now = () => new Date().toISOString();
  const isOffline = (/** @type {any} */ e) => e?.name === 'Offline';
  const status = (/** @type {any} */ e) => e?.status;

  /** @param {import('./types.js').Saved['state']} state @param {string|null} [at] */
  const mark = (state, at = store.get().saved.at) => store.set({ saved: { state, at } });

  function remember() {
    const { plan, planId, etag, saved, units } = store.get();
    keep.write({ planId, etag, plan, unsaved: plan !== onServer, at: saved.at, units });
  }

  /** @returns {Promise<void>} */
  async function saveOnce() {
    const { plan, planId, etag, opened: asked } = store.get();
    if (plan === onServer) return;
    // Another plot may be shown before the answer comes; then it is none of that one's business.
    const gone = () => store.get().opened !== asked;
    mark('saving');
    try {
      const answer = planId === null ? await api.createPlan(plan) : await api.savePlan(planId, plan, etag);
      if (gone()) return;
      onServer = plan;
      store.set({ planId: answer.id ?? planId, etag: answer.etag });
      store.set({ notice: null });
      mark(store.get().plan === onServer ? 'saved' : 'unsaved', now());
      list();
    } catch (problem) {
      if (gone()) return;
      if (isOffline(problem)) mark('offline');
      else if (status(problem) === 412 || status(problem) === 428) await copyAside(plan);
      else if (status(problem) === 404 && planId !== null) store.set({ planId: null, etag: '' });
      else {
        mark('unsaved');
        store.set({ notice: /** @type {Error} */ (problem).message });
      }
    }
    remember();
  }

  /** Another window saved first: both are kept, and this one goes on as a copy. @param {any} plan */
  async function copyAside(plan) {
    const first = store.get().planId;
    const copy = { ...plan, title: `${plan.title || 'Plot'} (copy ${new Date().toTimeString().slice(0, 5)})` };
    const made = await api.createPlan(copy);
    onServer = copy;
    // What was drawn while the copy was made stays.
    store.edit('Keep as a copy', (now) => (now === plan ? copy : { ...now, title: copy.title }));
    store.set({
      planId: made.id, etag: made.etag, clash: first,
      notice: 'Another window saved this plot in the meantime. Yours is kept as a copy, and you are working on it.',
    });
    mark('conflict', now());
    say('Another window saved this plot. Yours is kept as a copy.');
    list();
  }

  /** @returns {Promise<void>} one save at a time */
  function save() {
    clearTimeout(timer);
    saving ??= saveOnce().catch(() => mark('offline')).finally(() => {
      saving = null;
      const { plan, saved } = store.get();
      if (plan !== onServer && !store.get().notice) later(saved.state === 'offline' ? RETRY : REST);
    });
    return saving;
  }

  /** @param {number} wait milliseconds */
  function later(wait) {
    clearTimeout(timer);
    timer = setTimeout(save, wait);
  }

  /** @param {any} plan @param {string|null} id @param {string} etag @param {boolean} clean the server has exactly this */
  function show(plan, id, etag, clean) {
    onServer = clean ? plan : null;
    opened = store.get().opened + 1;
    store.load(plan, {
      planId: id, etag, view: null, tool: 'select', draft: null, notice: null, clash: null, faults: [],
      saved: { state: clean ? 'saved' : 'unsaved', at: clean ? now() : null },
      chosen: null, pinned: null, shownRefusal: null,
      search: { id: null, state: 'none', progress: 0, what: '', found: [], result: null, error: null, planAtSearch: null },
    });
    remember();
    if (!clean) save();
  }

  async function list() {
    try {
      store.set({ plots: await api.listPlans() });
    } catch {
      // The list stays as it was; the saved mark tells of the server.
    }
  }

  store.subscribe((s) => s.plan, (plan) => {
    if (opened < 0 || store.get().opened !== opened) return;
    if (plan === onServer) {
      // Undone back to what is saved.
      clearTimeout(timer);
      if (store.get().saved.state === 'unsaved') mark('saved');
      remember();
      return;
    }
    if (store.get().saved.state !== 'offline') mark('unsaved');
    if (store.get().notice) store.set({ notice: null });
    clearTimeout(noting);
    noting = setTimeout(remember, 150);
    later(store.get().saved.state === 'offline' ? RETRY : REST);
  });

  /** Saves what is unsaved. @returns {Promise<string>} the plan's id; throws a sentence when it cannot be saved */
  async function saveNow() {
    for (let round = 0; round < 3 && store.get().plan !== onServer; round++) await save();
    const { planId, plan, saved, notice } = store.get();
    if (planId === null || plan !== onServer) {
      throw new Error(notice ?? (saved.state === 'offline' ? 'The server does not answer; the plot is kept in this browser.' : 'The plot could not be saved.'));
    }
    return planId;
  }

  return {
    list,
    remember,
    saveNow,
    /** Saves at once when there is something to save, e.g. when the server is back. */
    retry: () => (store.get().plan !== onServer ? save() : list()),
    /** The first plot of a visit: what was at hand, else the newest kept, else a demo plot. @returns {Promise<boolean>} it is a first visit */
    async start() {
      const atHand = keep.read();
      if (atHand?.units) store.set({ units: atHand.units });
      if (atHand?.unsaved) {
        show(atHand.plan, atHand.planId, atHand.etag, false);
        return false;
      }
      if (atHand?.planId) {
        try {
          const { plan, etag } = await api.readPlan(atHand.planId);
          show(plan, atHand.planId, etag, true);
          return false;
        } catch (problem) {
          if (isOffline(problem)) {
            show(atHand.plan, atHand.planId, atHand.etag, true);
            mark('offline', atHand.at);
            return false;
          }
        }
      }
      await list();
      const [newest] = store.get().plots;
      if (newest) {
        const { plan, etag } = await api.readPlan(newest.id);
        show(plan, newest.id, etag, true);
        return false;
      }
      const [first] = store.get().demos;
      if (!first) {
        show(newPlan(), null, '', true);
        return true;
      }
      show(await api.demo(first.name), null, '', false);
      return true;
    },
    /** @param {string} id */
    async open(id) {
      await leave();
      const { plan, etag } = await api.readPlan(id);
      await leave();
      show(plan, id, etag, true);
    },
    async begin() {
      await leave();
      show(newPlan(freeTitle('New plot', store.get().plots)), null, '', false);
    },
    /** @param {string} name */
    async demo(name) {
      const plan = await api.demo(name);
      await leave();
      show(plan, null, '', false);
    },
    async copy() {
      await leave();
      const { plan } = store.get();
      show({ ...plan, title: freeTitle(`${plan.title || 'Plot'}, copy`, store.get().plots) }, null, '', false);
    },
    /** A plan from a file. @param {string} text @param {string} name */
    async take(text, name) {
      let plan;
      try {
        plan = JSON.parse(text);
      } catch {
        throw new Error(`${name} is not a plan: it is not JSON. Choose a file that was exported here.`);
      }
      if (plan?.format !== 'spanwright-plan/1') {
        throw new Error(`${name} is not a plan of this program: its format says ${JSON.stringify(plan?.format ?? null)}, not spanwright-plan/1.`);
      }
      const made = await api.createPlan(plan);
      await leave();
      show(plan, made.id, made.etag, true);
      list();
    },
    /** @param {string} id @returns {Promise<any>} the plan that is gone, to bring it back */
    async drop(id) {
      const { plan, etag } = await api.readPlan(id);
      await api.deletePlan(id, etag);
      await list();
      if (store.get().planId === id) {
        const [other] = store.get().plots;
        if (other) {
          const read = await api.readPlan(other.id);
          show(read.plan, other.id, read.etag, true);
        } else show(newPlan(), null, '', true);
      }
      return plan;
    },
    /** @param {any} plan @param {string} id it had; the sheets issued under it are remembered */
    async restore(plan, id) {
      const made = await api.createPlan(plan, id);
      show(plan, made.id, made.etag, true);
      await list();
    },
  };

  /** What is unsaved is saved before another plot is shown; throws a sentence when it cannot be. */
  async function leave() {
    if (opened >= 0 && store.get().plan !== onServer) await saveNow();
  }
}

/** @param {string} title @param {{title: string}[]} plots */
function freeTitle(title, plots) {
  const names = new Set(plots.map((p) => p.title));
  if (!names.has(title)) return title;
  let n = 2;
  while (names.has(`${title} ${n}`)) n += 1;
  return `${title} ${n}`;
}
