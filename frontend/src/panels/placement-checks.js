// @ts-check
import { html } from '../charts/html.js';
import { pullBar } from '../charts/bars.js';
import { number } from '../units/figures.js';
import { stateMark } from '../charts/marks.js';
import { nameOf, pullFigure } from './placement-facts.js';

/** Tables of what is checked on a placement: pulls at its holding points, clearances. */

const SHOWN_AT_FIRST = 6;

/**
 * @param {any} plan
 * @param {any} placement
 * @returns {HTMLElement}
 */
export function pullsTable(plan, placement) {
  const most = Math.max(
    1,
    ...placement.attachments.flatMap((/** @type {any} */ hold) => [hold.pullInWind, hold.pullLimit ?? 0]),
  );
  const wind = plan.brief?.rules?.wind ?? 25;
  return html(
    'section',
    { class: 'pulls' },
    html(
      'div',
      { class: 'line part-head' },
      html('h3', {}, 'Pulls, newtons'),
      html('span', { class: 'soft' }, `filled calm, open in a ${number(wind, 0)} m/s gust`),
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
          html('th', { scope: 'col' }, html('span', { class: 'visually-hidden' }, 'holding point')),
          html('th', { scope: 'col', class: 'n' }, 'calm'),
          html('th', { scope: 'col', class: 'n' }, 'gust'),
          html('th', { scope: 'col' }, html('span', { class: 'visually-hidden' }, 'bars')),
          html('th', { scope: 'col', class: 'n' }, 'limit'),
          html('th', { scope: 'col' }, html('span', { class: 'visually-hidden' }, 'state')),
        ),
      ),
      html(
        'tbody',
        {},
        ...placement.attachments.map((/** @type {any} */ hold) =>
          html(
            'tr',
            {},
            html('th', { scope: 'row' }, nameOf(plan, hold.on), held(hold)),
            html('td', { class: 'n' }, pullFigure(hold.pull)),
            html('td', { class: 'n' }, pullFigure(hold.pullInWind)),
            html(
              'td',
              { class: 'bar-cell' },
              pullBar({ calm: hold.pull, gust: hold.pullInWind, limit: hold.pullLimit ?? null }, most, {
                width: 120,
                height: 16,
              }),
            ),
            html(
              'td',
              { class: 'n' },
              hold.pullLimit === undefined || hold.pullLimit === null
                ? html('span', { class: 'soft' }, 'not known')
                : number(hold.pullLimit, 0),
            ),
            html('td', { class: 'mark-cell' }, holdMark(hold)),
          ),
        ),
      ),
    ),
  );
}

/** No tick where the limit is not known: nothing was held against anything. @param {any} hold */
function holdMark(hold) {
  const unchecked = hold.state === 'clear' && (hold.pullLimit === undefined || hold.pullLimit === null);
  return unchecked ? html('span', { class: 'soft', 'aria-label': 'not checked' }, '–') : stateMark(hold.state, hold.state);
}

/** @param {any} hold */
function held(hold) {
  if (hold.held === 'weight' && hold.kilograms)
    return html('span', { class: 'soft' }, `, weight ${number(hold.kilograms, 1)} kg`);
  return hold.held ? html('span', { class: 'soft' }, `, ${hold.held === 'centre' ? 'middle' : hold.held}`) : null;
}

/**
 * @param {any} plan
 * @param {any} placement
 * @param {any} catalogue
 * @param {import('./placement-facts.js').Length} length
 * @param {'m'|'ft'} units
 * @returns {HTMLElement}
 */
export function clearancesTable(plan, placement, catalogue, length, units) {
  const rows = placement.clearances.map((/** @type {any} */ one) =>
    html(
      'tr',
      {},
      html('td', { class: 'mark-cell' }, stateMark(one.state, one.state)),
      html('th', { scope: 'row' }, nameOf(plan, one.to), html('span', { class: 'soft' }, ` ${part(one, catalogue)}`)),
      html('td', { class: 'n' }, html('b', {}, length(one.distance, 'found'))),
      html('td', { class: 'n soft' }, length(one.required, 'required')),
    ),
  );
  const bad = placement.clearances.filter((/** @type {any} */ one) => one.state !== 'clear').length;
  const first = Math.max(SHOWN_AT_FIRST, bad);
  const head = () =>
    html(
      'thead',
      {},
      html(
        'tr',
        {},
        html('th', { scope: 'col' }, html('span', { class: 'visually-hidden' }, 'state')),
        html('th', { scope: 'col' }, 'to'),
        html('th', { scope: 'col', class: 'n' }, 'found'),
        html('th', { scope: 'col', class: 'n' }, 'must keep'),
      ),
    );
  return html(
    'section',
    { class: 'clearances' },
    html(
      'div',
      { class: 'line part-head' },
      html('h3', {}, 'Clearances'),
      html('span', { class: 'soft' }, units === 'm' ? 'metres' : 'feet and inches'),
    ),
    html('table', {}, head(), html('tbody', {}, ...rows.slice(0, first))),
    rows.length > first
      ? html(
          'details',
          {},
          html('summary', {}, `${rows.length - first} more, all clear`),
          html('table', {}, head(), html('tbody', {}, ...rows.slice(first))),
        )
      : null,
    html('p', { class: 'soft' }, 'Calm and blown by the wind. Local code and licensed practice decide.'),
  );
}

/**
 * @param {any} clearance
 * @param {any} catalogue
 */
function part(clearance, catalogue) {
  const rule = (catalogue?.rules ?? []).find((/** @type {any} */ one) => one.id === clearance.rule);
  const name = rule?.name ?? clearance.rule.replace(/-/g, ' ');
  const what = clearance.what ?? '';
  return what && what !== 'wire' ? `${what}` : name.toLowerCase();
}
