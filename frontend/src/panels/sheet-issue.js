// @ts-check
import { html } from '../charts/html.js';
import { stateMark } from '../charts/marks.js';

/**
 * Which revision the sheet shown is, what it changes, and handing it out. What was handed out stands on the server
 * beside the plot; this part shows it and asks for one more.
 *
 * @typedef {{revision: string, date: string, placement: string, what: string}} Issued
 * @typedef {{revision: string, date?: string, since?: string, changes: string[]}} Head of the sheet's own document
 */

/**
 * @param {Head} head
 * @returns {string} "Revision B, not yet issued"
 */
export function revisionWords(head) {
  return head.date ? `Revision ${head.revision}, issued ${head.date}` : `Revision ${head.revision}, not yet issued`;
}

/**
 * @param {Head} head
 * @returns {string} what changed, in one line; empty for the first sheet of a plot
 */
export function changeWords(head) {
  if (!head.since) return '';
  const some = head.changes.length === 1 ? '1 change' : `${head.changes.length} changes`;
  return `${some} since revision ${head.since}`;
}

/**
 * @param {Head} head
 * @param {Issued[]} issued in the order they were issued
 * @param {{busy: boolean, trouble: string|null, issue: () => void}} act
 * @returns {HTMLElement}
 */
export function issuePart(head, issued, act) {
  return html(
    'section',
    { class: 'revision', 'aria-label': 'Revision' },
    // Where the button was, so that the focus has a place to go once the sheet is issued.
    html('h2', head.date ? { tabindex: -1, 'data-key': 'issue' } : {}, revisionWords(head)),
    head.date
      ? null
      : html(
          'button',
          {
            type: 'button',
            class: 'go',
            'data-key': 'issue',
            'aria-disabled': act.busy ? 'true' : null,
            onclick: () => {
              if (!act.busy) act.issue();
            },
          },
          `Issue revision ${head.revision}`,
        ),
    head.date
      ? null
      : html('p', { class: 'soft' }, 'Issue it when you hand it out: later sheets then say what has changed since.'),
    act.trouble ? html('p', { class: 'problem', role: 'alert' }, stateMark('foul', 'Error'), ` ${act.trouble}`) : null,
    head.since
      ? html(
          'details',
          {},
          html('summary', { 'data-key': 'changes' }, changeWords(head)),
          html('ul', { class: 'notes' }, ...head.changes.map((words) => html('li', {}, words))),
        )
      : null,
    issued.length
      ? html(
          'div',
          {},
          html('h3', {}, 'Issued so far'),
          html(
            'ul',
            { class: 'issued' },
            ...[...issued]
              .reverse()
              .map((one) => html('li', {}, html('b', {}, one.revision), ` ${one.date} `, html('span', { class: 'soft' }, one.what))),
          ),
        )
      : null,
  );
}
