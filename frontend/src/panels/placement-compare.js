// @ts-check
import { html } from '../charts/html.js';
import { number, signed } from '../units/figures.js';
import { formatLength } from '../units/length.js';
import { stateMark } from '../charts/marks.js';
import {
  bandSummaries,
  concerns,
  distanceWords,
  pullFigure,
  placementOf,
  placementTitle,
  planOf,
  shapeTitle,
  toBuild,
  wireLength,
} from './placement-facts.js';

/** The pinned placement beside the chosen one, difference by difference. */

/**
 * @param {import('../state/types.js').State} state
 * @param {any} placement the chosen one
 * @param {import('../state/store.js').Store} store
 * @returns {HTMLElement|null} null when the pinned one is gone
 */
export function comparison(state, placement, store) {
  const pinned = placementOf(state, state.pinned);
  if (!pinned) return null;
  const plan = planOf(state);
  const length = (/** @type {number} */ metres) => formatLength(metres, state.units, 2);
  const bandsHere = bandSummaries(plan, placement);
  const bandsThere = bandSummaries(plan, pinned);
  const worstOf = (/** @type {any} */ one) => concerns(plan, one, (metres, sense) => distanceWords(metres, state.units, sense))[0];
  const gust = (/** @type {any} */ one) =>
    Math.max(...one.attachments.map((/** @type {any} */ hold) => hold.pullInWind));
  /** @type {[string, string|Node, string|Node, string][]} */
  const rows = [
    ['shape', shapeTitle(placement.shape), shapeTitle(pinned.shape), ''],
    ['score, dB', signed(placement.score, 1), signed(pinned.score, 1), signed(placement.score - pinned.score, 1)],
    ...bandsHere.map(
      (band, index) =>
        /** @type {[string, string, string, string]} */ ([
          `${band.name}, dB over`,
          signed(band.over, 1),
          bandsThere[index] ? signed(bandsThere[index].over, 1) : '–',
          bandsThere[index] ? signed(band.over - bandsThere[index].over, 1) : '',
        ]),
    ),
    [
      `wire, ${state.units}`,
      length(wireLength(placement)),
      length(wireLength(pinned)),
      difference(wireLength(placement) - wireLength(pinned), length),
    ],
    [
      'greatest pull in the gust, N',
      pullFigure(gust(placement)),
      pullFigure(gust(pinned)),
      signed(Math.ceil(gust(placement)) - Math.ceil(gust(pinned)), 0),
    ],
    ['nearest', concernCell(worstOf(placement)), concernCell(worstOf(pinned)), ''],
    ['to build', toBuild(placement).replace(/^new: /, ''), toBuild(pinned).replace(/^new: /, ''), ''],
  ];
  return html(
    'section',
    { class: 'comparison' },
    html(
      'div',
      { class: 'line part-head' },
      html('h3', {}, 'Beside the pinned one'),
      html(
        'button',
        {
          type: 'button',
          class: 'link',
          'data-key': 'swap',
          onclick: () => store.set({ chosen: pinned.id, pinned: placement.id }),
        },
        'Change places',
      ),
    ),
    html(
      'table',
      {},
      html(
        'thead',
        {},
        html(
          'tr',
          {},
          html('th', { scope: 'col' }, html('span', { class: 'visually-hidden' }, 'figure')),
          html('th', { scope: 'col', class: 'n' }, placementTitle(state, placement)),
          html('th', { scope: 'col', class: 'n' }, placementTitle(state, pinned)),
          html('th', { scope: 'col', class: 'n' }, 'difference'),
        ),
      ),
      html(
        'tbody',
        {},
        ...rows.map(([name, here, there, change]) =>
          html(
            'tr',
            {},
            html('th', { scope: 'row' }, name),
            html('td', { class: 'n' }, here),
            html('td', { class: 'n' }, there),
            html('td', { class: 'n' }, html('b', {}, change)),
          ),
        ),
      ),
    ),
  );
}

/**
 * @param {number} metres
 * @param {(metres: number) => string} length
 */
function difference(metres, length) {
  return metres > 0 ? `+${length(metres)}` : length(metres);
}

/** @param {import('./placement-facts.js').Concern|undefined} concern */
function concernCell(concern) {
  if (!concern) return '–';
  return html(
    'span',
    {},
    stateMark(concern.state, concern.state),
    ` ${concern.words.replace(/; (must keep|it may take).*$/, '')}`,
  );
}
