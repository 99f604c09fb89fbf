// @ts-check
/**
 * The one mutable thing of the page: a document (`state`) that is replaced, never changed in place,
 * and the history of its plan. Everything shown is a function of it.
 */

/** @typedef {import('./types.js').State} State */
/** @typedef {import('./types.js').Plan} Plan */

/**
 * @typedef {object} Store
 * @property {() => State} get the state now; treat it as frozen
 * @property {(label: string, change: (plan: Plan) => Plan, group?: string) => void} edit
 *   changes the plan as one undo step; edits that follow one another with the same `group`
 *   (a drag, a nudge, typing in one box) become one step. Returning the same plan changes nothing.
 * @property {() => void} undo
 * @property {() => void} redo
 * @property {() => void} endGroup the next edit starts a new step whatever its group
 * @property {(plan: Plan, patch?: Partial<State>) => void} load
 *   takes another plan and forgets the history
 * @property {(patch: Partial<State>) => void} set changes anything but the plan
 * @property {<T>(selector: (state: State) => T, callback: (value: T, before: T|undefined) => void)
 *   => () => void} subscribe
 *   calls back at once and whenever the selected value is another one (`Object.is`; arrays are
 *   compared element by element); answers with the way to stop
 */

/** @param {unknown} a @param {unknown} b */
function same(a, b) {
  if (Object.is(a, b)) return true;
  if (!Array.isArray(a) || !Array.isArray(b) || a.length !== b.length) return false;
  return a.every((value, i) => Object.is(value, b[i]));
}

/**
 * @param {Partial<State>} initial
 * @returns {Store}
 */
export function createStore(initial) {
  /** @type {State} */
  let state = /** @type {any} */ ({ undoLabel: null, redoLabel: null, opened: 0, ...initial });
  /** @type {{label: string, plan: Plan, selection: any}[]} */
  let past = [];
  /** @type {{label: string, plan: Plan, selection: any}[]} */
  let future = [];
  /** @type {string|undefined} */
  let openGroup;
  /** @type {Set<{selector: (s: State) => any, callback: (v: any, before: any) => void, value: any}>} */
  const listeners = new Set();
  let telling = false;
  let again = false;

  function tell() {
    if (telling) {
      again = true;
      return;
    }
    telling = true;
    try {
      do {
        again = false;
        for (const listener of [...listeners]) {
          const value = listener.selector(state);
          if (same(value, listener.value)) continue;
          const before = listener.value;
          listener.value = value;
          listener.callback(value, before);
        }
      } while (again);
    } finally {
      telling = false;
    }
  }

  /** @param {Partial<State>} patch */
  function put(patch) {
    state = {
      ...state,
      ...patch,
      undoLabel: past.length ? past[past.length - 1].label : null,
      redoLabel: future.length ? future[future.length - 1].label : null,
    };
    tell();
  }

  return {
    get: () => state,
    edit(label, change, group) {
      const plan = change(state.plan);
      if (plan === state.plan) return;
      const joins = group !== undefined && group === openGroup && past.length > 0;
      if (!joins) past = [...past, { label, plan: state.plan, selection: state.selection }];
      openGroup = group;
      future = [];
      put({ plan });
    },
    endGroup() {
      openGroup = undefined;
    },
    undo() {
      const step = past[past.length - 1];
      if (!step) return;
      past = past.slice(0, -1);
      future = [...future, { label: step.label, plan: state.plan, selection: state.selection }];
      openGroup = undefined;
      put({ plan: step.plan, selection: step.selection });
    },
    redo() {
      const step = future[future.length - 1];
      if (!step) return;
      future = future.slice(0, -1);
      past = [...past, { label: step.label, plan: state.plan, selection: state.selection }];
      openGroup = undefined;
      put({ plan: step.plan, selection: step.selection });
    },
    load(plan, patch = {}) {
      past = [];
      future = [];
      openGroup = undefined;
      put({ selection: null, ...patch, plan, opened: state.opened + 1 });
    },
    set: (patch) => put(patch),
    subscribe(selector, callback) {
      const listener = { selector, callback, value: selector(state) };
      listeners.add(listener);
      callback(listener.value, undefined);
      return () => listeners.delete(listener);
    },
  };
}
