// @ts-check
/** Figures as they are shown: a true minus, thin spaces in thousands, sensible digits. */

export const THIN = '\u2009';
export const MINUS = '\u2212';

/**
 * @param {number} value
 * @param {number} digits after the point
 * @returns {string} an en dash when there is no number
 */
export function number(value, digits) {
  if (!Number.isFinite(value)) return '–';
  const text = Math.abs(value).toFixed(digits);
  const [whole, part] = text.split('.');
  const grouped = whole.length > 3 ? whole.replace(/\B(?=(\d{3})+$)/g, THIN) : whole;
  const negative = value < 0 && Number(text) !== 0;
  return `${negative ? MINUS : ''}${grouped}${part ? `.${part}` : ''}`;
}

/** @param {number} value @param {number} digits @returns {string} with + or − before it */
export function signed(value, digits) {
  const text = number(value, digits);
  return Number.isFinite(value) && !text.startsWith(MINUS) ? `+${text}` : text;
}

/** @param {string} text @returns {string} decimal comma, true minus and stray spaces as a computer reads them */
export const plain = (text) =>
  text.trim().replace(/[¼½¾]/g, (part) => ({ '¼': ' 1/4', '½': ' 1/2', '¾': ' 3/4' })[part] ?? part).replace(/[\u2212\u2013]/g, '-').replace(/[\u2009\u202f\u00a0]/g, ' ').replace(/(\d),(\d)/g, '$1.$2');

/** @param {string} text @returns {number|null} null when it is not a number */
export function parseNumber(text) {
  const clean = plain(text).replace(/(\d) (?=\d{3}\b)/g, '$1');
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(clean) ? Number(clean) : null;
}

/** @param {string|null|undefined} iso @returns {string} hours and minutes here, "14:32"; empty when there is none */
export function clock(iso) {
  if (!iso) return '';
  const date = new Date(iso);
  if (Number.isNaN(date.getTime())) return '';
  return `${String(date.getHours()).padStart(2, '0')}:${String(date.getMinutes()).padStart(2, '0')}`;
}
