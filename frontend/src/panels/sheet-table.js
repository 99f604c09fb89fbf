// @ts-check
import { html } from '../charts/html.js';

/** How the sheet sets its tables. */

/**
 * @param {string[]} heads each "text" or ">text" for figures
 * @param {(string|Node|null)[][]} rows
 * @param {string} [caption] for screen readers
 */
export function table(heads, rows, caption) {
  const right = heads.map((head) => head.startsWith('>'));
  return html(
    'div',
    { class: 'scroll', tabindex: 0, role: 'group', 'aria-label': caption ?? 'table' },
    html(
      'table',
      {},
      caption ? html('caption', { class: 'visually-hidden' }, caption) : null,
      html(
        'thead',
        {},
        html(
          'tr',
          {},
          ...heads.map((head, index) =>
            html(
              'th',
              { scope: 'col', class: right[index] ? 'n' : null },
              head.replace(/^>/, '') || html('span', { class: 'visually-hidden' }, 'mark'),
            ),
          ),
        ),
      ),
      html(
        'tbody',
        {},
        ...rows.map((row) =>
          html(
            'tr',
            {},
            ...row.map((cell, index) =>
              html(
                index === 0 ? 'th' : 'td',
                {
                  scope: index === 0 ? 'row' : null,
                  class: right[index] ? 'n' : null,
                  'data-label': heads[index].replace(/^>/, '') || null,
                },
                cell,
              ),
            ),
          ),
        ),
      ),
    ),
  );
}

/** @param {string} text */
export const bold = (text) => html('b', {}, text);

/** @param {number} point */
export const square = (point) => html('span', { class: 'point' }, String(point));
