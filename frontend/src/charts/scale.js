// @ts-check
/** Straight scales and round ticks. Pure. */

/**
 * @param {[number, number]} domain
 * @param {[number, number]} range
 * @returns {(value: number) => number}
 */
export function linear([d0, d1], [r0, r1]) {
  const slope = (r1 - r0) / (d1 - d0 || 1);
  return (value) => r0 + (value - d0) * slope;
}

/**
 * Round values inside a range.
 * @param {number} low
 * @param {number} high
 * @param {number} most how many at the most
 * @returns {number[]} rising, steps of 1, 2 or 5 times a power of ten
 */
export function ticks(low, high, most) {
  if (!(high > low)) return [low];
  const rough = (high - low) / Math.max(1, most);
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = [1, 2, 5, 10].map((times) => times * power).find((size) => (high - low) / size <= most) ?? 10 * power;
  const first = Math.ceil(low / step - 1e-9);
  const last = Math.floor(high / step + 1e-9);
  return Array.from({ length: last - first + 1 }, (_, index) => Number(((first + index) * step).toPrecision(12)));
}

/**
 * @param {number} value
 * @param {number} low
 * @param {number} high
 */
export function within(value, low, high) {
  return Math.min(high, Math.max(low, value));
}

/**
 * Reads a table of values at equal steps, straight between them.
 * @param {ReadonlyArray<number>} values first at 0
 * @param {number} step
 * @param {number} where
 */
export function sample(values, step, where) {
  const index = within(where / step, 0, values.length - 1);
  const below = Math.floor(index);
  const above = Math.min(below + 1, values.length - 1);
  return values[below] + (values[above] - values[below]) * (index - below);
}
