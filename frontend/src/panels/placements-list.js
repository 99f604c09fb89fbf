// @ts-check
import { rowBars } from '../charts/bars.js';
import { html } from '../charts/html.js';
import { stateMark } from '../charts/marks.js';
import { thumbnail } from '../charts/thumbnail.js';
import { signed } from '../units/figures.js';
import {
  bandSummaries,
  bestFirst,
  distanceWords,
  doubtfulLast,
  doubtsOf,
  hangsOn,
  listOf,
  nearestConcern,
  ownOf,
  planOf,
  shapeTitle,
  toBuild,
} from './placement-facts.js';

/**
 * The rows of placements, in the order asked for.
 * @typedef {import('../state/types.js').State} State
 * @typedef {typeof ORDERS[number]} Order
 */

export const ORDERS = /** @type {const} */ (['overall', 'one band', 'no new mast', 'least to build']);

/**
 * @param {State} state
 * @param {Order} order
 * @param {(id: string) => void} choose
 * @returns {HTMLElement}
 */
export function placementRows(state, order, choose) {
  const rows = ordered(state, order);
  return html(
    'ol',
    { class: 'rows', onkeydown: walkRows },
    ...ownOf(state).map((placement) => row(state, placement, null, choose)),
    ...rows.map((placement) => row(state, placement, listOf(state).indexOf(placement) + 1, choose)),
  );
}

/**
 * @param {State} state
 * @param {any} placement
 * @param {number|null} rank null for one made by hand
 * @param {(id: string) => void} choose
 */
function row(state, placement, rank, choose) {
  const plan = planOf(state);
  const bars = bandSummaries(plan, placement);
  const concern = nearestConcern(plan, placement, (metres, sense) => distanceWords(metres, state.units, sense));
  const names = hangsOn(plan, placement).join(', ');
  return html(
    'li',
    {},
    html(
      'button',
      {
        type: 'button',
        class: 'row',
        'data-key': `row-${placement.id}`,
        'aria-current': placement.id === state.chosen ? 'true' : null,
        onclick: () => choose(placement.id),
      },
      html('span', { class: 'rank' }, rank === null ? '' : String(rank)),
      thumbnail(plan, placement, { width: 54, height: 68 }),
      html(
        'span',
        { class: 'row-words' },
        html(
          'b',
          {},
          shapeTitle(placement.shape),
          placement.madeFrom ? html('span', { class: 'soft' }, `, ${placement.madeFrom.toLowerCase()}`) : null,
          state.pinned === placement.id ? html('span', { class: 'soft' }, ', pinned') : null,
        ),
        html('span', { class: 'row-names', title: names }, names),
        concern
          ? html(
              'span',
              { class: 'row-state' },
              stateMark(concern.state),
              ' ',
              html('b', { class: concern.state }, concern.state),
              ` ${short(concern.words)}`,
            )
          : null,
        doubtsOf(placement).length
          ? html('span', { class: 'row-state' }, stateMark('tight'), ' ', html('b', { class: 'tight' }, 'figures doubtful'))
          : null,
        html('span', { class: 'soft' }, toBuild(placement)),
      ),
      html(
        'span',
        { class: 'row-figures' },
        html('span', { class: 'score' }, html('b', {}, signed(placement.score, 1)), ' dB'),
        rowBars(bars, { width: 98, height: 30 }),
      ),
    ),
  );
}

/**
 * @param {string} words
 * @returns {string} without what the rule asks and which part of ours is near; the row has no room for them
 */
function short(words) {
  return words
    .replace(/; (must keep|it may take).*$/, '')
    .replace(/ in the gust$/, '')
    .replace(/,[^,]*$/, '');
}

/**
 * @param {State} state
 * @param {Order} view
 * @returns {any[]}
 */
function ordered(state, view) {
  const list = listOf(state);
  if (view === 'no new mast') return list.filter((placement) => placement.masts.length === 0);
  if (view === 'one band') {
    const plan = planOf(state);
    const over = (/** @type {any} */ placement) => {
      const bands = bandSummaries(plan, placement);
      return (bands.find((band) => band.name === state.chosenBand) ?? bands[0])?.over ?? 0;
    };
    return [...list].sort((a, b) => doubtfulLast(a, b) || over(b) - over(a));
  }
  if (view === 'least to build') {
    const work = (/** @type {any} */ placement) => placement.masts.length * 10 + placement.ropes.length;
    return [...list].sort((a, b) => doubtfulLast(a, b) || work(a) - work(b) || bestFirst(a, b));
  }
  return list;
}

/**
 * Arrow keys walk the list.
 * @param {KeyboardEvent} event
 */
function walkRows(event) {
  if (event.key !== 'ArrowDown' && event.key !== 'ArrowUp') return;
  const rows = [...document.querySelectorAll('.rows .row')];
  const now = rows.indexOf(/** @type {Element} */ (document.activeElement));
  const next = rows[now + (event.key === 'ArrowDown' ? 1 : -1)];
  if (now < 0 || !(next instanceof HTMLElement)) return;
  event.preventDefault();
  next.focus();
}
