// @ts-check
/**
 * Calls to the server. Every call answers with plain values or throws: `Problem` when the server
 * said no (RFC 9457), `Offline` when it could not be reached. Nothing is retried here.
 */

/** The server answered with a problem document. */
export class Problem extends Error {
  /**
   * @param {number} status HTTP status
   * @param {{title?: string, detail?: string, faults?: {path: string, message: string}[]}} body
   */
  constructor(status, body) {
    super(body.detail || body.title || `The server answered ${status}.`);
    this.name = 'Problem';
    this.status = status;
    this.title = body.title || '';
    this.faults = body.faults || [];
  }
}

/** The server could not be reached. */
export class Offline extends Error {
  constructor() {
    super('The server does not answer.');
    this.name = 'Offline';
  }
}

/**
 * @param {string} method
 * @param {string} path
 * @param {{body?: unknown, headers?: Record<string, string>, signal?: AbortSignal}} [options]
 * @returns {Promise<Response>}
 */
async function call(method, path, options = {}) {
  /** @type {Record<string, string>} */
  const headers = { Accept: 'application/json', ...options.headers };
  /** @type {RequestInit} */
  const init = { method, headers, signal: options.signal };
  if (options.body !== undefined) {
    headers['Content-Type'] = 'application/json';
    init.body = JSON.stringify(options.body);
  }
  let response;
  try {
    response = await fetch(path, init);
  } catch (cause) {
    if (options.signal?.aborted) throw cause;
    throw new Offline();
  }
  if (response.ok) return response;
  let body = {};
  try {
    body = await response.json();
  } catch {
    // Not a problem document: the status alone has to do.
  }
  throw new Problem(response.status, body);
}

/** @param {Response} response */
const etagOf = (response) => response.headers.get('ETag') || '';

/**
 * @typedef {{id: string, title: string, savedAt?: string}} PlanEntry
 * @typedef {{
 *   progress?: (data: any) => void, found?: (data: any) => void, done?: (data: any) => void,
 *   failed?: (data: any) => void, lost?: () => void
 * }} SearchHandlers
 */

/** @returns {Promise<any>} the catalogues */
export async function catalogue() {
  return (await call('GET', '/api/catalogue')).json();
}

/** @returns {Promise<{name: string, title: string}[]>} the demo plots */
export async function demos() {
  return (await call('GET', '/api/demos')).json();
}

/** @param {string} name @returns {Promise<any>} a demo plan */
export async function demo(name) {
  return (await call('GET', `/api/demos/${encodeURIComponent(name)}`)).json();
}

/** @returns {Promise<PlanEntry[]>} saved plans */
export async function listPlans() {
  return (await call('GET', '/api/plans')).json();
}

/** @param {string} id @returns {Promise<{plan: any, etag: string}>} */
export async function readPlan(id) {
  const response = await call('GET', `/api/plans/${encodeURIComponent(id)}`);
  return { plan: await response.json(), etag: etagOf(response) };
}

/**
 * @param {any} plan may be a draft
 * @param {string} [restores] id of a deleted plan that this one brings back, with the record of its issued sheets
 * @returns {Promise<{id: string, etag: string}>}
 */
export async function createPlan(plan, restores) {
  const more = restores ? `&restores=${encodeURIComponent(restores)}` : '';
  const response = await call('POST', `/api/plans?draft=true${more}`, { body: plan });
  const { id } = await response.json();
  return { id, etag: etagOf(response) };
}

/**
 * @param {string} id
 * @param {any} plan may be a draft
 * @param {string} etag of the version this one replaces
 * @returns {Promise<{etag: string}>}
 */
export async function savePlan(id, plan, etag) {
  const path = `/api/plans/${encodeURIComponent(id)}?draft=true`;
  const response = await call('PUT', path, { body: plan, headers: { 'If-Match': etag } });
  return { etag: etagOf(response) };
}

/** @param {string} id @param {string} etag @returns {Promise<void>} */
export async function deletePlan(id, etag) {
  await call('DELETE', `/api/plans/${encodeURIComponent(id)}`, { headers: { 'If-Match': etag } });
}

/**
 * @param {any} plan
 * @param {AbortSignal} [signal]
 * @returns {Promise<{path: string, message: string}[]>} every fault, none when it is complete
 */
export async function check(plan, signal) {
  const answer = await (await call('POST', '/api/check', { body: plan, signal })).json();
  return answer.faults || [];
}

/**
 * @param {any} plan
 * @param {any} placement geometry fields are read
 * @param {AbortSignal} [signal]
 * @returns {Promise<any>} one complete element of `placements`
 */
export async function assess(plan, placement, signal) {
  return (await call('POST', '/api/assess', { body: { plan, placement }, signal })).json();
}

/**
 * @param {string} planId
 * @param {{effort?: string, seed?: number, top?: number}} [options]
 * @returns {Promise<string>} the search's id
 */
export async function startSearch(planId, options = {}) {
  const path = `/api/plans/${encodeURIComponent(planId)}/searches`;
  const response = await call('POST', path, { body: options });
  const body = await response.json().catch(() => ({}));
  if (body.id) return body.id;
  const address = response.headers.get('Location') || '';
  return decodeURIComponent(address.slice(address.lastIndexOf('/') + 1));
}

/** @param {string} id @returns {Promise<any>} {id, state, progress, result} */
export async function readSearch(id) {
  return (await call('GET', `/api/searches/${encodeURIComponent(id)}`)).json();
}

/** @param {string} id @returns {Promise<void>} */
export async function cancelSearch(id) {
  await call('DELETE', `/api/searches/${encodeURIComponent(id)}`);
}

/**
 * Follows a search.
 * @param {string} id
 * @param {SearchHandlers} handlers `lost` when the stream breaks (the browser reconnects by itself)
 * @returns {() => void} stops listening
 */
export function followSearch(id, handlers) {
  const source = new EventSource(`/api/searches/${encodeURIComponent(id)}/events`);
  const last = new Set(['done', 'failed']);
  for (const name of /** @type {const} */ (['progress', 'found', 'done', 'failed'])) {
    source.addEventListener(name, (event) => {
      if (last.has(name)) source.close();
      handlers[name]?.(JSON.parse(/** @type {MessageEvent} */ (event).data));
    });
  }
  source.onerror = () => handlers.lost?.();
  return () => source.close();
}

/**
 * @param {string} searchId
 * @param {string} placementId
 * @param {'pdf'|'csv'|'json'|'svg'|'geojson'} type
 * @param {{paper?: string, units?: string}} [options]
 * @returns {string} where the sheet can be downloaded while the server holds the search
 */
export function sheetAddress(searchId, placementId, type, options = {}) {
  const query = new URLSearchParams(/** @type {any} */ (options)).toString();
  const base = `/api/searches/${encodeURIComponent(searchId)}/placements/${encodeURIComponent(placementId)}`;
  return `${base}/sheet.${type}${query ? `?${query}` : ''}`;
}

/**
 * A sheet from its address.
 * @param {string} address as `sheetAddress` gives it
 * @returns {Promise<Blob>}
 */
export async function heldSheet(address) {
  return (await call('GET', address, { headers: { Accept: '*/*' } })).blob();
}

/**
 * The sheets issued of a plan, in order.
 * @param {string} planId
 * @returns {Promise<{revision: string, date: string, placement: string, what: string}[]>}
 */
export async function issuedSheets(planId) {
  return (await call('GET', `/api/plans/${encodeURIComponent(planId)}/issued`)).json();
}

/**
 * Issues the sheet of a placement.
 * @param {string} planId
 * @param {any} what the placement of a search, or a plan and a placement; and the revision that was looked at
 * @returns {Promise<{revision: string, date: string, placement: string, what: string}>}
 */
export async function issueSheet(planId, what) {
  return (await call('POST', `/api/plans/${encodeURIComponent(planId)}/issued`, { body: what })).json();
}

/**
 * The sheet of a placement the server no longer holds.
 * @param {any} plan
 * @param {any} placement
 * @param {'pdf'|'csv'|'json'|'svg'|'geojson'} type
 * @param {{paper?: string, units?: string, search?: string, saved?: string}} [options]
 * @returns {Promise<Blob>}
 */
export async function sheet(plan, placement, type, options = {}) {
  const query = new URLSearchParams(/** @type {any} */ (options)).toString();
  const path = `/api/sheet.${type}${query ? `?${query}` : ''}`;
  return (await call('POST', path, { body: { plan, placement }, headers: { Accept: '*/*' } })).blob();
}
