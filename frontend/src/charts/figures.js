// @ts-check
import { MINUS, number } from '../units/figures.js';

/** Figures of the radio side as text. Plain numbers and lengths are in units/. */

/**
 * @param {number} value
 * @returns {string} a whole number
 */
export const count = (value) => number(Math.round(value), 0);

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
  return `${number(from, 0)}–${number(to, 0)}°`;
}

/**
 * @param {number} ohms
 * @returns {string} three figures at most: "45", "1 240"
 */
export function ohms(ohms) {
  const size = Math.abs(ohms);
  return size >= 1000 ? count(Math.round(ohms / 10) * 10) : number(ohms, 0);
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
