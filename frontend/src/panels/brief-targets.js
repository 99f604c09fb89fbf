// @ts-check
import { FARTHEST_KM, greatCircle } from '../charts/compass.js';
import { bearing as bearingText } from '../charts/figures.js';
import { html } from '../charts/html.js';
import { number, parseNumber } from '../units/figures.js';
import { bandName } from './brief-bands.js';
import { compassNode } from './brief-compass.js';
import { editBrief, editEntry, faultsAt, numberBox, sentence, textBox, weightBar } from './brief-fields.js';

/**
 * Targets: who is to be reached, on a great-circle compass and as rows.
 * @typedef {import('../state/store.js').Store} Store
 * @typedef {import('../state/types.js').State} State
 */

/**
 * @param {State} state
 * @param {Store} store
 * @param {import('./brief-fields.js').Draft} draft
 * @param {import('./brief-bands.js').Chosen} chosen
 * @returns {HTMLElement}
 */
export function targetsSection(state, store, draft, chosen) {
  const targets = state.plan.brief?.targets ?? [];
  const open = chosen.target !== null && targets[chosen.target] ? chosen.target : null;
  const toggle = (/** @type {number} */ index) => {
    chosen.target = open === index ? null : index;
    draft.ask();
  };
  return html(
    'section',
    { class: 'brief-targets' },
    html(
      'div',
      { class: 'line part-head' },
      html('h3', {}, 'Targets'),
      html('span', { class: 'soft' }, 'drag one to turn it; rings in thousands of km'),
    ),
    compassNode(targets, store),
    html(
      'ol',
      { class: 'targets' },
      ...targets.map((/** @type {any} */ target, /** @type {number} */ index) =>
        html(
          'li',
          {},
          targetRow(target, index, targets, open === index, toggle),
          open === index ? targetEditor(state, store, draft, chosen, index) : null,
          ...faultsAt(state.faults, `brief.targets[${index}]`).map((words) => sentence(null, words)),
        ),
      ),
    ),
    targets.length ? null : html('p', { class: 'soft' }, 'No target yet: say who is to be reached.'),
    ...state.faults.filter(({ path }) => path === 'brief.targets').map(({ message }) => sentence(null, message)),
    html(
      'p',
      { class: 'line start' },
      html(
        'button',
        {
          type: 'button',
          class: 'link',
          'data-key': 'add-far',
          onclick: () => addTarget(store, chosen, targets, { bearing: 0, distanceKm: 3000 }),
        },
        'Add a far target',
      ),
      html(
        'button',
        {
          type: 'button',
          class: 'link',
          'data-key': 'add-near',
          onclick: () => addTarget(store, chosen, targets, { nearVerticalKm: 300 }),
        },
        'Add near-vertical cover',
      ),
    ),
  );
}

/**
 * @param {Store} store
 * @param {import('./brief-bands.js').Chosen} chosen
 * @param {any[]} targets
 * @param {object} aim
 */
function addTarget(store, chosen, targets, aim) {
  const stem = 'nearVerticalKm' in aim ? 'Near' : 'Far';
  let count = 1;
  while (targets.some((target) => target.name === `${stem} ${count}`)) count += 1;
  chosen.target = targets.length;
  editBrief(store, `Add target ${stem} ${count}`, {
    targets: [...targets, { name: `${stem} ${count}`, ...aim, weight: 1 }],
  });
}

/**
 * @param {any} target
 * @param {number} index
 * @param {any[]} targets
 * @param {boolean} open
 * @param {(index: number) => void} toggle
 */
function targetRow(target, index, targets, open, toggle) {
  const most = Math.max(1, ...targets.map((one) => one.weight ?? 1));
  const near = target.nearVerticalKm !== undefined;
  const where = near
    ? `near-vertical, ${number(target.nearVerticalKm, 0)} km round`
    : `${bearingText(target.bearing ?? 0)}  ${number(target.distanceKm ?? 0, 0)} km${(target.distanceKm ?? 0) > 20000 ? ', the long way' : ''}`;
  const bar = html('span', { class: 'chip-bar' });
  bar.style.width = `${((target.weight ?? 1) / most) * 100}%`;
  return html(
    'button',
    {
      type: 'button',
      class: 'target-row',
      'aria-expanded': String(open),
      'data-key': `target-${index}`,
      onclick: () => toggle(index),
    },
    html('b', {}, target.name ?? 'Target'),
    html('span', {}, where),
    html('span', { class: 'soft' }, target.bands?.length ? target.bands.join(', ') : 'every band'),
    html('span', { class: 'chip-track', title: `weight ${target.weight ?? 1}` }, bar),
  );
}

/**
 * @param {State} state
 * @param {Store} store
 * @param {import('./brief-fields.js').Draft} draft
 * @param {import('./brief-bands.js').Chosen} chosen
 * @param {number} index
 */
function targetEditor(state, store, draft, chosen, index) {
  const target = state.plan.brief.targets[index];
  const name = target.name ?? 'target';
  const set = (/** @type {string} */ label, /** @type {object} */ patch, /** @type {string} */ group = '') =>
    editEntry(store, label, 'targets', index, patch, group || undefined);
  const near = target.nearVerticalKm !== undefined;
  const boxes = near
    ? [
        numberBox(draft, {
          key: `target-${index}-near`,
          label: 'Radius',
          unit: 'km',
          value: target.nearVerticalKm,
          least: 1,
          most: 2000,
          take: (km) => set(`Radius of ${name}`, { nearVerticalKm: km }),
        }),
      ]
    : [
        numberBox(draft, {
          key: `target-${index}-bearing`,
          label: 'Bearing, true',
          unit: '°',
          value: target.bearing,
          least: 0,
          most: 360,
          take: (degrees) => set(`Bearing of ${name}`, { bearing: degrees }),
        }),
        numberBox(draft, {
          key: `target-${index}-distance`,
          label: 'Distance',
          unit: 'km',
          value: target.distanceKm,
          least: 1,
          most: FARTHEST_KM,
          take: (km) => set(`Distance of ${name}`, { distanceKm: km }),
        }),
      ];
  return html(
    'div',
    { class: 'editor' },
    html(
      'div',
      { class: near ? 'fields two' : 'fields three' },
      textBox(draft, {
        key: `target-${index}-name`,
        label: 'Name',
        value: target.name ?? '',
        take: (text) => {
          if (text.trim() === '') return 'A target needs a name.';
          if (text.trim() !== target.name) set(`Call the target ${text.trim()}`, { name: text.trim() });
          return null;
        },
      }),
      ...boxes,
    ),
    near ? null : placeBox(state, draft, index, (aim) => set(`Aim ${name} at a place`, aim)),
    weightBar(store, {
      key: `target-${index}-weight`,
      label: `Weight of ${name}`,
      value: target.weight ?? 1,
      set: (weight) => set(`Weigh ${name}`, { weight }, `target-weight-${index}`),
    }),
    bandTicks(state, target, index, set),
    html(
      'p',
      { class: 'line' },
      html(
        'button',
        {
          type: 'button',
          class: 'link',
          'data-key': `target-${index}-kind`,
          onclick: () =>
            set(
              near ? `Make ${name} a far target` : `Make ${name} near-vertical`,
              near
                ? { nearVerticalKm: undefined, bearing: 0, distanceKm: 3000 }
                : { nearVerticalKm: 300, bearing: undefined, distanceKm: undefined },
            ),
        },
        near ? 'Make it a far target' : 'Make it near-vertical',
      ),
      html(
        'button',
        {
          type: 'button',
          class: 'link',
          'data-key': `target-${index}-remove`,
          onclick: () => {
            chosen.target = null;
            editBrief(store, `Take ${name} out`, {
              targets: state.plan.brief.targets.filter((/** @type {any} */ _, /** @type {number} */ k) => k !== index),
            });
          },
        },
        'Take it out',
      ),
    ),
  );
}

/**
 * Bearing and distance from a place's coordinates, when the site has its own.
 * @param {State} state
 * @param {import('./brief-fields.js').Draft} draft
 * @param {number} index
 * @param {(aim: {bearing: number, distanceKm: number}) => void} take
 */
function placeBox(state, draft, index, take) {
  const { latitude, longitude } = state.plan.site ?? {};
  if (typeof latitude !== 'number' || typeof longitude !== 'number') {
    return html(
      'p',
      { class: 'soft' },
      'Give the site its latitude and longitude in the survey, and a target can be given by a place’s coordinates.',
    );
  }
  return textBox(draft, {
    key: `target-${index}-place`,
    label: 'or a place: latitude, longitude',
    unit: '°',
    value: '',
    placeholder: '48.2, 16.4',
    take: (text) => {
      if (text.trim() === '') return null;
      const place = parsePlace(text);
      if (typeof place === 'string') return place;
      const aim = greatCircle([latitude, longitude], place);
      if (aim.distanceKm < 1) return 'That is the site itself.';
      take({ bearing: (Math.round(aim.bearing * 10) / 10) % 360, distanceKm: Math.round(aim.distanceKm) });
      return null;
    },
  });
}

/**
 * @param {string} text "48.2, 16.4" or "33.9 S 151.2 E"
 * @returns {[number, number]|string} degrees north and east, or a sentence
 */
export function parsePlace(text) {
  const parts =
    text
      .toUpperCase()
      .replace(/°/g, ' ')
      .match(/[+\-−]?\d+(?:\.\d+)?\s*[NSEW]?/g) ?? [];
  const value = (/** @type {string} */ part) =>
    (parseNumber(part.replace(/[NSEW]/, '').trim()) ?? NaN) * (/[SW]/.test(part) ? -1 : 1);
  const [latitude, longitude] = parts.map(value);
  if (parts.length !== 2 || Number.isNaN(latitude) || Number.isNaN(longitude))
    return 'Type two figures: degrees north, then degrees east, such as 48.2, 16.4 or 33.9 S 151.2 E.';
  if (Math.abs(latitude) > 90 || Math.abs(longitude) > 180) return 'Latitude goes to 90° and longitude to 180°.';
  return [latitude, longitude];
}

/**
 * @param {State} state
 * @param {any} target
 * @param {number} index
 * @param {(label: string, patch: object) => void} set
 */
function bandTicks(state, target, index, set) {
  const all = (state.plan.brief.bands ?? []).map(bandName);
  const on = new Set(target.bands?.length ? target.bands : all);
  return html(
    'fieldset',
    { class: 'ticks' },
    html('legend', {}, 'counts on'),
    ...all.map((/** @type {string} */ band) =>
      html(
        'label',
        { class: 'tick' },
        html('input', {
          type: 'checkbox',
          checked: on.has(band),
          'data-key': `target-${index}-on-${band}`,
          disabled: on.has(band) && on.size === 1,
          onchange: () => {
            const next = all.filter((/** @type {string} */ one) => (one === band ? !on.has(band) : on.has(one)));
            set(`Bands of ${target.name ?? 'target'}`, { bands: next.length === all.length ? [] : next });
          },
        }),
        band,
      ),
    ),
  );
}
