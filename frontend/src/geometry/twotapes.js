// @ts-check
/** A point from its tape distances to two known points. */

/** @typedef {import('./vector.js').Point} Point */

/**
 * @param {Point} a @param {number} fromA metres
 * @param {Point} b @param {number} fromB metres
 * @returns {{points: Point[], gap: number}} two answers (the one left of a→b first), one where the
 *   tapes only just meet, none where they do not; `gap` is how many metres they miss by, else 0
 */
export function twoTapes(a, fromA, b, fromB) {
  const dx = b[0] - a[0];
  const dy = b[1] - a[1];
  const base = Math.hypot(dx, dy);
  if (!(base > 1e-9)) return { points: [], gap: Math.abs(fromA - fromB) };
  const gap = Math.max(base - (fromA + fromB), Math.abs(fromA - fromB) - base, 0);
  if (gap > 1e-6) return { points: [], gap };
  const along = (fromA * fromA - fromB * fromB + base * base) / (2 * base);
  const across = Math.sqrt(Math.max(0, fromA * fromA - along * along));
  const ux = dx / base;
  const uy = dy / base;
  const foot = [a[0] + along * ux, a[1] + along * uy];
  if (across < 5e-4) return { points: [foot], gap: 0 };
  return {
    points: [
      [foot[0] - uy * across, foot[1] + ux * across],
      [foot[0] + uy * across, foot[1] - ux * across],
    ],
    gap: 0,
  };
}

/**
 * The angle at which two tapes cross at a point; near 90 is best, under 30 or over 150 is poor.
 * @param {Point} p @param {Point} a @param {Point} b @returns {number} degrees, 0 to 180
 */
export function crossingAngle(p, a, b) {
  const one = Math.atan2(a[1] - p[1], a[0] - p[0]);
  const two = Math.atan2(b[1] - p[1], b[0] - p[0]);
  const between = Math.abs(one - two) % (2 * Math.PI);
  return (Math.min(between, 2 * Math.PI - between) * 180) / Math.PI;
}
