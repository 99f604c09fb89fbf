// @ts-check
/** What this browser keeps by itself: the plan at hand, so that a reload or a stopped server loses nothing. */

const KEY = 'spanwright.at-hand';
const ASIDE = 'spanwright.seen';
const SEARCHED = 'spanwright.searched';

/** @typedef {{planId: string|null, etag: string, plan: any, unsaved: boolean, at: string|null, units: string}} AtHand */

/** @returns {AtHand|null} */
export function read() {
  try {
    const text = localStorage.getItem(KEY);
    const value = text ? JSON.parse(text) : null;
    return value && typeof value.plan === 'object' && value.plan ? value : null;
  } catch {
    return null;
  }
}

/** @param {AtHand} atHand @returns {boolean} false: this browser will not keep it */
export function write(atHand) {
  try {
    localStorage.setItem(KEY, JSON.stringify(atHand));
    return true;
  } catch {
    return false;
  }
}

/** @returns {boolean} the hints of a first visit have been put away */
export function hintsSeen() {
  try {
    return localStorage.getItem(ASIDE) === 'hints';
  } catch {
    return false;
  }
}

/** Remembers that the hints have been put away. */
export function rememberHints() {
  try {
    localStorage.setItem(ASIDE, 'hints');
  } catch {
    // A browser that keeps nothing shows them again.
  }
}

/** @typedef {{planId: string, id: string, plan: string}} Searched the last search of this tab, and the plan it was made of */

/** @param {Searched} searched */
export function rememberSearch(searched) {
  try {
    sessionStorage.setItem(SEARCHED, JSON.stringify(searched));
  } catch {
    // Then a reload asks for the search again.
  }
}

/** @returns {Searched|null} */
export function recallSearch() {
  try {
    return JSON.parse(sessionStorage.getItem(SEARCHED) ?? 'null');
  } catch {
    return null;
  }
}

/** Forgets a search that the server no longer holds. */
export function forgetSearch() {
  try {
    sessionStorage.removeItem(SEARCHED);
  } catch {
    // Nothing is kept, so nothing is to forget.
  }
}
