// @ts-check
import { html } from '../charts/html.js';
import { svg } from '../draw/svg.js';
import { stateMark } from '../charts/marks.js';
import { concerns, distanceWords, listOf, planOf, scoreWords, shapeTitle } from './placement-facts.js';

/** On a narrow screen: the headline with previous and next, and the way to the list. Hidden by the style sheet on a wide one. */

/**
 * @param {import('../state/types.js').State} state
 * @param {any} placement the chosen one
 * @param {number} index of it in the list, -1 when it is not of the list
 * @param {import('../state/store.js').Store} store
 * @returns {HTMLElement}
 */
export function headLine(state, placement, index, store) {
  const list = listOf(state);
  const concern = concerns(planOf(state), placement, (metres, sense) => distanceWords(metres, state.units, sense))[0];
  const step = (/** @type {number} */ way) => {
    const next = list[index + way];
    if (next) store.set({ chosen: next.id });
  };
  const arrow = (/** @type {number} */ way, /** @type {string} */ name) =>
    html(
      'button',
      {
        type: 'button',
        class: 'step',
        'aria-label': name,
        'data-key': `step${way}`,
        disabled: !list[index + way],
        onclick: () => step(way),
      },
      svg('svg', { viewBox: '0 0 20 20', width: 20, height: 20, 'aria-hidden': 'true' }, [
        svg('path', { d: way < 0 ? 'M13 3 6 10l7 7' : 'M7 3l7 7-7 7' }),
      ]),
    );
  return html(
    'div',
    { class: 'headline' },
    arrow(-1, 'Previous placement'),
    html(
      'div',
      { class: 'headline-words' },
      html('h2', {}, scoreWords(placement.score)),
      html(
        'p',
        {},
        html(
          'button',
          {
            type: 'button',
            class: 'link',
            'data-key': 'to-list',
            onclick: () => {
              document.body.dataset.column = 'list';
            },
          },
          index < 0 ? 'to the list' : `${index + 1} of ${list.length}`,
        ),
        ` · ${shapeTitle(placement.shape)} · `,
        concern ? stateMark(concern.state) : null,
        ' ',
        concern ? html('b', { class: concern.state }, concern.state) : null,
      ),
    ),
    arrow(1, 'Next placement'),
  );
}
