// @ts-check
/** What this browser keeps by itself: the plan at hand, so that a reload or a stopped server loses nothing. */

const KEY = 'spanwright.at-hand';
const ASIDE = 'spanwright.seen';

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
