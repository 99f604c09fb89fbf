// @ts-check
import { html, redrawer } from '../charts/html.js';
import { bandsSection } from './brief-bands.js';
import { meansSection, powerSection, shapesSection } from './brief-means.js';
import { exposureSection, rulesSection } from './brief-rules.js';
import { targetsSection } from './brief-targets.js';

/**
 * Brief: what the station must do and with what, edited in the plan.
 * @param {HTMLElement} root empty element that this panel owns
 * @param {import('../state/store.js').Store} store the page's one store
 * @param {import('./placements-search.js').Shell} shell
 */
export function mount(root, store, shell) {
  root.classList.add('brief');
  /** @type {import('./brief-bands.js').Chosen} */
  const chosen = { region: null, band: null, target: null };
  const shown = { all: false };
  /** @type {import('./brief-fields.js').Draft} */
  const draft = { typed: new Map(), ask: () => ask() };
  const ask = redrawer(root, () => {
    const state = store.get();
    if (state.place !== 'brief') return [];
    return [
      html('h2', {}, 'What the station must do'),
      bandsSection(state, store, draft, chosen),
      targetsSection(state, store, draft, chosen),
      powerSection(state, store, draft),
      html('h2', {}, 'With what'),
      meansSection(state, store, draft),
      shapesSection(state, store, draft),
      html('h2', {}, 'Within which rules'),
      rulesSection(state, store, draft, shown),
      exposureSection(state, store),
      next(state, shell),
    ];
  });
  store.subscribe(
    (state) => state.planId,
    () => {
      chosen.band = null;
      chosen.target = null;
      draft.typed.clear();
    },
  );
  store.subscribe(
    (state) => [state.plan.brief, state.plan.site, state.catalogue, state.faults, state.units, state.place],
    ask,
  );
}

/**
 * @param {import('../state/types.js').State} state
 * @param {import('./placements-search.js').Shell} shell
 */
function next(state, shell) {
  const here = state.faults.filter(({ path }) => path.startsWith('brief')).length;
  const elsewhere = state.faults.length - here;
  return html(
    'p',
    { class: 'brief-next' },
    html(
      'button',
      { type: 'button', class: 'go', 'data-key': 'next', onclick: () => shell.go('placements') },
      'On to placements',
    ),
    state.faults.length
      ? html(
          'span',
          { class: 'soft' },
          [here ? `${here} to mend here` : '', elsewhere ? `${elsewhere} in the survey` : '']
            .filter((text) => text)
            .join(', '),
        )
      : null,
  );
}
