// @ts-check
/** Numbers as text: a true minus, a thin space in thousands, one count of digits in a column. Lengths are in units/. */

const MINUS = '\u2212';
const THIN_SPACE = '\u2009';

/**
 * @param {number} value
 * @param {number} [digits] after the point
 * @returns {string} never "−0.0"
 */
export function fixed(value, digits = 1) {
  const text = Math.abs(value).toFixed(digits);
  const [whole, part] = text.split('.');
  const grouped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE) : whole;
  const sign = value < 0 && Number(text) !== 0 ? MINUS : '';
  return sign + grouped + (part === undefined ? '' : `.${part}`);
}

/**
 * A figure whose sign is its meaning.
 * @param {number} value
 * @param {number} [digits] after the point
 * @returns {string} "+4.1", "−0.3", "0.0"
 */
export function signed(value, digits = 1) {
  const text = fixed(value, digits);
  return value > 0 && Number(value.toFixed(digits)) !== 0 ? `+${text}` : text;
}

/**
 * @param {number} value
 * @returns {string} a whole number with thin spaces
 */
export function count(value) {
  const text = String(Math.round(Math.abs(value))).replace(/\B(?=(\d{3})+$)/g, THIN_SPACE);
  return value < 0 ? MINUS + text : text;
}

/**
 * @param {number} degrees clockwise from true north
 * @returns {string} "049°", three figures as bearings are spoken
 */
export function bearing(degrees) {
  const turned = ((Math.round(degrees) % 360) + 360) % 360;
  return `${String(turned).padStart(3, '0')}°`;
}

/**
 * @param {number} from
 * @param {number} to
 * @returns {string} "3–14°"
 */
export function range(from, to) {
  return `${fixed(from, 0)}–${fixed(to, 0)}°`;
}

/**
 * @param {number} ohms
 * @returns {string} three figures at most: "45", "1 240"
 */
export function ohms(ohms) {
  const size = Math.abs(ohms);
  return size >= 1000 ? count(Math.round(ohms / 10) * 10) : fixed(ohms, 0);
}

/**
 * @param {[number, number]|number[]} impedance resistance and reactance [ohm]
 * @returns {string} "52 − j410"
 */
export function impedance([resistance, reactance]) {
  return `${ohms(resistance)} ${reactance < 0 ? MINUS : '+'} j${ohms(Math.abs(reactance))}`;
}

/**
 * @param {number} frequencyMHz
 * @returns {string} as many digits as are needed, at most three: "14.175"
 */
export function megahertz(frequencyMHz) {
  return String(Number(frequencyMHz.toFixed(4)));
}
