// @ts-check
import { planOf } from './placement-facts.js';

/**
 * Where the sheet comes from, and where it is handed out: by its address while the server holds the search, which knows
 * when the plan was saved; a placement made by hand, or one of a search the server has forgotten, is sent along.
 *
 * @typedef {import('../state/types.js').State} State
 * @typedef {import('./sheet-issue.js').Issued} Issued
 * @typedef {'pdf'|'csv'|'json'|'svg'|'geojson'} Type
 * @typedef {{paper: string, units: string}} Options
 */

/**
 * What a call answers; `otherwise` when the server has no such thing.
 * @template T
 * @param {() => Promise<T>} call
 * @param {() => T|Promise<T>} otherwise
 * @returns {Promise<T>}
 */
async function orElse(call, otherwise) {
  try {
    return await call();
  } catch (problem) {
    if (/** @type {any} */ (problem).status !== 404) throw problem;
    return otherwise();
  }
}

/** @param {State} state @param {any} placement @returns {boolean} whether the server may hold the search it was found by */
function isHeld(state, placement) {
  return state.search.id !== null && Boolean(state.search.result) && !placement.madeFrom;
}

/**
 * @param {any} api
 * @param {State} state
 * @param {any} placement
 * @param {Type} type
 * @param {Options} options
 * @returns {string|null}
 */
export function heldAddress(api, state, placement, type, options) {
  return isHeld(state, placement) ? api.sheetAddress(state.search.id, placement.id, type, options) : null;
}

/**
 * One format of the sheet.
 * @param {any} api
 * @param {State} state
 * @param {any} placement
 * @param {Type} type
 * @param {Options} options
 * @returns {Promise<Blob>}
 */
export async function sheetPart(api, state, placement, type, options) {
  const address = heldAddress(api, state, placement, type, options);
  const more = { ...options, ...(state.search.id ? { search: state.search.id } : {}) };
  const send = (/** @type {any} */ all) => api.sheet(planOf(state), placement, type, all);
  // The plot itself may have been deleted in another window: its sheet can still be read.
  const sent = () =>
    state.planId === null ? send(more) : orElse(() => send({ ...more, saved: state.planId }), () => send(more));
  return address === null ? sent() : orElse(() => api.heldSheet(address), sent);
}

/**
 * @param {any} api
 * @param {string|null} planId
 * @returns {Promise<Issued[]>} the sheets issued of a plot, in order
 */
export async function issuedOf(api, planId) {
  return planId === null ? [] : orElse(() => api.issuedSheets(planId), () => []);
}

/**
 * Issues the sheet of a placement as the revision that was looked at, or not at all.
 * @param {any} api
 * @param {State} state
 * @param {any} placement
 * @param {string} planId
 * @param {string} revision
 * @returns {Promise<Issued>}
 */
export async function issueSheet(api, state, placement, planId, revision) {
  const sent = () => api.issueSheet(planId, { plan: planOf(state), placement, revision });
  return isHeld(state, placement)
    ? orElse(() => api.issueSheet(planId, { search: state.search.id, placement: placement.id, revision }), sent)
    : sent();
}
