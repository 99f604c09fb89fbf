// @ts-check
import { html } from '../charts/html.js';
import { count, impedance, megahertz } from '../charts/figures.js';
import { stateMark } from '../charts/marks.js';
import { number } from '../units/figures.js';
import { bold, square, table } from './sheet-table.js';

/** The part of the sheet that is worked from on site: set-out, order of work, checks, cautions, what a sweep should find. */

/**
 * @param {any} setOutModel
 * @param {(metres: number) => string} length
 */
export function setOut(setOutModel, length) {
  const { a, b, c, points, notes } = setOutModel;
  const known = [a, b, c].filter((one) => one);
  return html(
    'section',
    {},
    html('h3', {}, 'Set-out by two tapes'),
    table(
      [
        '',
        'Point',
        `>From ${a?.letter ?? 'A'}`,
        `>From ${b?.letter ?? 'B'}`,
        'Side',
        `>Check${c ? `, from ${c.letter}` : ''}`,
        '>Tapes cross',
        '>By compass',
        '>Height',
      ],
      points.map((/** @type {any} */ point) => [
        square(point.number),
        html('span', {}, point.name, remark(point, length)),
        bold(length(point.fromA)),
        bold(length(point.fromB)),
        point.side,
        point.check === undefined || point.check === null ? '–' : length(point.check),
        html('span', {}, `${number(point.crossing, 0)}° `, point.flat ? stateMark('tight', 'flat') : null),
        `${number(point.magnetic, 0)}°`,
        length(point.height),
      ]),
      'Points to set out',
    ),
    html('p', { class: 'small' }, `${known.map((one) => `${one.letter}: ${one.what}`).join('. ')}.`),
    ...notes.map((/** @type {string} */ words) => html('p', { class: 'small' }, words)),
  );
}

/**
 * @param {any} point
 * @param {(metres: number) => string} length
 */
function remark(point, length) {
  const words = [
    point.blocked ?? '',
    point.better
      ? `better ${length(point.better.fromTape)} from ${point.better.from} and ${length(point.better.withTape)} from ${point.better.with}, crossing at ${number(point.better.crossing, 0)}°`
      : '',
  ].filter((text) => text);
  return words.length ? html('span', { class: 'small' }, `; ${words.join('; ')}`) : null;
}

/** @param {any} model */
export function order({ order: steps }) {
  return html(
    'section',
    {},
    html('h3', {}, 'Order of work'),
    html(
      'ol',
      { class: 'ticked' },
      ...steps.map((/** @type {string} */ step, /** @type {number} */ index) =>
        html(
          'li',
          {},
          bold(String(index + 1)),
          html('span', { class: 'tickbox', 'aria-hidden': 'true' }),
          html('span', {}, step),
        ),
      ),
    ),
  );
}

/**
 * @param {string} when
 * @param {string[]} all
 */
export function checks(when, all) {
  return html(
    'section',
    {},
    html('h3', {}, `${when === 'Before' ? 'Before anything is raised' : 'When all hangs'}`),
    html(
      'ul',
      { class: 'ticked' },
      ...all.map((one) =>
        html('li', {}, html('span', { class: 'tickbox', 'aria-hidden': 'true' }), html('span', {}, one)),
      ),
    ),
  );
}

/** @param {any} model */
export function cautions({ cautions: all }) {
  return html(
    'section',
    {},
    html('h3', {}, 'Cautions for this site'),
    html(
      'ul',
      { class: 'cautions' },
      ...all.map((/** @type {any} */ caution) =>
        html(
          'li',
          {},
          caution.pressing ? stateMark('tight', 'Pressing') : html('span', {}),
          html('span', {}, caution.text),
        ),
      ),
    ),
  );
}

/** @param {any} model */
export function sweep({ sweep: rows }) {
  if (!rows.length) return null;
  return html(
    'section',
    {},
    html('h3', {}, 'What the sweep should find, at the entry'),
    table(
      ['Band', '>MHz', '>Impedance, Ω', '>Line SWR', 'Match'],
      rows.map((/** @type {any} */ row) => [
        row.band,
        megahertz(row.frequency),
        impedance([row.resistance, row.reactance]),
        row.lineSwr < 10 ? number(row.lineSwr, 1) : count(row.lineSwr),
        html('span', {}, stateMark(row.match), ` ${row.match}`),
      ]),
      'Expected at the station',
    ),
  );
}
