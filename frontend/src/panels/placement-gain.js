// @ts-check
import { html } from '../charts/html.js';
import { overBar } from '../charts/bars.js';
import { bearing, impedance, megahertz, range, count } from '../charts/figures.js';
import { number, signed } from '../units/figures.js';
import { lengthWithUnit } from '../units/length.js';
import { stateMark, worst } from '../charts/marks.js';
import { bandsOf, doubtsOf } from './placement-facts.js';

/** Tables of the radio side of a placement: delivered gain, feed, score, remarks. */

/**
 * @param {any} placement
 * @param {string|null} shown the band whose rose is drawn
 * @param {(name: string) => void} choose
 * @returns {HTMLElement}
 */
export function gainTable(placement, shown, choose) {
  const bands = bandsOf(placement);
  const overs = bands.flatMap(({ middle }) =>
    middle.targets.map((/** @type {any} */ target) => target.deliveredDbi - target.referenceDbi),
  );
  const span = { low: Math.min(-3, ...overs), high: Math.max(3, ...overs) };
  const rows = bands.map(({ name, rows: all, middle }) => {
    const state = worst(all.map((row) => row.matching.state));
    const loss = middle.lineLossDb + middle.matching.lossDb;
    const why = all.find((row) => row.matching.state === state)?.matching.why ?? '';
    const targets = middle.targets.length ? middle.targets : [null];
    return html(
      'tbody',
      { class: name === shown ? 'shown' : null },
      ...targets.map((/** @type {any} */ target, /** @type {number} */ index) => {
        const over = target ? target.deliveredDbi - target.referenceDbi : 0;
        return html(
          'tr',
          {},
          index === 0
            ? html(
                'th',
                { scope: 'rowgroup', rowspan: targets.length },
                html(
                  'button',
                  {
                    type: 'button',
                    class: 'plain',
                    'data-key': `gain-${name}`,
                    'aria-pressed': String(name === shown),
                    onclick: () => choose(name),
                  },
                  name,
                ),
              )
            : null,
          html('td', { class: 'name' }, target ? target.name : 'no target on this band'),
          html('td', { class: 'n soft' }, target ? range(target.window[0], target.window[1]) : ''),
          html('td', { class: 'n' }, target ? html('b', {}, signed(target.deliveredDbi, 1)) : ''),
          html('td', { class: 'n' }, target ? signed(over, 1) : ''),
          html('td', { class: 'bar-cell' }, target ? overBar(over, span, { width: 54, height: 16 }) : ''),
          index === 0 ? html('td', { class: 'n', rowspan: targets.length }, number(loss, 1)) : null,
          index === 0
            ? html(
                'td',
                { class: 'mark-cell', rowspan: targets.length, title: `${state}: ${why}` },
                stateMark(state, `Matching ${state}: ${why}`),
              )
            : null,
        );
      }),
    );
  });
  return html(
    'section',
    { class: 'gains' },
    html(
      'div',
      { class: 'line part-head' },
      html('h3', {}, 'Delivered gain, after all losses'),
      html('span', { class: 'soft' }, 'dB'),
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
          html('th', { scope: 'col' }, 'band'),
          html('th', { scope: 'col' }, 'target'),
          html('th', { scope: 'col', class: 'n' }, 'window'),
          html('th', { scope: 'col', class: 'n' }, 'dBi'),
          html('th', { scope: 'colgroup', class: 'n', colspan: 2 }, 'over reference'),
          html('th', { scope: 'col', class: 'n' }, 'loss'),
          html('th', { scope: 'col' }, html('span', { class: 'visually-hidden' }, 'matching')),
        ),
      ),
      ...rows,
    ),
  );
}

/**
 * @param {import('../state/types.js').State} state
 * @param {any} placement
 * @returns {HTMLElement}
 */
export function feedFacts(state, placement) {
  const line = (state.catalogue?.lines ?? []).find((/** @type {any} */ one) => one.id === placement.feed.line);
  const fraction = placement.feed.fraction;
  const where = Math.abs(fraction - 0.5) < 0.005 ? 'in the middle' : `at ${number(fraction * 100, 0)} % of the wire`;
  return html(
    'section',
    { class: 'feed' },
    html('h3', {}, 'Feed'),
    html(
      'p',
      {},
      `Fed ${where}; ${lengthWithUnit(placement.feed.lineLength, state.units, 2)} of ${line?.name ?? placement.feed.line}.`,
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
          html('th', { scope: 'col' }, 'MHz'),
          html('th', { scope: 'col', class: 'n' }, 'feedpoint, Ω'),
          html('th', { scope: 'col', class: 'n' }, 'SWR'),
          html('th', { scope: 'col', class: 'n' }, 'station, Ω'),
          html('th', { scope: 'col', class: 'n' }, 'peak V'),
          html('th', { scope: 'col', class: 'n' }, 'peak dBi'),
          html('th', { scope: 'col' }, html('span', { class: 'visually-hidden' }, 'matching')),
        ),
      ),
      html(
        'tbody',
        {},
        ...placement.bands.map((/** @type {any} */ row) =>
          html(
            'tr',
            {},
            html('th', { scope: 'row' }, megahertz(row.frequency)),
            html('td', { class: 'n' }, impedance(row.impedance)),
            html('td', { class: 'n' }, number(row.lineSwr, row.lineSwr < 10 ? 1 : 0)),
            html('td', { class: 'n' }, impedance(row.atStation)),
            html('td', { class: 'n' }, count(row.matching.peakVolts)),
            html(
              'td',
              { class: 'n', title: `${bearing(row.peakAzimuth)}, ${number(row.peakElevation, 0)}° up` },
              signed(row.peakGainDbi, 1),
            ),
            html(
              'td',
              { class: 'mark-cell', title: row.matching.why },
              stateMark(row.matching.state, `${row.matching.state}: ${row.matching.why}`),
            ),
          ),
        ),
      ),
    ),
    ...matchingRemarks(placement),
  );
}

/** @param {any} placement */
function matchingRemarks(placement) {
  return bandsOf(placement)
    .filter(({ rows }) => rows.some((row) => row.matching.state !== 'clear'))
    .map(({ name, rows }) => {
      const row =
        rows.find((one) => one.matching.state === 'foul') ?? rows.find((one) => one.matching.state === 'tight');
      return html(
        'p',
        { class: 'remark' },
        stateMark(row.matching.state),
        ' ',
        html('b', { class: row.matching.state }, row.matching.state),
        ` on ${name}: ${row.matching.why}`,
      );
    });
}

/**
 * @param {any} placement
 * @returns {HTMLElement}
 */
export function scoreTable(placement) {
  return html(
    'section',
    { class: 'score-parts' },
    html('h3', {}, 'How the score adds up, dB'),
    html(
      'table',
      {},
      html(
        'tbody',
        {},
        ...placement.scoreParts.map((/** @type {any} */ part) =>
          html('tr', {}, html('th', { scope: 'row' }, part.what), html('td', { class: 'n' }, signed(part.points, 2))),
        ),
      ),
      html(
        'tfoot',
        {},
        html(
          'tr',
          {},
          html('th', { scope: 'row' }, 'Score'),
          html('td', { class: 'n' }, html('b', {}, signed(placement.score, 2))),
        ),
      ),
    ),
  );
}

/**
 * @param {any} placement
 * @returns {HTMLElement}
 */
export function remarks(placement) {
  // what is doubtful stands at the head of the placement already
  const doubts = doubtsOf(placement);
  const notes = placement.notes.filter(
    (/** @type {string} */ note) => !doubts.some((/** @type {string} */ doubt) => note.endsWith(doubt)),
  );
  return html(
    'section',
    { class: 'remarks' },
    html('h3', {}, 'Worth knowing'),
    html(
      'ul',
      {},
      ...notes.map((/** @type {string} */ note) => html('li', {}, note)),
      html('li', {}, `${placement.exposure}.`.replace(/\.\.$/, '.')),
    ),
  );
}
