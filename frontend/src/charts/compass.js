// @ts-check
import { svg } from '../draw/svg.js';
import { bearing as bearingText } from './figures.js';
import { within } from './scale.js';

/**
 * A small great-circle compass with the station in the middle: direction is the bearing in which the wave leaves,
 * distance from the middle grows with the square root of the great-circle distance, so that near cover can be seen
 * beside the far side of the earth. Near-vertical cover is a ring.
 *
 * @typedef {{name: string, bearing: number|null, distanceKm: number|null, nearVerticalKm: number|null}} CompassTarget
 */

export const FARTHEST_KM = 40000;
const HALF_WAY_KM = 20000;
const RINGS_KM = [1000, 5000, 10000, 20000];

/**
 * @param {number} km
 * @param {number} radius of the 20,000 km ring [px]
 * @returns {number} px from the middle; the long way round lies outside the ring's rim, on the rim
 */
export function radiusOf(km, radius) {
  return radius * Math.sqrt(within(km, 0, HALF_WAY_KM) / HALF_WAY_KM);
}

/**
 * @param {number} bearing degrees from true north
 * @param {number} radius px
 * @returns {[number, number]} px from the middle, y down
 */
export function spotOf(bearing, radius) {
  const turn = (bearing * Math.PI) / 180;
  return [Math.sin(turn) * radius, -Math.cos(turn) * radius];
}

/**
 * @param {number} x px from the middle
 * @param {number} y px from the middle, down
 * @returns {number} whole degrees, 0 to 359
 */
export function bearingOf(x, y) {
  const degrees = (Math.atan2(x, -y) * 180) / Math.PI;
  return ((Math.round(degrees) % 360) + 360) % 360;
}

/**
 * Great-circle bearing and distance on a sphere of 6371 km, by the haversine formula.
 * @param {[number, number]} from latitude, longitude [degrees]
 * @param {[number, number]} to
 * @returns {{bearing: number, distanceKm: number}}
 */
export function greatCircle(from, to) {
  const rad = Math.PI / 180;
  const [lat1, lon1, lat2, lon2] = [from[0] * rad, from[1] * rad, to[0] * rad, to[1] * rad];
  const dLon = lon2 - lon1;
  const h = Math.sin((lat2 - lat1) / 2) ** 2 + Math.cos(lat1) * Math.cos(lat2) * Math.sin(dLon / 2) ** 2;
  const angle = 2 * Math.atan2(Math.sqrt(h), Math.sqrt(Math.max(0, 1 - h)));
  const turn = Math.atan2(
    Math.sin(dLon) * Math.cos(lat2),
    Math.cos(lat1) * Math.sin(lat2) - Math.sin(lat1) * Math.cos(lat2) * Math.cos(dLon),
  );
  return { bearing: (turn / rad + 360) % 360, distanceKm: angle * 6371 };
}

/**
 * @param {CompassTarget[]} targets
 * @param {number} size px of its square
 * @returns {SVGElement} each target's handle carries `data-target` with its index and is a slider to assistive tools
 */
export function compass(targets, size) {
  const middle = size / 2;
  const radius = middle - 26;
  const tick = (/** @type {number} */ degrees, /** @type {number} */ long) => {
    const [ax, ay] = spotOf(degrees, radius);
    const [bx, by] = spotOf(degrees, radius + long);
    return `M${ax.toFixed(1)} ${ay.toFixed(1)}L${bx.toFixed(1)} ${by.toFixed(1)}`;
  };
  const ticks = Array.from({ length: 36 }, (_, index) => tick(index * 10, index % 3 === 0 ? 6 : 3)).join('');
  return svg(
    'svg',
    {
      class: 'chart compass',
      viewBox: `${-middle} ${-middle} ${size} ${size}`,
      width: size,
      height: size,
      role: 'group',
      'aria-label': 'Targets by bearing and distance',
    },
    [
      ...[...RINGS_KM]
        .reverse()
        .map((km) =>
          svg('circle', { class: km === HALF_WAY_KM ? 'compass-rim' : 'compass-ring', r: radiusOf(km, radius) }),
        ),
      svg('path', { class: 'compass-ticks', d: ticks }),
      svg('path', { class: 'compass-axes', d: `M0 ${-radius}V${radius}M${-radius} 0H${radius}` }),
      ...RINGS_KM.slice(0, 3).map((km) =>
        svg('text', { class: 'axis middle halo', x: 0, y: radiusOf(km, radius) + 4 }, [`${km / 1000}`]),
      ),
      ...['N', '030', '060', '090', '120', '150', '180', '210', '240', '270', '300', '330'].map((name, index) => {
        const [x, y] = spotOf(index * 30, radius + 16);
        return svg('text', { class: index ? 'axis middle' : 'axis middle north', x, y: y + 4 }, [name]);
      }),
      ...targets.map((target, index) => targetMark(target, index, radius)),
      svg('circle', { class: 'compass-station', r: 2.6 }),
    ],
  );
}

/**
 * @param {CompassTarget} target
 * @param {number} index
 * @param {number} radius
 */
function targetMark(target, index, radius) {
  if (target.nearVerticalKm !== null) {
    const r = Math.max(6, radiusOf(target.nearVerticalKm, radius));
    return svg('g', { class: 'compass-near' }, [
      svg('circle', { class: 'compass-near-ring', r }),
      svg('text', { class: 'drawn bold halo', x: 4, y: -r - 4 }, [target.name]),
    ]);
  }
  const bearing = target.bearing ?? 0;
  const [x, y] = spotOf(bearing, Math.max(12, radiusOf(target.distanceKm ?? HALF_WAY_KM, radius)));
  const end = x < 0;
  return svg(
    'g',
    {
      class: 'compass-target',
      'data-target': index,
      'data-key': `compass-${index}`,
      tabindex: 0,
      role: 'slider',
      'aria-label': `Bearing of ${target.name}`,
      'aria-valuemin': 0,
      'aria-valuemax': 359,
      'aria-valuenow': Math.round(bearing),
      'aria-valuetext': bearingText(bearing),
    },
    [
      svg('path', { class: 'compass-ray', d: `M0 0L${x.toFixed(1)} ${y.toFixed(1)}` }),
      svg('circle', { class: 'compass-hit', cx: x, cy: y, r: 14 }),
      svg('circle', { class: 'compass-handle', cx: x, cy: y, r: 5.5 }),
      svg('text', { class: end ? 'drawn bold halo end' : 'drawn bold halo', x: x + (end ? -9 : 9), y: y + 4 }, [
        target.name,
      ]),
    ],
  );
}
