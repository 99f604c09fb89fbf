// @ts-check
import { html } from '../charts/html.js';
import { stateMark } from '../charts/marks.js';
import { number } from '../units/figures.js';
import { formatLength, lengthWithUnit } from '../units/length.js';
import { bold, square, table } from './sheet-table.js';
import { cautions, checks, order, setOut, sweep } from './sheet-work.js';

/**
 * The rigging list from the sheet's own document, in the order it prints: overhead lines first, in the only box.
 * @typedef {'m'|'ft'} Units
 * @typedef {(metres: number) => string} Length
 */

/**
 * @param {any} model a `spanwright-sheet/1` document
 * @param {Units} units
 * @returns {HTMLElement}
 */
export function sheetList(model, units) {
  const length = (/** @type {number} */ metres) => formatLength(metres, units, 2);
  const { head } = model;
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
        html('p', {}, html('b', {}, `${head.name}, ${lengthWithUnit(head.wireLength, units, 1)} of wire`)),
        html('p', {}, `${head.bands.join(', ')}; ${number(head.power, 0)} W`),
        html(
          'p',
          {},
          units === 'm'
            ? 'Metres. Heights above ground at that spot.'
            : 'Feet and inches. Heights above ground at that spot.',
        ),
        head.savedAt ? html('p', {}, `Plan as saved ${head.savedAt}`) : null,
      ),
    ),
    head.verdict
      ? html('p', { class: 'verdict' }, stateMark('foul', 'Not allowed'), html('b', {}, ` ${head.verdict}`))
      : null,
    overheadBox(model.overhead, length),
    html('div', { class: 'pair' }, wires(model, length), ropes(model, length)),
    html(
      'div',
      { class: 'pair' },
      html('div', { class: 'stack' }, holdings(model, length), sags(model, length)),
      hardware(model, length),
    ),
    setOut(model.setOut, length),
    html('div', { class: 'pair' }, order(model), cautions(model)),
    html('div', { class: 'pair' }, checks('Before', model.before), checks('After', model.after)),
    sweep(model),
    model.notes?.length
      ? html(
          'section',
          {},
          html('h3', {}, 'Notes'),
          html('ul', { class: 'notes' }, ...model.notes.map((/** @type {string} */ note) => html('li', {}, note))),
        )
      : null,
    html(
      'footer',
      {},
      html('p', {}, [...head.weather, model.decides].join(' ')),
      html('p', {}, 'RF exposure not computed.'),
    ),
  );
}

/**
 * @param {any} overhead
 * @param {Length} length
 */
function overheadBox(overhead, length) {
  const reach = (/** @type {any} */ one, /** @type {string} */ none, /** @type {number|undefined} */ keep) => {
    if (!one) return none;
    const of = keep !== undefined && Math.abs(one.required - keep) < 1e-6 ? '' : ` of ${length(one.required)}`;
    return html('span', { class: one.state }, `${length(one.distance)}${of} `, stateMark(one.state), ` ${one.state}`);
  };
  const falls = (/** @type {any} */ line) =>
    line.kind === 'telephone' ? 'not required' : line.nearest ? 'does not arise' : 'no figure';
  return html(
    'section',
    { class: 'overhead' },
    html('h3', {}, 'Overhead lines first'),
    ...overhead.say.map((/** @type {string} */ words) => html('p', {}, words)),
    overhead.lines.length
      ? table(
          ['Line', 'Kind', '>Height', '>Keep', '>Nearest, in the gust', '>If a wire lets go', '>If a mast falls'],
          overhead.lines.map((/** @type {any} */ line) => [
            html(
              'span',
              {},
              bold(line.name),
              line.authority ? html('span', { class: 'small' }, ` ${line.authority}`) : null,
            ),
            line.kind,
            `${length(line.lowest)}–${length(line.highest)}`,
            line.keep === undefined || line.keep === null ? 'not checked' : bold(length(line.keep)),
            reach(line.nearest, 'no figure', line.keep),
            reach(line.wireLetGo, falls(line), line.keep),
            reach(line.mastFalls, falls(line), line.keep),
          ]),
          'Overhead lines',
        )
      : null,
  );
}

/**
 * @param {any} model
 * @param {Length} length
 */
function wires({ wires: pieces, feedLine }, length) {
  const kinds = [...new Set(pieces.map((/** @type {any} */ piece) => piece.kind))];
  return html(
    'section',
    {},
    html('h3', {}, 'Wire and line'),
    table(
      ['', 'Piece', '>Hangs', '>Added', '>Cut'],
      [
        ...pieces.map((/** @type {any} */ piece) => [
          bold(piece.mark),
          piece.piece,
          length(piece.finished),
          length(piece.turnsBack + piece.trim),
          bold(length(piece.cut)),
        ]),
        [
          bold(feedLine.mark),
          'feedpoint to entry',
          length(feedLine.finished),
          length(feedLine.madeOff),
          bold(length(feedLine.cut)),
        ],
      ],
      'Wire and line to cut',
    ),
    html('p', { class: 'small' }, `${kinds.join('; ')}. ${feedLine.mark}: ${feedLine.kind}.`),
    ...feedLine.notes.map((/** @type {string} */ words) => html('p', { class: 'small' }, words)),
  );
}

/**
 * @param {any} model
 * @param {Length} length
 */
function ropes({ ropes: all }, length) {
  const kinds = [...new Set(all.map((/** @type {any} */ rope) => rope.kind))];
  return html(
    'section',
    {},
    html('h3', {}, 'Rope'),
    all.length
      ? table(
          ['', 'Runs', '>Run', '>Cut'],
          all.map((/** @type {any} */ rope) => [
            bold(rope.mark),
            `${rope.from}${rope.over ? ` over ${rope.over}` : ''} to ${rope.to}; ${rope.madeOff}`,
            length(rope.run),
            bold(length(rope.cut)),
          ]),
          'Ropes to cut',
        )
      : html('p', {}, 'None.'),
    kinds.length ? html('p', { class: 'small' }, `${kinds.join('; ')}.`) : null,
  );
}

/**
 * @param {any} model
 * @param {Length} length
 */
function holdings({ attachments }, length) {
  return html(
    'section',
    {},
    html('h3', {}, 'Attachments, pulls, what to hang'),
    table(
      ['', 'Point', '>Height', '>Calm, N', '>Gust, N', '>May take, N', '>Hang'],
      attachments.map((/** @type {any} */ one) => [
        square(one.point),
        one.name,
        bold(length(one.aboveGround)),
        number(one.pull, 0),
        number(one.pullInWind, 0),
        one.mayTake === undefined || one.mayTake === null
          ? 'not checked'
          : html('span', {}, `${number(one.mayTake, 0)} `, stateMark(one.state, one.state)),
        one.kilograms ? bold(`${number(one.kilograms, 1)} kg`) : one.held === 'centre' ? 'middle' : one.held,
      ]),
      'Attachments',
    ),
  );
}

/**
 * @param {any} model
 * @param {Length} length
 */
function hardware({ hardware: items }, length) {
  const remark = (/** @type {any} */ item) =>
    [item.length ? `${length(item.length)}` : '', item.note ?? ''].filter((text) => text).join(' ');
  return html(
    'section',
    {},
    html('h3', {}, 'Hardware, with spares'),
    table(
      ['>', 'What', '>Spare'],
      items.map((/** @type {any} */ item) => [
        bold(String(item.count)),
        html('span', {}, item.what, remark(item) ? html('span', { class: 'small' }, `, ${remark(item)}`) : null),
        item.spares ? `+${item.spares}` : '',
      ]),
      'Hardware',
    ),
  );
}

/**
 * @param {any} model
 * @param {Length} length
 */
function sags({ sags: all }, length) {
  return html(
    'section',
    {},
    html('h3', {}, 'Spans, and sag to sight'),
    table(
      ['Span', '>Level', '>Sag, middle', '>Height', '>In gust', '>Blown out', '>Compass'],
      all.map((/** @type {any} */ sag) => [
        sag.span,
        length(sag.level),
        bold(length(sag.middle)),
        length(sag.heightMiddle),
        length(sag.inGust),
        length(sag.blowOut),
        `${number(sag.magnetic, 0)}°`,
      ]),
      'Sag of each span',
    ),
  );
}
