// @ts-check
import { html, redrawer } from '../charts/html.js';
import { count } from '../charts/figures.js';
import { stateMark } from '../charts/marks.js';
import { number } from '../units/figures.js';
import { isStale, listOf, ownOf } from './placement-facts.js';
import { ORDERS, placementRows } from './placements-list.js';
import { cancelSearch, startSearch, regainSearch } from './placements-search.js';

/**
 * Placements, left: starting a search, its progress, the ranked list.
 * @typedef {import('../state/store.js').Store} Store
 * @typedef {import('../state/types.js').State} State
 * @typedef {import('./placements-search.js').Shell} Shell
 */

const EFFORTS = /** @type {const} */ ([
  ['quick', 'a few seconds'],
  ['normal', 'under a minute'],
  ['thorough', 'up to three minutes'],
]);
/**
 * @param {HTMLElement} root empty element that this panel owns
 * @param {Store} store the page's one store
 * @param {Shell} shell
 */
export function mount(root, store, shell) {
  root.classList.add('placements');
  /** @type {{effort: 'quick'|'normal'|'thorough', view: import('./placements-list.js').Order, again: boolean}} */
  const choice = { effort: 'normal', view: 'overall', again: false };
  const ask = redrawer(root, () => render(store.get()));
  store.subscribe((state) => state.planId, () => void regainSearch(store, shell));
  // Where list and figures share a column: the list while there is nothing to look at, then the best placement.
  store.subscribe(
    (state) => state.search.state,
    (now) => {
      document.body.dataset.column = now === 'done' || now === 'cancelled' ? 'figures' : 'list';
    },
  );
  store.subscribe(
    (state) => [
      state.search,
      state.chosen,
      state.chosenBand,
      state.units,
      state.faults.length,
      state.plan,
      state.pinned,
    ],
    ask,
  );

  /** @param {State} state */
  function render(state) {
    const { search } = state;
    if (search.state === 'none') return [opening(state)];
    return [
      search.state === 'running' ? running(state) : ended(state),
      ...(isStale(state) ? [stale(state)] : []),
      ...(listOf(state).length || ownOf(state).length
        ? [views(), placementRows(state, choice.view, choose)]
        : [empty(state)]),
    ].filter((node) => node !== null);
  }

  /** @param {string} id */
  function choose(id) {
    store.set({ chosen: id, shownRefusal: null });
    document.body.dataset.column = 'figures';
  }

  /** @param {string} word */
  function startButton(word) {
    return html('button', { class: 'go', type: 'button', 'data-key': 'start', onclick: begin }, word);
  }

  function begin() {
    choice.again = false;
    void startSearch(store, shell, choice.effort);
  }

  function efforts() {
    return html(
      'fieldset',
      { class: 'efforts' },
      html('legend', {}, 'How hard to look'),
      ...EFFORTS.map(([name, time]) =>
        html(
          'label',
          {},
          html('input', {
            type: 'radio',
            name: 'effort',
            value: name,
            checked: choice.effort === name,
            'data-key': `effort-${name}`,
            onchange: () => {
              choice.effort = name;
            },
          }),
          html('b', {}, name),
          html('span', { class: 'soft' }, time),
        ),
      ),
    );
  }

  /** @param {State} state */
  function opening(state) {
    const { faults } = state;
    return html(
      'div',
      { class: 'search-opening' },
      html('h2', {}, 'Placements'),
      html(
        'p',
        {},
        'Ways to hang the wire on this plot are laid out, held against its clearances, followed down to the station’s socket, and ranked.',
      ),
      efforts(),
      startButton('Find placements'),
      faults.length ? faultList(faults, 'Still to mend before a search can start:') : null,
    );
  }

  /**
   * The server's sentence speaks to whoever writes the file; an entry never drawn is said to whoever draws.
   * @param {{path: string, message: string}} fault
   */
  function drawn(fault) {
    return fault.path === 'entry' && !store.get().plan.entry
      ? 'The station entry is not drawn. Show where the feed line comes in.'
      : fault.message;
  }

  /**
   * @param {{path: string, message: string}[]} faults
   * @param {string} heading
   */
  function faultList(faults, heading) {
    return html(
      'div',
      { class: 'search-faults' },
      html('p', {}, stateMark('foul', 'Fault'), ' ', heading),
      html('ul', {}, ...faults.slice(0, 4).map((fault) => html('li', {}, drawn(fault)))),
      faults.length > 4 ? html('p', { class: 'soft' }, `and ${faults.length - 4} more.`) : null,
      html('button', { class: 'link', type: 'button', onclick: () => shell.go('survey') }, 'To the survey'),
    );
  }

  /** @param {State} state */
  function running(state) {
    const search = /** @type {any} */ (state.search);
    const done = Math.round(search.progress * 100);
    const rule = html(
      'div',
      {
        class: 'search-rule',
        role: 'progressbar',
        'aria-label': 'Search',
        'aria-valuemin': 0,
        'aria-valuemax': 100,
        'aria-valuenow': done,
      },
      html('span', {}),
    );
    /** @type {HTMLElement} */ (rule.firstElementChild).style.width = `${done}%`;
    return html(
      'div',
      { class: 'search-running' },
      rule,
      search.broken
        ? html('p', {}, 'The connection broke; listening again.')
        : html('p', {}, 'Trying ', html('b', {}, search.what || 'the first layouts')),
      html(
        'p',
        { class: 'soft line' },
        html('span', {}, `${count(search.considered)} considered, ${count(search.refused)} refused`),
        html(
          'button',
          { class: 'link', type: 'button', 'data-key': 'cancel', onclick: () => cancelSearch(store, shell) },
          'Cancel',
        ),
      ),
    );
  }

  /** @param {State} state */
  function ended(state) {
    const search = /** @type {any} */ (state.search);
    const found = listOf(state).length;
    if (search.state === 'failed') {
      return html(
        'div',
        { class: 'search-ended' },
        html(
          'p',
          { class: 'problem' },
          stateMark('foul', 'Failed'),
          ' ',
          html('b', {}, 'The search stopped. '),
          // The faults below say it already, each with the place to mend it.
          search.faults?.length ? '' : (search.error ?? ''),
        ),
        search.faults?.length ? faultList(search.faults, 'What the plan still lacks:') : null,
        efforts(),
        startButton('Search again'),
      );
    }
    const said =
      search.state === 'cancelled'
        ? 'cancelled'
        : `searched ${count(search.result.counts.considered)} in ${search.result.seconds < 10 ? number(Math.max(0.1, search.result.seconds), 1) : number(search.result.seconds, 0)} s`;
    return html(
      'div',
      { class: 'search-ended' },
      html(
        'p',
        { class: 'line' },
        html('b', { class: 'title' }, `${found} placement${found === 1 ? '' : 's'}`),
        html('span', { class: 'soft' }, said),
        html(
          'button',
          {
            type: 'button',
            class: 'link',
            'data-key': 'again',
            'aria-expanded': String(choice.again),
            onclick: () => {
              choice.again = !choice.again;
              ask();
            },
          },
          'again',
        ),
      ),
      choice.again ? html('div', { class: 'again' }, efforts(), startButton('Search again')) : null,
    );
  }

  /** @param {State} state */
  function stale(state) {
    void state;
    return html(
      'p',
      { class: 'stale' },
      stateMark('tight', 'Out of date'),
      ' The plan has changed since this search; these figures are of the plan as it was. ',
      html('button', { class: 'link', type: 'button', onclick: begin }, 'Search again'),
    );
  }

  /** @param {State} state */
  function empty(state) {
    if (state.search.state === 'running')
      return html(
        'p',
        { class: 'search-empty soft' },
        'The first placements appear here and on the plan as they are found.',
      );
    if (state.search.state !== 'done') return null;
    return html(
      'div',
      { class: 'search-empty' },
      html('p', {}, stateMark('foul', 'None'), html('b', {}, ' No placement is allowed on this plot as it stands.')),
      html('p', {}, 'The refusals below say why, and what would cure each where a change would.'),
      html(
        'p',
        {},
        'A support more, a mast zone, or more shapes in the ',
        html('button', { class: 'link', type: 'button', onclick: () => shell.go('brief') }, 'brief'),
        ' may open a way.',
      ),
    );
  }

  function views() {
    return html(
      'div',
      { class: 'tabs', role: 'group', 'aria-label': 'Order of the list' },
      ...ORDERS.map((view) =>
        html(
          'button',
          {
            type: 'button',
            class: 'tab',
            'aria-pressed': String(choice.view === view),
            'data-key': `view-${view}`,
            onclick: () => {
              choice.view = view;
              ask();
            },
          },
          view,
        ),
      ),
    );
  }
}
