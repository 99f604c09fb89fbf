// @ts-check
/** Directions and places on the earth as text. */
import { MINUS, number, plain } from './figures.js';

/** @param {number} degrees @param {number} [digits] @returns {string} three figures before the point, "090.0°" */
export function formatDirection(degrees, digits = 1) {
  if (!Number.isFinite(degrees)) return '–';
  let value = ((degrees % 360) + 360) % 360;
  if (Number(value.toFixed(digits)) >= 360) value = 0;
  const text = value.toFixed(digits);
  return `${text.padStart(digits ? 4 + digits : 3, '0')}°`;
}

const POINTS = ['n', 'nne', 'ne', 'ene', 'e', 'ese', 'se', 'sse', 's', 'ssw', 'sw', 'wsw', 'w', 'wnw', 'nw', 'nnw'];

/**
 * Reads a direction: `90`, `090.0°`, `-45`, `NE`.
 * @param {string} text
 * @returns {number|null} degrees, 0 ≤ d < 360; null when it is none
 */
export function parseDirection(text) {
  const clean = plain(text).replace(/\s*(°|deg|degrees)$/i, '').toLowerCase();
  const point = POINTS.indexOf(clean);
  if (point >= 0) return point * 22.5;
  if (!/^[+-]?(\d+\.?\d*|\.\d+)$/.test(clean)) return null;
  return ((Number(clean) % 360) + 360) % 360;
}

/**
 * Reads degrees with a sign or a letter: `51.5`, `-1.2`, `1° 12' W`.
 * @param {string} text
 * @returns {number|null}
 */
export function parseDegrees(text) {
  const clean = plain(text).toUpperCase();
  const match = /^([+-]?)(\d+\.?\d*|\.\d+)\s*°?\s*(?:(\d+\.?\d*)\s*['′])?\s*(?:(\d+\.?\d*)\s*(?:"|″|''))?\s*([NSEW]?)$/.exec(clean);
  if (!match) return null;
  const value = Number(match[2]) + Number(match[3] ?? 0) / 60 + Number(match[4] ?? 0) / 3600;
  return value * (match[1] === '-' ? -1 : 1) * (match[5] === 'S' || match[5] === 'W' ? -1 : 1);
}

/** @param {number} degrees east-positive @returns {string} "6° W" */
export function formatVariation(degrees) {
  if (!Number.isFinite(degrees) || degrees === 0) return '0°';
  return `${number(Math.abs(degrees), Number.isInteger(degrees) ? 0 : 1)}° ${degrees < 0 ? 'W' : 'E'}`;
}

/** @param {number|null|undefined} value @returns {string} as it stands in a box */
export function degreesInBox(value) {
  if (value === null || value === undefined || !Number.isFinite(value)) return '';
  return String(Math.round(value * 1e6) / 1e6).replace('-', MINUS);
}

/**
 * A direction typed while drawing: as `parseDirection`, or from the last wall: `L` and `R` square to
 * the left and right, `A` straight ahead, `L30` and `R12.5` by so many degrees.
 * @param {string} text @param {number|null} before direction of the last wall
 * @returns {number|null}
 */
export function parseDirectionFrom(text, before) {
  const turn = /^([lr])\s*(\d+\.?\d*)?$/i.exec(plain(text).replace(/\s*°$/, ''));
  if (turn && before !== null) {
    const by = turn[2] === undefined ? 90 : Number(turn[2]);
    return (before + (turn[1].toLowerCase() === 'l' ? -by : by) + 720) % 360;
  }
  if (/^a$/i.test(plain(text)) && before !== null) return before;
  return parseDirection(text);
}
