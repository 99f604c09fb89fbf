// @ts-check
/** Making and keeping SVG elements. */

const SVG = 'http://www.w3.org/2000/svg';

/**
 * A new SVG element.
 * @param {string} name
 * @param {Record<string, string|number|null|undefined>} [attributes] null and undefined are left out
 * @param {(Node|string|null|undefined)[]} [children] strings become text
 * @returns {SVGElement}
 */
export function svg(name, attributes = {}, children = []) {
  const element = document.createElementNS(SVG, name);
  set(element, attributes);
  for (const child of children) {
    if (child !== null && child !== undefined) element.append(child);
  }
  return element;
}

/**
 * Sets attributes; null removes one. Changes the element.
 * @param {Element} element
 * @param {Record<string, string|number|null|undefined>} attributes
 */
export function set(element, attributes) {
  for (const [key, value] of Object.entries(attributes)) {
    if (value === null || value === undefined) element.removeAttribute(key);
    else element.setAttribute(key, typeof value === 'number' ? figure(value) : value);
  }
}

/** @param {number} value @returns {string} short, for attributes */
export function figure(value) {
  return String(Math.round(value * 1e4) / 1e4);
}

/**
 * Path data through points.
 * @param {number[][]} points
 * @param {boolean} [closed]
 * @returns {string}
 */
export function pathOf(points, closed = false) {
  if (!points.length) return '';
  return `M${points.map((p) => `${figure(p[0])} ${figure(p[1])}`).join('L')}${closed ? 'Z' : ''}`;
}

/**
 * A group whose inside is drawn in screen pixels (y down) about a place on the plan.
 * @param {number[]} at plan metres
 * @param {number} ppm pixels per metre
 * @param {(Node|null)[]} children
 * @param {Record<string, string|number>} [attributes]
 * @returns {SVGElement}
 */
export function atPlace(at, ppm, children, attributes = {}) {
  const k = 1 / ppm;
  return svg(
    'g',
    { transform: `translate(${figure(at[0])} ${figure(at[1])}) scale(${k} ${-k})`, ...attributes },
    children,
  );
}
