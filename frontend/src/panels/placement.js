// @ts-check
import { html, redrawer } from '../charts/html.js';
import { number } from '../units/figures.js';
import { launchProfile } from '../charts/launch-profile.js';
import { distanceFigure, lengthWithUnit } from '../units/length.js';
import { stateMark } from '../charts/marks.js';
import { clearancesTable, pullsTable } from './placement-checks.js';
import { comparison } from './placement-compare.js';
import {
  bandsOf,
  concerns,
  distanceWords,
  doubtsOf,
  hangsOn,
  isStale,
  listOf,
  ownOf,
  placementOf,
  placementTitle,
  planOf,
  scoreWords,
  wireLength,
} from './placement-facts.js';
import { feedFacts, gainTable, remarks, scoreTable } from './placement-gain.js';
import { headLine } from './placement-head.js';
import { mountSideView, sagWords, sideViewNode } from './placement-side.js';

/**
 * Placements, right: the figures of the chosen placement; and the side view under the plan.
 * @typedef {import('../state/store.js').Store} Store
 * @typedef {import('../state/types.js').State} State
 * @typedef {import('./placements-search.js').Shell} Shell
 */

const PROFILE_HEIGHT = 210;
const NARROW = '(max-width: 599px)';

/**
 * The band whose rose and profile are shown.
 * @param {State} state
 * @param {any} placement
 * @returns {string|null}
 */
export function shownBand(state, placement) {
  const names = bandsOf(placement).map((band) => band.name);
  if (state.chosenBand !== null && names.includes(state.chosenBand)) return state.chosenBand;
  const heaviest = [...(planOf(state).brief?.bands ?? [])]
    .filter(
      (band) =>
        names.includes(band.name) &&
        bandsOf(placement)
          .find((one) => one.name === band.name)
          ?.middle.targets.some((/** @type {any} */ target) => target.bearing !== undefined && target.bearing !== null),
    )
    .sort((a, b) => (b.weight ?? 1) - (a.weight ?? 1))[0];
  return heaviest?.name ?? names[0] ?? null;
}

/**
 * @param {HTMLElement} root empty element that this panel owns
 * @param {Store} store the page's one store
 * @param {Shell} shell
 */
export function mount(root, store, shell) {
  root.classList.add('placement');
  const narrow = window.matchMedia(NARROW);
  const ask = redrawer(root, () => render(store.get()));
  store.subscribe(
    (state) => [state.search, state.chosen, state.chosenBand, state.units, state.pinned, state.plan, state.place],
    ask,
  );
  new ResizeObserver(ask).observe(root);
  narrow.addEventListener('change', ask);
  const sideRoot = shell.sideView ?? document.getElementById('side-view');
  if (sideRoot) mountSideView(sideRoot, store, shell);

  /** @param {State} state */
  function render(state) {
    const placement = placementOf(state);
    if (!placement) return [unchosen(state)];
    const plan = planOf(state);
    const band = shownBand(state, placement);
    /** @type {import('./placement-facts.js').Length} */
    const length = (metres, sense) => distanceFigure(metres, state.units, sense);
    const rank = listOf(state).indexOf(placement);
    return [
      headLine(state, placement, rank, store),
      head(state, plan, placement),
      ...(narrow.matches
        ? [
            html(
              'div',
              { class: 'inline-side' },
              sideViewNode(state, placement, { width: Math.max(300, root.clientWidth), height: 180, ppm: 0 }),
              html('p', { class: 'soft' }, `Along the wire, ${sagWords(state, placement).join('; ')}`),
            ),
          ]
        : []),
      ...(state.pinned !== null && state.pinned !== placement.id ? [comparison(state, placement, store)] : []),
      profile(state, plan, placement, band),
      gainTable(placement, band, (name) => store.set({ chosenBand: name })),
      pullsTable(plan, placement),
      clearancesTable(plan, placement, state.catalogue, length, state.units),
      feedFacts(state, placement),
      scoreTable(placement),
      remarks(placement),
    ].filter((node) => node !== null);
  }

  /** @param {State} state */
  function unchosen(state) {
    const words =
      state.search.state === 'none'
        ? 'The figures of a placement stand here once a search has found one.'
        : state.search.state === 'running'
          ? 'Choose one of the list while the search runs, or wait: the best is chosen when it ends.'
          : state.search.state === 'failed'
            ? 'The search stopped; what went wrong stands beside the plan.'
            : ownOf(state).length + listOf(state).length
              ? 'Choose a placement in the list.'
              : 'No placement to show. The refusals say what stands in the way.';
    return html('p', { class: 'placement-none soft' }, words);
  }

  /**
   * @param {State} state
   * @param {any} plan
   * @param {any} placement
   */
  function head(state, plan, placement) {
    const list = concerns(plan, placement, (metres, sense) => distanceWords(metres, state.units, sense));
    const pinned = state.pinned === placement.id;
    return html(
      'section',
      { class: 'placement-head' },
      html(
        'p',
        { class: 'soft line' },
        html(
          'span',
          {},
          `${placementTitle(state, placement)}, ${placement.shape}, ${lengthWithUnit(wireLength(placement), state.units, 1)} of wire`,
        ),
        isStale(state) ? html('span', { class: 'tight' }, stateMark('tight'), ' plan changed since') : null,
      ),
      html('h2', {}, scoreWords(placement.score)),
      ...doubtsOf(placement).map((words) =>
        html('p', { class: 'consent' }, stateMark('tight', 'Doubtful'), ` The radio figures are not to be relied on. ${words}`),
      ),
      html(
        'ul',
        { class: 'concerns' },
        ...list
          .slice(0, 4)
          .map((one) =>
            html('li', {}, stateMark(one.state), ' ', html('b', { class: one.state }, one.state), ` ${one.words}`),
          ),
      ),
      list.length > 4 ? html('p', { class: 'soft' }, `and ${list.length - 4} more under Pulls and Clearances`) : null,
      html('p', { class: 'soft hangs' }, hangsOn(plan, placement).join(' – ')),
      ...consents(state, placement).map((words) =>
        html('p', { class: 'consent' }, stateMark('tight', 'Consent'), ` ${words}`),
      ),
      html(
        'p',
        { class: 'actions' },
        html(
          'button',
          {
            type: 'button',
            class: 'link',
            'data-key': 'pin',
            'aria-pressed': String(pinned),
            onclick: () => store.set({ pinned: pinned ? null : placement.id }),
          },
          pinned ? 'Unpin' : 'Pin to compare',
        ),
        placement.madeFrom
          ? html(
              'button',
              { type: 'button', class: 'link', 'data-key': 'back', onclick: () => putBack(placement) },
              placement.from ? 'Put it back' : 'Drop it',
            )
          : null,
        html(
          'button',
          { type: 'button', class: 'link', 'data-key': 'sheet', onclick: () => shell.go('sheet') },
          'Open its sheet',
        ),
        html('span', { class: 'soft' }, 'drag any end on the plan'),
      ),
    );
  }

  /**
   * Forgets a placement made by hand and shows the one it came from.
   * @param {any} placement
   */
  function putBack(placement) {
    const state = store.get();
    const own = ownOf(state).filter((one) => one.id !== placement.id);
    store.set({
      search: { ...state.search, own },
      chosen: placement.from ?? listOf(state)[0]?.id ?? null,
      pinned: state.pinned === placement.id ? null : state.pinned,
    });
  }

  /**
   * @param {State} state
   * @param {any} plan
   * @param {any} placement
   * @param {string|null} band
   */
  function profile(state, plan, placement, band) {
    const bands = bandsOf(placement);
    const shown = bands.find((one) => one.name === band)?.middle;
    const reference =
      state.search.result?.reference?.bands?.find((/** @type {any} */ one) => one.name === band)?.gains ?? [];
    const targets = shown?.targets ?? [];
    const lead = leadTarget(plan, targets);
    const profiles = (shown?.profiles ?? []).filter(
      (/** @type {any} */ one) =>
        one.name !== 'peak' || !targets.some((/** @type {any} */ target) => target.bearing !== undefined),
    );
    const width = Math.min(560, Math.max(300, root.clientWidth - 32));
    return html(
      'section',
      { class: 'profile' },
      html(
        'div',
        { class: 'line part-head' },
        html('h3', {}, 'Launch profile'),
        html('span', { class: 'soft' }, 'dBi, before line loss'),
      ),
      html(
        'div',
        { class: 'tabs band-tabs', role: 'group', 'aria-label': 'Band shown' },
        ...bands.map((one) =>
          html(
            'button',
            {
              type: 'button',
              class: 'tab',
              'aria-pressed': String(one.name === band),
              'data-key': `band-${one.name}`,
              onclick: () => store.set({ chosenBand: one.name }),
            },
            one.name,
          ),
        ),
      ),
      shown?.rose
        ? html(
            'p',
            { class: 'soft' },
            `The reach rose on the plan is for ${number(shown.rose.elevation, 0)}° up; it betters the reference over ${number(shown.rose.betterShare * 100, 0)} % of azimuths.`,
          )
        : null,
      profiles.length
        ? launchProfile(
            {
              profiles: profiles.map((/** @type {any} */ one) => ({
                ...one,
                name: one.name === 'peak' ? 'strongest direction' : one.name,
              })),
              windows: targets.map((/** @type {any} */ target) => ({
                name: target.name,
                from: target.window[0],
                to: target.window[1],
              })),
              reference,
              lead: lead ?? profiles[0].name,
            },
            { width, height: PROFILE_HEIGHT + 12 * targets.length },
          )
        : html('p', { class: 'soft' }, 'The launch profile comes with the full result.'),
    );
  }
}

/**
 * What the new masts need, a sentence for each kind of consent.
 * @param {State} state
 * @param {any} placement
 * @returns {string[]}
 */
function consents(state, placement) {
  /** @type {Map<string, string[]>} */
  const byNeed = new Map();
  for (const mast of placement.masts) {
    if (!mast.consent || mast.consent === 'none') continue;
    byNeed.set(mast.consent, [...(byNeed.get(mast.consent) ?? []), lengthWithUnit(mast.height, state.units, 1)]);
  }
  return [...byNeed].map(([need, heights]) =>
    heights.length === 1
      ? `The new ${heights[0]} mast needs: ${need}.`
      : `The new masts of ${heights.join(' and ')} each need: ${need}.`,
  );
}

/**
 * The target that weighs most of those with a bearing.
 * @param {any} plan
 * @param {any[]} targets
 * @returns {string|null}
 */
function leadTarget(plan, targets) {
  const weight = (/** @type {string} */ name) =>
    (plan.brief?.targets ?? []).find((/** @type {any} */ one) => one.name === name)?.weight ?? 1;
  return (
    [...targets]
      .filter((target) => target.bearing !== undefined && target.bearing !== null)
      .sort((a, b) => weight(b.name) - weight(a.name))[0]?.name ?? null
  );
}
