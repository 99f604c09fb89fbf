// @ts-check
import { html } from '../charts/html.js';
import { number } from '../units/figures.js';
import { editBrief, faultsAt, kindSelect, numberBox, sentence } from './brief-fields.js';

/**
 * Rules with their defaults and sources, the design weather, and the exposure limits.
 * @typedef {import('../state/store.js').Store} Store
 * @typedef {import('../state/types.js').State} State
 */

/**
 * @param {State} state
 * @param {Store} store
 * @param {import('./brief-fields.js').Draft} draft
 * @param {{all: boolean}} shown
 * @returns {HTMLElement}
 */
export function rulesSection(state, store, draft, shown) {
  const rules = state.plan.brief?.rules ?? {};
  const overrides = rules.overrides ?? {};
  const setRules = (/** @type {string} */ label, /** @type {object} */ patch) =>
    editBrief(store, label, { rules: { ...rules, ...patch } });
  const kinds = state.catalogue?.rules ?? [];
  const mayChange = kinds.filter((/** @type {any} */ rule) => rule.least !== undefined && rule.least !== null);
  const fixed = kinds.filter((/** @type {any} */ rule) => !mayChange.includes(rule));
  const differing = Object.keys(overrides).length;
  return html(
    'section',
    { class: 'brief-rules' },
    html(
      'div',
      { class: 'line part-head' },
      html('h3', {}, 'Rules'),
      html(
        'span',
        { class: 'soft' },
        differing ? `${differing} differ${differing === 1 ? 's' : ''} from the default` : 'all at their default',
      ),
    ),
    html(
      'div',
      { class: 'fields two' },
      numberBox(draft, {
        key: 'wind',
        label: 'Design gust',
        unit: 'm/s',
        value: rules.wind ?? 25,
        least: 0,
        most: 90,
        take: (wind) => setRules(`Design gust ${wind} m/s`, { wind }),
      }),
      numberBox(draft, {
        key: 'ice',
        label: 'Ice round the wire',
        unit: 'mm',
        value: rules.ice ?? 0,
        least: 0,
        most: 60,
        take: (ice) => setRules(`Ice ${ice} mm`, { ice }),
      }),
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
          html('th', { scope: 'col' }, 'rule'),
          html('th', { scope: 'col', class: 'n' }, 'default'),
          html('th', { scope: 'col' }, 'yours'),
          html('th', { scope: 'col' }, html('span', { class: 'visually-hidden' }, 'reset')),
        ),
      ),
      html(
        'tbody',
        {},
        ...mayChange.map((/** @type {any} */ rule) =>
          ruleRow(rule, overrides, draft, state.faults, (next) =>
            setRules(`${rule.name}: ${overrides[rule.id] === undefined ? 'own figure' : 'change'}`, {
              overrides: next,
            }),
          ),
        ),
      ),
    ),
    html(
      'details',
      {
        open: shown.all,
        ontoggle: (/** @type {Event} */ event) => {
          shown.all = /** @type {HTMLDetailsElement} */ (event.target).open;
        },
      },
      html('summary', {}, `${fixed.length} more that are not for changing`),
      html(
        'dl',
        {},
        ...fixed.flatMap((/** @type {any} */ rule) => [
          html('dt', {}, rule.name),
          html(
            'dd',
            { class: 'soft' },
            `${number(rule.default, rule.default % 1 ? 2 : 0)} ${rule.unit}; ${rule.source}`,
          ),
        ]),
      ),
    ),
    html(
      'p',
      { class: 'soft' },
      'Local code and licensed practice decide. A smaller distance to an overhead line counts only where its owner has agreed in writing: give it at the line itself, in the survey.',
    ),
    ...faultsAt(state.faults, 'brief.rules').map((words) => sentence(null, words)),
  );
}

/**
 * @param {any} rule
 * @param {Record<string, number>} overrides
 * @param {import('./brief-fields.js').Draft} draft
 * @param {{path: string, message: string}[]} faults
 * @param {(overrides: Record<string, number>) => void} set
 */
function ruleRow(rule, overrides, draft, faults, set) {
  void faults;
  const own = overrides[rule.id];
  const differs = own !== undefined && own !== rule.default;
  const without = () => Object.fromEntries(Object.entries(overrides).filter(([id]) => id !== rule.id));
  return html(
    'tr',
    { class: differs ? 'differs' : null },
    html(
      'th',
      { scope: 'row' },
      differs ? html('span', { class: 'dot', role: 'img', 'aria-label': 'Differs from the default' }) : null,
      rule.name,
      html('span', { class: 'source soft', title: rule.source }, rule.source),
    ),
    html('td', { class: 'n' }, `${number(rule.default, decimals(rule.default))} ${rule.unit}`),
    html(
      'td',
      {},
      numberBox(draft, {
        key: `rule-${rule.id}`,
        label: rule.name,
        hideLabel: true,
        unit: rule.unit,
        value: own ?? null,
        least: rule.least,
        most: rule.most,
        may: true,
        placeholder: String(rule.default),
        take: (value) => set(value === null || value === rule.default ? without() : { ...overrides, [rule.id]: value }),
      }),
    ),
    html(
      'td',
      {},
      differs
        ? html(
            'button',
            {
              type: 'button',
              class: 'link',
              'data-key': `reset-${rule.id}`,
              'aria-label': `Reset ${rule.name}`,
              onclick: () => {
                draft.typed.delete(`rule-${rule.id}`);
                set(without());
              },
            },
            'reset',
          )
        : null,
    ),
  );
}

/** @param {number} value */
const decimals = (value) => Math.min(3, (String(value).split('.')[1] ?? '').length);

/**
 * @param {State} state
 * @param {Store} store
 * @returns {HTMLElement}
 */
export function exposureSection(state, store) {
  return html(
    'section',
    { class: 'brief-exposure' },
    html('h3', {}, 'Exposure limits'),
    kindSelect({
      key: 'exposure',
      label: 'Set of limits',
      value: state.plan.brief?.exposure,
      kinds: state.catalogue?.limits ?? [],
      choose: (exposure) => editBrief(store, 'Choose the exposure limits', { exposure }),
    }),
    html('p', { class: 'soft' }, 'RF exposure not computed. The set is kept with the plan.'),
    ...faultsAt(state.faults, 'brief.exposure').map((words) => sentence(null, words)),
  );
}
