// @ts-check
import { html } from '../charts/html.js';
import { stateMark } from '../charts/marks.js';
import { bold, square, table } from './sheet-table.js';

/**
 * The rigging list part by part as the sheet's own document has set it: every figure comes rounded and in its units,
 * so that page and paper cannot differ.
 * @typedef {{text: string, bold: boolean, mark?: 'clear'|'tight'|'foul', square: boolean}} Cell
 * @typedef {{title: string, columns: {heading: string, right: boolean}[], rows: Cell[][],
 *   items: {number: string, box: boolean, pressing: boolean, text: string}[], before: string[], notes: string[],
 *   boxed: boolean}} Part
 */

/** Parts that need the whole width. */
const WIDE_COLUMNS = 6;

/**
 * @param {any} model a `spanwright-sheet/1` document
 * @returns {HTMLElement}
 */
export function sheetList(model) {
  const { head } = model;
  const [first, ...rest] = model.headLines;
  return html(
    'article',
    { class: 'page list', 'aria-label': 'Rigging list' },
    html(
      'header',
      {},
      html('div', {}, html('p', {}, `Rigging sheet, revision ${head.revision}`), html('h2', {}, head.title)),
      html(
        'div',
        { class: 'end' },
        html('p', {}, html('b', {}, first)),
        ...rest.map((/** @type {string} */ line) => html('p', {}, line)),
      ),
    ),
    head.verdict
      ? html('p', { class: 'verdict' }, stateMark('foul', 'Not allowed'), html('b', {}, ` ${head.verdict}`))
      : null,
    ...pairs(model.printed),
    html('footer', {}, html('p', {}, [...head.weather, model.decides].join(' '))),
  );
}

/**
 * Narrow parts stand two by two, wide ones alone, in the order they read.
 * @param {Part[]} parts
 * @returns {HTMLElement[]}
 */
function pairs(parts) {
  /** @type {HTMLElement[]} */
  const set = [];
  /** @type {Part[]} */
  let waiting = [];
  const flush = () => {
    if (waiting.length) set.push(html('div', { class: 'pair' }, ...waiting.map(section)));
    waiting = [];
  };
  for (const part of parts) {
    if (part.boxed || part.columns.length >= WIDE_COLUMNS) {
      flush();
      set.push(section(part));
    } else {
      waiting.push(part);
      if (waiting.length === 2) flush();
    }
  }
  flush();
  return set;
}

/**
 * @param {Part} part
 * @returns {HTMLElement}
 */
function section(part) {
  return html(
    'section',
    part.boxed ? { class: 'overhead' } : {},
    html('h3', {}, part.title),
    ...part.before.map((words) => html('p', {}, words)),
    part.rows.length
      ? table(
          part.columns.map((column) => `${column.right ? '>' : ''}${column.heading}`),
          part.rows.map((row) => row.map(cell)),
          part.title,
        )
      : null,
    part.items.length ? list(part.items) : null,
    ...part.notes.map((words) => html('p', { class: 'small' }, words)),
  );
}

/**
 * @param {Cell} one
 * @returns {string|Node}
 */
function cell(one) {
  if (one.square) return square(Number(one.text));
  if (one.mark) return html('span', { class: one.mark }, `${one.text} `, stateMark(one.mark), ` ${one.mark}`);
  return one.bold ? bold(one.text) : one.text;
}

/** @param {Part['items']} items */
function list(items) {
  if (items.some((item) => item.box)) {
    const numbered = items[0].number !== '';
    return html(
      numbered ? 'ol' : 'ul',
      { class: 'ticked' },
      ...items.map((item) =>
        html(
          'li',
          {},
          numbered ? bold(item.number) : null,
          html('span', { class: 'tickbox', 'aria-hidden': 'true' }),
          html('span', {}, item.text),
        ),
      ),
    );
  }
  if (items.some((item) => item.pressing)) {
    return html(
      'ul',
      { class: 'cautions' },
      ...items.map((item) =>
        html('li', {}, item.pressing ? stateMark('tight', 'Pressing') : html('span', {}), html('span', {}, item.text)),
      ),
    );
  }
  return html('ul', { class: 'notes' }, ...items.map((item) => html('li', {}, item.text)));
}
