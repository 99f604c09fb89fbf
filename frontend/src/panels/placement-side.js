// @ts-check
import { alongWire } from '../charts/along.js';
import { html } from '../charts/html.js';
import { FOOT, formatLength } from '../units/length.js';
import { sideView } from '../charts/side-view.js';
import { placementOf, planOf } from './placement-facts.js';

/**
 * Placements, at the foot of the plan: the side view along the wire.
 * @typedef {import('../state/types.js').State} State
 */

/**
 * @param {State} state
 * @param {any} placement
 * @param {{width: number, height: number, ppm: number}} size
 * @returns {SVGElement}
 */
export function sideViewNode(state, placement, size) {
  const plan = planOf(state);
  const length = (/** @type {number} */ metres) => formatLength(metres, state.units, 1);
  return sideView(alongWire(plan, placement), {
    ...size,
    length,
    unit: state.units === 'm' ? 1 : FOOT,
    title: 'Along the wire',
    notes: sagWords(state, placement),
    stateOf: (to) => stateUnder(plan, placement, to),
  });
}

/**
 * @param {State} state
 * @param {any} placement
 * @returns {string[]}
 */
export function sagWords(state, placement) {
  const out = Math.max(0, ...placement.spans.map((/** @type {any} */ span) => span.blowOut));
  const sag = Math.max(0, ...placement.spans.map((/** @type {any} */ span) => span.sagInWind));
  const calm = Math.max(0, ...placement.spans.map((/** @type {any} */ span) => span.sag));
  return [
    `${state.units === 'm' ? 'metres; ' : ''}sag ${formatLength(calm, state.units, 2)}`,
    `in the gust: out ${formatLength(out, state.units, 2)}, sag ${formatLength(sag, state.units, 2)}`,
  ];
}

/**
 * The state of the height over the ground or over a building of this name.
 * @param {any} plan
 * @param {any} placement
 * @param {string} to
 * @returns {string|null}
 */
function stateUnder(plan, placement, to) {
  const building = (plan.buildings ?? []).find((/** @type {any} */ one) => (one.name ?? one.id) === to);
  const id = building ? building.id : to;
  return (
    placement.clearances.find((/** @type {any} */ one) => one.to === id && (one.what ?? 'wire') === 'wire')?.state ??
    null
  );
}

/**
 * @param {HTMLElement} root
 * @param {import('../state/store.js').Store} store
 * @param {import('./placements-search.js').Shell} shell
 */
export function mountSideView(root, store, shell) {
  let ppm = 0;
  let asked = false;
  const draw = () => {
    asked = false;
    const state = store.get();
    const placement = placementOf(state);
    const size = { width: root.clientWidth, height: root.clientHeight, ppm };
    if (state.place !== 'placements' || size.width < 60) return;
    if (!placement) {
      root.replaceChildren(
        html('p', { class: 'side-none soft' }, 'The chosen wire is drawn here from the side, with what lies under it.'),
      );
      return;
    }
    const folded = size.height < 80;
    root.replaceChildren(folded ? foldedLine(root) : sideViewNode(state, placement, size));
  };
  const ask = () => {
    if (asked) return;
    asked = true;
    requestAnimationFrame(draw);
  };
  store.subscribe((state) => [state.search, state.chosen, state.units, state.place], ask);
  shell.planView?.onView?.((/** @type {any} */ view) => {
    ppm = view.ppm;
    ask();
  });
  new ResizeObserver(ask).observe(root);
}

/** @param {HTMLElement} root */
function foldedLine(root) {
  return html(
    'button',
    {
      type: 'button',
      class: 'side-fold',
      onclick: () => {
        root.dataset.open = '';
      },
    },
    'Along the wire: open the side view',
  );
}
