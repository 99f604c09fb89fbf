// @ts-check
import { sample, within } from './scale.js';

/**
 * Reach rose: gain all round at one elevation against a ring that is the reference. Strokes leave the ring outward
 * where the placement is better and inward where it is worse. Pure; the drawing is in draw/placement/rose.js.
 * Screen frame: pixels about the middle of the wire, x right, y down; plan azimuths are turned by `planNorth`.
 *
 * @typedef {{elevation: number, step: number, dbi: number[], referenceDbi: number, betterShare: number}} Rose
 */

export const PIXELS_PER_DECIBEL = 7;
const STROKE_EVERY_DEGREES = 2;
const SMALL_RING = 110;
/** Nulls are drawn no farther in than this share of the ring, outward no farther than this many decibels. */
const INNERMOST = 0.12;
const OUTERMOST_DECIBELS = 14;
/** Strokes end here, so that a far better or worse placement does not cover the plan; the closed line goes on. */
const STROKE_DECIBELS = 5;

/**
 * @param {number} azimuth degrees clockwise from true north
 * @param {number} planNorth true bearing of the plan's y [degrees]
 * @returns {[number, number]} unit vector on the screen
 */
export function screenDirection(azimuth, planNorth) {
  const turned = ((azimuth - planNorth) * Math.PI) / 180;
  return [Math.sin(turned), -Math.cos(turned)];
}

/**
 * @param {Rose} rose
 * @param {number} ring radius of the reference [px]
 * @param {number} planNorth degrees
 * @returns {{outline: number[][], better: number[][][], worse: number[][][]}} the closed line and the strokes
 */
export function roseGeometry(rose, ring, planNorth) {
  const outline = [];
  /** @type {number[][][]} */
  const better = [];
  /** @type {number[][][]} */
  const worse = [];
  // On a small ring strokes this near would run together into a solid.
  const every = ring < SMALL_RING ? 2 : 1;
  for (let azimuth = 0, index = 0; azimuth < 360; azimuth += STROKE_EVERY_DEGREES, index++) {
    const over = sample([...rose.dbi, rose.dbi[0]], rose.step, azimuth) - rose.referenceDbi;
    const radius = within(
      ring + over * PIXELS_PER_DECIBEL,
      ring * INNERMOST,
      ring + OUTERMOST_DECIBELS * PIXELS_PER_DECIBEL,
    );
    const [dx, dy] = screenDirection(azimuth, planNorth);
    const tip = [dx * radius, dy * radius];
    outline.push(tip);
    const reach = within(
      radius,
      ring - STROKE_DECIBELS * PIXELS_PER_DECIBEL,
      ring + STROKE_DECIBELS * PIXELS_PER_DECIBEL,
    );
    const end = [dx * reach, dy * reach];
    if (index % every === 0) (over >= 0 ? better : worse).push([[dx * ring, dy * ring], end]);
  }
  return { outline, better, worse };
}

/**
 * The ring goes round the wire with room for the strokes, and stays inside the frame where it can.
 * @param {number} halfSpan half the wire's extent on the plan [px]
 * @param {number} room from the wire's middle to the nearest edge of the frame [px]
 * @returns {number} px
 */
export function ringRadius(halfSpan, room) {
  const wanted = Math.max(70, halfSpan * 1.12);
  return Math.max(56, Math.min(wanted, room - 50));
}
