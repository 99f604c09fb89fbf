// @ts-check
import { html, redrawer } from '../charts/html.js';
import { count } from '../charts/figures.js';
import { stateMark } from '../charts/marks.js';
import { laidAlong } from '../draw/placement/holding.js';
import { planOf, nameOf, ownOf, shapeTitle } from './placement-facts.js';

/**
 * Refusals: why layouts are not allowed, and what would cure each.
 * @typedef {import('../state/store.js').Store} Store
 * @typedef {import('../state/types.js').State} State
 * @typedef {import('./placements-search.js').Shell} Shell
 */

const SHOWN_AT_FIRST = 3;

/**
 * @param {HTMLElement} root empty element that this panel owns
 * @param {Store} store the page's one store
 * @param {Shell} shell
 */
export function mount(root, store, shell) {
  root.classList.add('refusals');
  const open = { all: false, busy: /** @type {any} */ (null), error: /** @type {string|null} */ (null) };
  const ask = redrawer(root, () => render(store.get()));
  store.subscribe((state) => [state.search.result, state.shownRefusal, state.units], ask);

  /** @param {State} state */
  function render(state) {
    const result = state.search.result;
    if (!result) return [];
    const { counts } = result;
    const refusals = [...result.refusals].sort((a, b) => (a.miss ?? 4) - (b.miss ?? 4) || cureRank(a) - cureRank(b));
    if (!refusals.length)
      return [
        html('p', { class: 'soft' }, counts.refused ? `${count(counts.refused)} refused.` : 'Nothing was refused.'),
      ];
    const shown = open.all || result.placements.length === 0 ? refusals : refusals.slice(0, SHOWN_AT_FIRST);
    return [
      html(
        'div',
        { class: 'line part-head' },
        html('h2', {}, `${count(counts.refused)} refused`),
        refusals.length > SHOWN_AT_FIRST
          ? html(
              'button',
              {
                type: 'button',
                class: 'link',
                'data-key': 'all',
                'aria-expanded': String(open.all),
                onclick: () => {
                  open.all = !open.all;
                  store.set({ search: { ...store.get().search, ghosts: open.all } });
                  ask();
                },
              },
              open.all ? 'only the nearest' : `the nearest ${refusals.length}, and their ghosts`,
            )
          : null,
      ),
      html(
        'ul',
        {},
        ...shown.map((/** @type {any} */ refusal, /** @type {number} */ index) => item(state, refusal, index)),
      ),
    ];
  }

  /**
   * @param {State} state
   * @param {any} refusal
   * @param {number} index
   */
  function item(state, refusal, index) {
    const chosen = state.shownRefusal === refusal;
    const plan = planOf(state);
    const names = refusal.attachments.map((/** @type {string} */ id) => nameOf(plan, id)).join(' to ');
    return html(
      'li',
      { class: chosen ? 'shown' : null },
      html(
        'button',
        {
          type: 'button',
          class: 'plain',
          'data-key': `refusal-${index}`,
          'aria-pressed': String(chosen),
          onclick: () => store.set({ shownRefusal: chosen ? null : refusal }),
        },
        stateMark('foul', 'Refused'),
        ' ',
        html('b', {}, `${shapeTitle(refusal.shape)}, ${names}. `),
        refusal.reason,
      ),
      refusal.miss && refusal.lacks?.length > 1
        ? html('p', {}, html('b', {}, `Near miss ${refusal.miss}, also: `), refusal.lacks.slice(1).join(' '))
        : null,
      html(
        'p',
        {},
        html('b', {}, 'Cure: '),
        refusal.cure,
        ' ',
        refusal.after || refusal.cured?.length
          ? html(
              'button',
              {
                type: 'button',
                class: 'link',
                'data-key': `cure-${index}`,
                disabled: open.busy === refusal,
                onclick: () => takeCure(refusal),
              },
              open.busy === refusal ? 'working it out' : cureRank(refusal) === 0 ? 'Take it' : 'See it',
            )
          : null,
      ),
      open.error !== null && chosen
        ? html('p', { class: 'problem' }, stateMark('foul', 'Error'), ` ${open.error}`)
        : null,
    );
  }

  /**
   * Assesses the cured layout and shows it as a placement of its own.
   * @param {any} refusal
   */
  async function takeCure(refusal) {
    const state = store.get();
    open.busy = refusal;
    open.error = null;
    ask();
    try {
      const placement = await shell.api.assess(planOf(state), curedLayout(planOf(state), state.catalogue, refusal));
      addOwn(store, { ...placement, id: freeId('cured', ownOf(store.get())), rank: 0, madeFrom: 'Cured' });
      shell.say('The cured placement is worked out and chosen.');
    } catch (problem) {
      open.error = /** @type {Error} */ (problem).message;
      store.set({ shownRefusal: refusal });
    }
    open.busy = null;
    ask();
  }
}

/**
 * What can be cured is of more use than what cannot; a cure that leaves other refusals stands between.
 * @param {any} refusal
 * @returns {number} the lesser first
 */
export function cureRank(refusal) {
  if (!refusal.after && !refusal.cured?.length) return 2;
  return /\bremains?\b/.test(refusal.cure) ? 1 : 0;
}

/**
 * What `assess` reads: the placement after the cure, or the refused wire laid along the cured attachments.
 * @param {any} plan
 * @param {any} catalogue
 * @param {any} refusal
 */
export function curedLayout(plan, catalogue, refusal) {
  if (refusal.after) return refusal.after;
  const wire = plan.brief?.wire ?? catalogue?.wires?.find((/** @type {any} */ one) => one.default)?.id;
  const line = plan.brief?.line ?? catalogue?.lines?.find((/** @type {any} */ one) => one.default)?.id;
  const [drawn] = refusal.wire;
  const length = (drawn ?? [])
    .slice(1)
    .reduce(
      (/** @type {number} */ sum, /** @type {number[]} */ point, /** @type {number} */ index) =>
        sum + Math.hypot(...[0, 1, 2].map((k) => point[k] - drawn[index][k])),
      0,
    );
  const { points, fraction } = laidAlong(
    refusal.cured.map((/** @type {any} */ hold) => hold.at),
    length || Infinity,
  );
  return {
    shape: refusal.shape,
    attachments: refusal.cured,
    conductors: [{ points, wire }],
    feed: { conductor: 0, fraction, line },
  };
}

/**
 * An id that none of them has, also when one before was dropped.
 * @param {string} word
 * @param {{id: string}[]} own
 */
export function freeId(word, own) {
  const taken = new Set(own.map((one) => one.id));
  let n = own.length + 1;
  while (taken.has(`${word}-${n}`)) n += 1;
  return `${word}-${n}`;
}

/**
 * Adds a placement made by hand or by a cure, and chooses it.
 * @param {Store} store
 * @param {any} placement
 */
export function addOwn(store, placement) {
  const { search } = store.get();
  const own = [placement, ...ownOf(store.get()).filter((one) => one.id !== placement.id)];
  store.set({ search: /** @type {any} */ ({ ...search, own }), chosen: placement.id, shownRefusal: null });
}
