// @ts-check
import { html, redrawer } from '../charts/html.js';
import { stateMark } from '../charts/marks.js';
import { signed } from '../units/figures.js';
import { isStale, listOf, ownOf, placementOf, placementTitle, planOf, shapeTitle } from './placement-facts.js';
import { issuePart } from './sheet-issue.js';
import { sheetList } from './sheet-list.js';
import { heldAddress, issuedOf, issueSheet, sheetPart } from './sheet-source.js';

/**
 * Sheet: the rigging list and the drawing as they print, and the downloads.
 * @typedef {import('../state/store.js').Store} Store
 * @typedef {import('../state/types.js').State} State
 * @typedef {import('./placements-search.js').Shell} Shell
 * @typedef {import('./sheet-issue.js').Issued} Issued
 * @typedef {{key: string, model: any|null, drawing: string|null, issued: Issued[], error: string|null}} Loaded
 */

const FORMATS = /** @type {const} */ ([
  ['pdf', 'PDF, list and drawing'],
  ['csv', 'CSV, the list'],
  ['svg', 'SVG, the drawing'],
  ['geojson', 'GeoJSON, the site'],
  ['json', 'JSON, all of it'],
]);

/**
 * @param {HTMLElement} root empty element that this panel owns
 * @param {Store} store the page's one store
 * @param {Shell} shell
 */
export function mount(root, store, shell) {
  root.classList.add('sheet');
  const choice = { paper: 'A4' };
  /** @type {Loaded} */
  let loaded = nothing('');
  /** Whether a sheet is being issued, and what went wrong with that. @type {{busy: boolean, trouble: string|null}} */
  let issuing = { busy: false, trouble: null };
  /** What went wrong with a download. @type {string|null} */
  let trouble = null;
  const ask = redrawer(root, () => render(store.get()));
  store.subscribe(
    (state) => [state.place, state.chosen, state.search, state.units, state.plan, state.planId],
    () => {
      if (store.get().place !== 'sheet') return;
      void load();
      ask();
    },
  );

  /**
   * Fetches list and drawing for what is chosen, once for each choice; the latest wins.
   * @param {boolean} [again] what is shown may have changed; it stays in sight meanwhile
   */
  async function load(again = false) {
    const state = store.get();
    const placement = placementOf(state);
    if (!placement) return;
    const key = [
      state.planId,
      state.search.id,
      placement.id,
      choice.paper,
      state.units,
      placement.madeFrom ? JSON.stringify(placement.attachments) : '',
    ].join(' ');
    if (loaded.key === key && !again) return;
    const before = loaded;
    loaded = again ? { ...before, key } : nothing(key);
    issuing = { ...issuing, trouble: null };
    const options = { paper: choice.paper, units: state.units };
    try {
      const [list, drawing, issued] = await Promise.all([
        sheetPart(shell.api, state, placement, 'json', options),
        sheetPart(shell.api, state, placement, 'svg', options),
        issuedOf(shell.api, state.planId),
      ]);
      const model = JSON.parse(await list.text());
      if (loaded.key !== key) return;
      loaded = { key, model, drawing: URL.createObjectURL(drawing), issued, error: null };
    } catch (problem) {
      if (loaded.key !== key) return;
      loaded = { ...nothing(key), error: /** @type {Error} */ (problem).message };
    } finally {
      if (before.drawing) URL.revokeObjectURL(before.drawing);
    }
    ask();
  }

  /** Hands out the sheet that is shown: as the revision that is shown, or not at all. */
  async function issue() {
    const state = store.get();
    const placement = placementOf(state);
    if (!placement || !loaded.model) return;
    const { revision } = loaded.model.head;
    issuing = { busy: true, trouble: null };
    ask();
    let trouble = null;
    try {
      const planId = state.planId ?? (await shell.saveNow());
      const done = await issueSheet(shell.api, state, placement, planId, revision);
      shell.say(`Revision ${done.revision} is issued.`);
    } catch (problem) {
      trouble = /** @type {Error} */ (problem).message;
    }
    // Shown anew from the server also when it said no: another window may have been first.
    await load(true);
    issuing = { busy: false, trouble };
    ask();
  }

  /** @param {State} state */
  function render(state) {
    const placement = placementOf(state);
    if (!placement) return [none(state)];
    return [bar(state, placement), pages(state)];
  }

  /** @param {State} state */
  function none(state) {
    const searched = listOf(state).length > 0;
    return html(
      'div',
      { class: 'sheet-none' },
      html('h2', {}, 'Sheet'),
      html(
        'p',
        {},
        searched
          ? 'Choose a placement first; its rigging list and drawing stand here.'
          : 'The rigging list and the site drawing of a placement stand here once a search has found one.',
      ),
      html('button', { type: 'button', class: 'go', onclick: () => shell.go('placements') }, 'To placements'),
    );
  }

  /**
   * @param {State} state
   * @param {any} placement
   */
  function bar(state, placement) {
    const all = [...listOf(state), ...ownOf(state)];
    return html(
      'div',
      { class: 'sheet-bar' },
      html(
        'div',
        { class: 'field' },
        html('label', { for: 'sheet-placement' }, 'Placement'),
        html(
          'select',
          {
            id: 'sheet-placement',
            'data-key': 'placement',
            value: placement.id,
            onchange: (/** @type {Event} */ event) =>
              store.set({ chosen: /** @type {HTMLSelectElement} */ (event.target).value }),
          },
          ...all.map((one) =>
            html(
              'option',
              { value: one.id },
              `${placementTitle(state, one)}: ${shapeTitle(one.shape).toLowerCase()}, ${signed(one.score, 1)} dB`,
            ),
          ),
        ),
      ),
      html(
        'fieldset',
        { class: 'ticks' },
        html('legend', {}, 'Paper'),
        ...['A4', 'Letter'].map((paper) =>
          html(
            'label',
            { class: 'tick' },
            html('input', {
              type: 'radio',
              name: 'paper',
              checked: choice.paper === paper,
              'data-key': `paper-${paper}`,
              onchange: () => {
                choice.paper = paper;
                void load();
                ask();
              },
            }),
            paper,
          ),
        ),
      ),
      html(
        'p',
        { class: 'soft' },
        state.units === 'm'
          ? 'Lengths in metres; change them at the head of the page.'
          : 'Lengths in feet and inches; change them at the head of the page.',
      ),
      isStale(state)
        ? html(
            'p',
            {},
            stateMark('tight', 'Out of date'),
            ' The plan has changed since the search; this sheet is of the plan as it was searched.',
          )
        : null,
      html(
        'div',
        { class: 'downloads' },
        html('h2', {}, 'Download'),
        html('ul', {}, ...FORMATS.map(([type, words]) => html('li', {}, downloadLink(state, placement, type, words)))),
        trouble ? html('p', { class: 'problem', role: 'alert' }, stateMark('foul', 'Error'), ` ${trouble}`) : null,
      ),
      html(
        'button',
        { type: 'button', class: 'go', 'data-key': 'print', disabled: !loaded.model, onclick: () => window.print() },
        'Print',
      ),
      loaded.model ? issuePart(loaded.model.head, loaded.issued, { ...issuing, issue: () => void issue() }) : null,
    );
  }

  /**
   * @param {State} state
   * @param {any} placement
   * @param {typeof FORMATS[number][0]} type
   * @param {string} words
   */
  function downloadLink(state, placement, type, words) {
    const { latitude, longitude } = planOf(state).site ?? {};
    if (type === 'geojson' && (typeof latitude !== 'number' || typeof longitude !== 'number')) {
      return html(
        'span',
        { class: 'soft no-download' },
        `${words}: give the site its latitude and longitude in the survey first.`,
      );
    }
    const name = fileName(planOf(state), placement, type, loaded.model?.head.revision);
    const options = { paper: choice.paper, units: state.units };
    return html(
      'a',
      {
        href: heldAddress(shell.api, state, placement, type, options) ?? '#sheet',
        download: name,
        'data-key': `get-${type}`,
        onclick: (/** @type {Event} */ event) => {
          event.preventDefault();
          void save(state, placement, type, options, name);
        },
      },
      words,
      html('span', { class: 'soft' }, name),
    );
  }

  /**
   * Fetched first and saved then, so that it gets the plot's name, and a trouble is told in the place.
   * @param {State} state
   * @param {any} placement
   * @param {typeof FORMATS[number][0]} type
   * @param {{paper: string, units: string}} options
   * @param {string} name
   */
  async function save(state, placement, type, options, name) {
    trouble = null;
    try {
      const address = URL.createObjectURL(await sheetPart(shell.api, state, placement, type, options));
      html('a', { href: address, download: name }).click();
      setTimeout(() => URL.revokeObjectURL(address), 10000);
    } catch (problem) {
      trouble = `${name} could not be made. ${/** @type {Error} */ (problem).message}`;
    }
    ask();
  }

  /** @param {State} state */
  function pages(state) {
    if (loaded.error !== null) {
      return html(
        'div',
        { class: 'sheet-pages' },
        html(
          'p',
          { class: 'problem' },
          stateMark('foul', 'Error'),
          html('b', {}, ' The sheet could not be made. '),
          loaded.error,
          ' ',
          html(
            'button',
            {
              type: 'button',
              class: 'link',
              onclick: () => {
                loaded = nothing('');
                void load();
                ask();
              },
            },
            'Try again',
          ),
        ),
      );
    }
    if (!loaded.model)
      return html(
        'div',
        { class: 'sheet-pages' },
        html('p', { class: 'soft', role: 'status' }, 'Working out the sheet.'),
      );
    return html(
      'div',
      { class: `sheet-pages paper-${choice.paper.toLowerCase()}` },
      sheetList(loaded.model),
      loaded.drawing
        ? html(
            'div',
            { class: 'page drawing' },
            html('img', {
              src: loaded.drawing,
              alt: `Site drawing to scale: ${loaded.model.head.name}; the list before it says the same in figures`,
            }),
          )
        : null,
    );
  }
}

/** @param {string} key @returns {Loaded} nothing yet for that choice */
function nothing(key) {
  return { key, model: null, drawing: null, issued: [], error: null };
}

/**
 * @param {any} plan
 * @param {any} placement
 * @param {string} type
 * @param {string} [revision] from B on the name carries it, so that no file is written over
 * @returns {string} "corner-lot-p01.pdf"
 */
export function fileName(plan, placement, type, revision = 'A') {
  const title =
    (plan.title ?? '')
      .normalize('NFKD')
      .replace(/[\u0300-\u036f]/g, '')
      .replace(/['’]/g, '')
      .toLowerCase()
      .replace(/[^a-z0-9]+/g, '-')
      .replace(/^-|-$/g, '')
      .slice(0, 48)
      .replace(/-$/, '') || 'plot';
  return `${title}-${placement.id}${revision === 'A' ? '' : `-${revision}`}.${type}`;
}
