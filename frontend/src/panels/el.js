// @ts-check
/** Making HTML elements: text enters as text, never as markup. */

/**
 * @param {string} name
 * @param {Record<string, any>} [options] attributes; `class`, `text`, `on<event>` handlers and
 *   `value`, `checked`, `disabled` as properties; null, undefined and false are left out
 * @param {(Node|string|null|undefined|false)[]} [children]
 * @returns {any} the element
 */
export function el(name, options = {}, children = []) {
  const element = document.createElement(name);
  for (const [key, value] of Object.entries(options)) {
    if (value === null || value === undefined || value === false) continue;
    if (key === 'text') element.textContent = value;
    else if (key.startsWith('on')) element.addEventListener(key.slice(2), value);
    else if (key === 'value' || key === 'checked' || key === 'disabled') /** @type {any} */ (element)[key] = value;
    else element.setAttribute(key, value === true ? '' : String(value));
  }
  for (const child of children) if (child) element.append(child);
  return element;
}

/**
 * @param {string} text
 * @param {() => void} onclick
 * @param {Record<string, any>} [options]
 * @returns {HTMLButtonElement}
 */
export const button = (text, onclick, options = {}) => el('button', { type: 'button', text, onclick, ...options });

/** @param {string} text @param {() => void} onclick @param {Record<string, any>} [options] @returns {HTMLButtonElement} looks like a link in a sentence */
export const link = (text, onclick, options = {}) => button(text, onclick, { class: 'link', ...options });

/**
 * Makes the inside of an element anew and gives the focus back to what has the same `data-key`.
 * @param {HTMLElement} root
 * @param {(Node|string)[]} children
 */
export function renew(root, children) {
  const active = document.activeElement;
  const key = active && root.contains(active) ? active.getAttribute('data-key') : null;
  root.replaceChildren(...children);
  if (key === null) return;
  /** @type {HTMLElement|null} */ (root.querySelector(`[data-key="${CSS.escape(key)}"]`))?.focus({ preventScroll: true });
}
