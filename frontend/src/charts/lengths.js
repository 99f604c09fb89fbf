// @ts-check
import { fixed } from './figures.js';

/** Lengths in the units the user reads, without or with their unit. SI in. */

const METRES_PER_INCH = 0.0254;

/**
 * @param {number} metres
 * @param {'m'|'ft'} units
 * @param {number} [digits] after the point in metres; feet go to the inch
 * @returns {string} "3.54" or "11′ 7″"
 */
export function lengthFigure(metres, units, digits = 2) {
  if (units === 'm') return fixed(metres, digits);
  const inches = Math.round(Math.abs(metres) / METRES_PER_INCH);
  const sign = metres < 0 && inches > 0 ? '\u2212' : '';
  return `${sign}${Math.floor(inches / 12)}′ ${inches % 12}″`;
}

/**
 * @param {number} metres
 * @param {'m'|'ft'} units
 * @param {number} [digits]
 * @returns {string} "3.54 m" or "11′ 7″"
 */
export function lengthText(metres, units, digits = 2) {
  return lengthFigure(metres, units, digits) + (units === 'm' ? ' m' : '');
}
