// @ts-check
/** Lengths: text to metres and back, metric or feet and inches. */
import { MINUS, number, plain } from './figures.js';

/** @typedef {'m'|'ft'} Units */
/** @typedef {'found'|'required'} Sense whether a distance was found or must be kept */

/** What rounding up or down leaves alone, in its steps. */
const CRUMB = 1e-6;

export const FOOT = 0.3048;
export const INCH = 0.0254;

const NUMBER = String.raw`(?:\d+\.?\d*|\.\d+)`;
const FRACTION = String.raw`(?:(\d+)\s*\/\s*(\d+))`;
const METRIC = new RegExp(`^(${NUMBER})\\s*(m|metres?|meters?|cm|mm)$`, 'i');
const FEET = new RegExp(
  String.raw`^(?:(${NUMBER})\s*(?:'|′|ft|feet|foot))?\s*(?:(${NUMBER})?\s*${FRACTION}?\s*(?:"|″|''|in|inch|inches))?$`,
  'i',
);
const FEET_BARE = new RegExp(String.raw`^(${NUMBER})\s*(?:'|′|ft|feet|foot)\s*(${NUMBER})$`, 'i');

/**
 * Reads a length: `6.86`, `6,86 m`, `686 cm`, `22' 6"`, `22 ft 6 in`, `22'6 1/2"`, `90"`.
 * @param {string} text
 * @param {Units} units what a bare number means
 * @returns {number|null} metres; null when it is not a length
 */
export function parseLength(text, units) {
  let clean = plain(text);
  let sign = 1;
  if (/^[+-]/.test(clean)) {
    sign = clean[0] === '-' ? -1 : 1;
    clean = clean.slice(1).trim();
  }
  if (clean === '') return null;
  if (new RegExp(`^${NUMBER}$`).test(clean)) {
    return sign * Number(clean) * (units === 'ft' ? FOOT : 1);
  }
  const metric = METRIC.exec(clean);
  if (metric) {
    const scale = { cm: 0.01, mm: 0.001 }[metric[2].toLowerCase()] ?? 1;
    return sign * Number(metric[1]) * scale;
  }
  const bare = FEET_BARE.exec(clean);
  if (bare) return sign * (Number(bare[1]) * FOOT + Number(bare[2]) * INCH);
  const feet = FEET.exec(clean);
  if (!feet || (feet[1] === undefined && feet[2] === undefined && feet[3] === undefined)) return null;
  const part = feet[3] !== undefined ? Number(feet[3]) / Number(feet[4]) : 0;
  if (!Number.isFinite(part)) return null;
  return sign * (Number(feet[1] ?? 0) * FOOT + (Number(feet[2] ?? 0) + part) * INCH);
}

/**
 * @param {number} metres
 * @param {Units} units
 * @param {number} [digits] after the point, in metres; feet are given to the inch, or to the
 *   quarter inch where more than one digit is asked
 * @returns {string} without a unit in metres (`6.86`), with its marks in feet (`22′ 6″`)
 */
export function formatLength(metres, units, digits = 1) {
  if (!Number.isFinite(metres)) return '–';
  if (units === 'm') return number(metres, digits);
  const parts = digits > 1 ? 4 : 1;
  let quarters = Math.round((Math.abs(metres) / INCH) * parts);
  const sign = metres < 0 && quarters > 0 ? MINUS : '';
  const feet = Math.floor(quarters / (12 * parts));
  quarters -= feet * 12 * parts;
  const inches = Math.floor(quarters / parts);
  const rest = ['', '¼', '½', '¾'][parts === 4 ? quarters % 4 : 0];
  if (inches === 0 && rest === '') return `${sign}${feet}′`;
  return `${sign}${feet}′ ${inches === 0 ? '' : inches}${rest}″`;
}

/** @param {number} metres @param {Units} units @param {number} [digits] @returns {string} with its unit */
export const lengthWithUnit = (metres, units, digits = 1) =>
  units === 'm' ? `${formatLength(metres, 'm', digits)} m` : formatLength(metres, 'ft', digits);

/**
 * A distance held against a rule: small ones to the millimetre, so that 0.075 is not read as 0.07. What was found is
 * never shown greater than it is, what is required never less, as on the sheet.
 * @param {number} metres
 * @param {'m'|'ft'} units
 * @param {Sense} [sense] found where left out
 * @returns {string} without the unit in metres
 */
export function distanceFigure(metres, units, sense = 'found') {
  const small = metres > 0 && metres < 0.1;
  const step = units === 'ft' ? INCH / 4 : small ? 0.001 : 0.01;
  const steps = metres / step;
  const whole = sense === 'required' ? Math.ceil(steps - CRUMB) : Math.floor(steps + CRUMB);
  return formatLength(whole * step, units, small ? 3 : 2);
}

/** @param {number} squareMetres @param {Units} units @returns {string} with its unit */
export function area(squareMetres, units) {
  const value = units === 'm' ? squareMetres : squareMetres / (FOOT * FOOT);
  return `${number(value, value < 100 ? 1 : 0)} ${units === 'm' ? 'm²' : 'sq ft'}`;
}

/**
 * The text of a length as it stands in an input box.
 * @param {number|null|undefined} metres @param {Units} units
 * @returns {string} empty when there is none; no more digits than it has, at most four
 */
export function lengthInBox(metres, units) {
  if (metres === null || metres === undefined || !Number.isFinite(metres)) return '';
  if (units === 'ft') return formatLength(metres, 'ft', 2);
  return String(Math.round(metres * 1e4) / 1e4).replace('-', MINUS);
}
