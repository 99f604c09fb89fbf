// @ts-check
import { svg } from '../draw/svg.js';
import { signed } from '../units/figures.js';
import { markAt } from './marks.js';
import { linear, within } from './scale.js';

/** Small bars against the reference: filled above it, open below. Pure apart from making the nodes. */

const MOST_DECIBELS = 15;

/**
 * Heights of the row's bars about their base line.
 * @param {{name: string, over: number}[]} bands
 * @param {{width: number, height: number}} size
 */
export function rowBarsGeometry(bands, { width, height }) {
  const overs = bands.map((band) => within(band.over, -MOST_DECIBELS, MOST_DECIBELS));
  const up = Math.max(4, ...overs);
  const down = Math.max(3, ...overs.map((over) => -over));
  const y = linear([up, -down], [0, height]);
  const pitch = width / Math.max(1, bands.length);
  const wide = Math.min(15, pitch * 0.6);
  return {
    base: y(0),
    bars: bands.map((band, index) => {
      const middle = pitch * (index + 0.5);
      const tip = y(overs[index]);
      return {
        name: band.name,
        middle,
        x: middle - wide / 2,
        width: wide,
        below: overs[index] < 0,
        y: Math.min(tip, y(0)),
        height: Math.max(1, Math.abs(tip - y(0))),
      };
    }),
  };
}

const NAME_ROW = 16;
const MARK_ROW = 11;

/**
 * Bars for a list row, band names under them, and a mark under the name of a band that does not match with room to
 * spare.
 * @param {{name: string, over: number, state?: string}[]} bands
 * @param {{width: number, height: number}} size without the names
 * @returns {SVGElement}
 */
export function rowBars(bands, size) {
  const { base, bars } = rowBarsGeometry(bands, size);
  const bad = bands.map((band) => (band.state && band.state !== 'clear' ? band.state : null));
  const words = bands
    .map((band, index) => `${band.name} ${signed(band.over, 1)}${bad[index] ? ` (matching ${bad[index]})` : ''}`)
    .join(', ');
  const height = size.height + NAME_ROW + (bad.some((state) => state) ? MARK_ROW : 0);
  return svg(
    'svg',
    {
      class: 'chart row-bars',
      viewBox: `0 0 ${size.width} ${height}`,
      width: size.width,
      height,
      role: 'img',
      'aria-label': `Over the reference, dB: ${words}`,
    },
    [
      ...bars.map((bar) =>
        svg('rect', {
          class: bar.below ? 'bar below' : 'bar',
          x: bar.x,
          y: bar.y,
          width: bar.width,
          height: bar.height,
        }),
      ),
      svg('path', { class: 'bar-base', d: `M0 ${base}H${size.width}` }),
      ...bars.map((bar) =>
        svg('text', { class: 'axis middle', x: bar.middle, y: size.height + 14 }, [shortBand(bar.name)]),
      ),
      ...bars.map((bar, index) =>
        bad[index]
          ? svg('g', { transform: `translate(${bar.middle} ${size.height + 21}) scale(0.75)` }, [
              markAt(bad[index], 0, 0),
            ])
          : null,
      ),
    ],
  );
}

/**
 * "20 m" is "20" where the column says metres already.
 * @param {string} name
 */
export function shortBand(name) {
  return name.replace(/\s*m$/, '').slice(0, 5);
}

/**
 * One bar along a table row, from a common base line.
 * @param {number} over decibels over the reference
 * @param {{low: number, high: number}} span of the whole table
 * @param {{width: number, height: number}} size
 * @returns {SVGElement}
 */
export function overBar(over, span, { width, height }) {
  const x = linear([Math.min(0, span.low), Math.max(0, span.high)], [2, width - 2]);
  const [from, to] = [Math.min(x(0), x(over)), Math.max(x(0), x(over))];
  return svg(
    'svg',
    { class: 'chart over-bar', viewBox: `0 0 ${width} ${height}`, width, height, 'aria-hidden': 'true' },
    [
      svg('rect', {
        class: over < 0 ? 'bar below' : 'bar',
        x: from,
        y: 3,
        width: Math.max(0.5, to - from),
        height: height - 6,
      }),
      svg('path', { class: 'bar-base', d: `M${x(0)} 0V${height}` }),
    ],
  );
}

/**
 * A pull: filled calm, open in the gust, the limit a tick.
 * @param {{calm: number, gust: number, limit: number|null}} pull newtons
 * @param {number} most newtons at the right end
 * @param {{width: number, height: number}} size
 * @returns {SVGElement}
 */
export function pullBar({ calm, gust, limit }, most, { width, height }) {
  const x = linear([0, most], [1, width - 2]);
  const middle = height / 2;
  return svg(
    'svg',
    { class: 'chart pull-bar', viewBox: `0 0 ${width} ${height}`, width, height, 'aria-hidden': 'true' },
    [
      svg('path', {
        class: 'pull-track',
        d: `M1 ${middle}H${limit === null ? x(gust) : Math.min(width - 1, x(limit))}`,
      }),
      svg('rect', { class: 'pull-gust', x: 1, y: middle - 4, width: Math.max(1, x(gust) - 1), height: 8 }),
      svg('rect', { class: 'pull-calm', x: 1, y: middle - 4, width: Math.max(1, x(calm) - 1), height: 8 }),
      limit === null
        ? null
        : svg('path', { class: 'pull-limit', d: `M${Math.min(width - 1, x(limit))} ${middle - 6}v12` }),
    ],
  );
}
