// @ts-check
/** Makes HTML elements. Text enters as text, styles by class: nothing here parses markup. SVG is made by draw/svg.js. */

/**
 * @typedef {Node|string|number|null|undefined|false} Child
 * @typedef {Record<string, unknown>} Attributes a function under `onNAME` becomes a listener; null, undefined and
 *   false leave an attribute out, true sets it empty; `value`, `checked` and `disabled` are set as properties
 */

const PROPERTIES = new Set(['value', 'checked', 'disabled', 'selected', 'open']);

/**
 * Puts attributes and listeners on an element. Changes the element.
 * @param {Element} element
 * @param {Attributes} attributes
 */
function dress(element, attributes) {
  for (const [name, value] of Object.entries(attributes)) {
    if (name.startsWith('on') && typeof value === 'function') {
      element.addEventListener(name.slice(2), /** @type {EventListener} */ (value));
    } else if (value === null || value === undefined || value === false) {
      if (PROPERTIES.has(name) && value === false) Reflect.set(element, name, false);
    } else if (PROPERTIES.has(name) && element instanceof HTMLElement) {
      Reflect.set(element, name, value);
    } else {
      element.setAttribute(name, value === true ? '' : String(value));
    }
  }
}

/**
 * Adds children, leaving out what is null, undefined or false. Changes the parent.
 * @param {Element} parent
 * @param {Child[]} children
 */
function fill(parent, children) {
  for (const child of children) {
    if (child === null || child === undefined || child === false) continue;
    parent.append(child instanceof Node ? child : String(child));
  }
}

/**
 * @param {string} name element name
 * @param {Attributes} [attributes]
 * @param {...Child} children
 * @returns {HTMLElement}
 */
export function html(name, attributes = {}, ...children) {
  const element = document.createElement(name);
  // Children first: a select takes its value only once its options are there.
  fill(element, children);
  dress(element, attributes);
  return element;
}

/**
 * Redraws a panel soon, once for many changes, and gives the focus back to the element with the same `data-key`.
 * It waits a frame, so that Tab reaches the next field before the fields are made anew, and while a button or a handle
 * in the panel is held down, so that what was pressed is still there when it is let go.
 * @param {HTMLElement} root
 * @param {() => Node[]} render makes the panel's children
 * @returns {() => void} asks for a redraw
 */
export function redrawer(root, render) {
  let asked = false;
  let held = false;
  const redraw = () => {
    asked = false;
    const active = document.activeElement;
    const key = active && root.contains(active) ? active.getAttribute('data-key') : null;
    const caret =
      active instanceof HTMLInputElement && active.type === 'text'
        ? [active.selectionStart, active.selectionEnd]
        : null;
    root.replaceChildren(...render());
    if (key === null) return;
    const again = root.querySelector(`[data-key="${CSS.escape(key)}"]`);
    if (again instanceof HTMLElement || again instanceof SVGElement) again.focus({ preventScroll: true });
    if (again instanceof HTMLInputElement && caret) again.setSelectionRange(caret[0], caret[1]);
  };
  const ask = () => {
    if (asked) return;
    asked = true;
    if (!held) requestAnimationFrame(redraw);
  };
  const release = () => {
    if (!held) return;
    held = false;
    if (asked) setTimeout(redraw, 0);
  };
  root.addEventListener('pointerdown', () => {
    held = true;
  });
  window.addEventListener('pointerup', release);
  window.addEventListener('pointercancel', release);
  return ask;
}
