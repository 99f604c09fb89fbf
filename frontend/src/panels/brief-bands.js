// @ts-check
import { html } from '../charts/html.js';
import { parseNumber } from '../units/figures.js';
import { editBrief, editEntry, faultsAt, sentence, textBox, weightBar } from './brief-fields.js';

/**
 * Bands: outlined words whose bar is their weight; the chosen one opens under the row of words.
 * @typedef {import('../state/store.js').Store} Store
 * @typedef {{region: string|null, band: number|null, target: number|null}} Chosen
 */

/** @param {any} band @returns {string} */
export const bandName = (band) => band.name ?? `${band.frequencies?.[0] ?? '?'} MHz`;

/**
 * @param {import('../state/types.js').State} state
 * @param {Store} store
 * @param {import('./brief-fields.js').Draft} draft
 * @param {Chosen} chosen
 * @returns {HTMLElement}
 */
export function bandsSection(state, store, draft, chosen) {
  const bands = state.plan.brief?.bands ?? [];
  const most = Math.max(1, ...bands.map((/** @type {any} */ band) => band.weight ?? 1));
  const open = chosen.band !== null && bands[chosen.band] ? chosen.band : null;
  return html(
    'section',
    { class: 'brief-bands' },
    html('h3', {}, 'Bands'),
    html(
      'div',
      { class: 'chips', role: 'group', 'aria-label': 'Bands of the brief' },
      ...bands.map((/** @type {any} */ band, /** @type {number} */ index) =>
        chip(band, index, most, open === index, () => {
          chosen.band = open === index ? null : index;
          draft.ask();
        }),
      ),
    ),
    bands.length
      ? null
      : html('p', { class: 'soft' }, 'No band yet. Take one from below, or give frequencies of your own.'),
    open === null ? null : bandEditor(state, store, draft, chosen, open),
    ...faultsAt(state.faults, 'brief.bands')
      .filter((words, index, all) => all.indexOf(words) === index)
      .map((words) => sentence(null, words)),
    untargeted(state.plan.brief),
    adder(state, store, draft, chosen),
  );
}

/**
 * The bands that no target counts on: they are matched but add nothing to the score, which a new band does not show.
 * @param {any} brief
 * @returns {HTMLElement|null}
 */
function untargeted(brief) {
  const targets = brief?.targets ?? [];
  if (targets.length === 0 || targets.some((/** @type {any} */ target) => !target.bands?.length)) return null;
  const idle = (brief.bands ?? [])
    .map(bandName)
    .filter((/** @type {string} */ name) => !targets.some((/** @type {any} */ target) => target.bands.includes(name)));
  if (idle.length === 0) return null;
  return html('p', { class: 'soft' }, `No target counts on ${idle.join(', ')}: open a target below and tick it there.`);
}

/**
 * @param {any} band
 * @param {number} index
 * @param {number} most
 * @param {boolean} open
 * @param {() => void} toggle
 */
function chip(band, index, most, open, toggle) {
  const bar = html('span', { class: 'chip-bar' });
  bar.style.width = `${((band.weight ?? 1) / most) * 100}%`;
  return html(
    'button',
    {
      type: 'button',
      class: 'chip',
      'data-key': `band-${index}`,
      'aria-expanded': String(open),
      'aria-label': `${bandName(band)}, weight ${band.weight ?? 1}${band.receiveOnly ? ', receive only' : ''}`,
      onclick: toggle,
    },
    html(
      'span',
      { class: 'chip-word' },
      bandName(band),
      band.receiveOnly ? html('span', { class: 'soft' }, ' rx') : null,
    ),
    html('span', { class: 'chip-track' }, bar),
  );
}

/**
 * @param {import('../state/types.js').State} state
 * @param {Store} store
 * @param {import('./brief-fields.js').Draft} draft
 * @param {Chosen} chosen
 * @param {number} index
 */
function bandEditor(state, store, draft, chosen, index) {
  const band = state.plan.brief.bands[index];
  const name = bandName(band);
  return html(
    'div',
    { class: 'editor' },
    html(
      'div',
      { class: 'fields two' },
      textBox(draft, {
        key: `band-${index}-name`,
        label: 'Name',
        value: band.name ?? '',
        take: (text) => renameBand(state, store, index, text.trim()),
      }),
      textBox(draft, {
        key: `band-${index}-frequencies`,
        label: 'Frequencies',
        unit: 'MHz',
        mode: 'decimal',
        value: (band.frequencies ?? []).join(', '),
        take: (text) => takeFrequencies(store, index, name, band.frequencies ?? [], text),
      }),
    ),
    weightBar(store, {
      key: `band-${index}-weight`,
      label: `Weight of ${name}`,
      value: band.weight ?? 1,
      set: (weight) => editEntry(store, `Weigh ${name}`, 'bands', index, { weight }, `band-weight-${index}`),
    }),
    html(
      'div',
      { class: 'line' },
      html(
        'label',
        { class: 'tick' },
        html('input', {
          type: 'checkbox',
          checked: band.receiveOnly ?? false,
          'data-key': `band-${index}-receive`,
          onchange: () =>
            editEntry(store, `${name}: ${band.receiveOnly ? 'send too' : 'receive only'}`, 'bands', index, {
              receiveOnly: !band.receiveOnly,
            }),
        }),
        'receive only',
      ),
      html(
        'button',
        {
          type: 'button',
          class: 'link',
          'data-key': `band-${index}-remove`,
          onclick: () => {
            chosen.band = null;
            removeBand(state, store, index);
          },
        },
        `Take ${name} out`,
      ),
    ),
  );
}

/**
 * Renames a band, also where targets name it.
 * @param {import('../state/types.js').State} state
 * @param {Store} store
 * @param {number} index
 * @param {string} name
 * @returns {string|null}
 */
function renameBand(state, store, index, name) {
  const { bands, targets } = state.plan.brief;
  const before = bands[index].name;
  if (name === '' || name === before) return name === '' ? 'A band needs a name.' : null;
  if (bands.some((/** @type {any} */ band, /** @type {number} */ k) => k !== index && bandName(band) === name))
    return `There is a band called ${name} already.`;
  editBrief(store, `Call the band ${name}`, {
    bands: bands.map((/** @type {any} */ band, /** @type {number} */ k) => (k === index ? { ...band, name } : band)),
    targets: (targets ?? []).map((/** @type {any} */ target) =>
      target.bands?.includes(before)
        ? { ...target, bands: target.bands.map((/** @type {string} */ one) => (one === before ? name : one)) }
        : target,
    ),
  });
  return null;
}

/**
 * @param {import('../state/types.js').State} state
 * @param {Store} store
 * @param {number} index
 */
function removeBand(state, store, index) {
  const { bands, targets } = state.plan.brief;
  const gone = bandName(bands[index]);
  editBrief(store, `Take ${gone} out`, {
    bands: bands.filter((/** @type {any} */ _, /** @type {number} */ k) => k !== index),
    targets: (targets ?? []).map((/** @type {any} */ target) =>
      target.bands?.includes(gone)
        ? { ...target, bands: target.bands.filter((/** @type {string} */ one) => one !== gone) }
        : target,
    ),
  });
}

/**
 * Reads "14.0, 14.175 14.35".
 * @param {string} text
 * @returns {number[]|string} rising, or a sentence
 */
export function parseFrequencies(text) {
  const parts = text
    .trim()
    .split(/[;\s]+|,\s+|,(?=\d+\.)/)
    .filter((part) => part !== '');
  if (parts.length === 0) return 'Give at least one frequency in MHz, such as 14.175.';
  const values = parts.map((part) => parseNumber(part.replace(/,$/, '')));
  const bad = values.findIndex((value) => value === null);
  if (bad >= 0)
    return `“${parts[bad]}” is not a frequency. Type MHz, with spaces or commas between: 14.05, 14.175, 14.3.`;
  const out = values.find((value) => value !== null && (value < 1.8 || value > 54));
  if (out !== undefined && out !== null)
    return `${out} MHz is outside what is computed, 1.8 to 54 MHz${out > 1000 ? '; type MHz, not kHz or Hz' : ''}.`;
  return [...new Set(/** @type {number[]} */ (values))].sort((a, b) => a - b);
}

/**
 * @param {Store} store
 * @param {number} index
 * @param {string} name
 * @param {number[]} before
 * @param {string} text
 */
function takeFrequencies(store, index, name, before, text) {
  const read = parseFrequencies(text);
  if (typeof read === 'string') return read;
  if (read.join() !== before.join()) editEntry(store, `Frequencies of ${name}`, 'bands', index, { frequencies: read });
  return null;
}

/**
 * Three frequencies of a band: near its edges and in its middle.
 * @param {number[]} edges
 * @returns {number[]}
 */
export function spread([low, high]) {
  const inset = Math.min(0.02, (high - low) * 0.1);
  const round = (/** @type {number} */ value) => Math.round(value * 1000) / 1000;
  return [...new Set([round(low + inset), round((low + high) / 2), round(high - inset)])];
}

/**
 * The Radio Regulations' region of a place, roughly: what the choice starts from, and can be changed.
 * @param {any} site
 * @returns {string}
 */
export function regionOf(site) {
  const [latitude, longitude] = [site?.latitude, site?.longitude];
  if (typeof longitude !== 'number') return '1';
  if (longitude < -20) return '2';
  return longitude > 60 && typeof latitude === 'number' && latitude < 45 ? '3' : '1';
}

/**
 * @param {import('../state/types.js').State} state
 * @param {Store} store
 * @param {import('./brief-fields.js').Draft} draft
 * @param {Chosen} chosen
 */
function adder(state, store, draft, chosen) {
  const region = chosen.region ?? regionOf(state.plan.site);
  const bands = state.plan.brief?.bands ?? [];
  const have = new Set(bands.map((/** @type {any} */ band) => bandName(band).replace(/\s*m$/, '')));
  const rest = (state.catalogue?.bands ?? []).filter(
    (/** @type {any} */ kind) => kind.regions[region] && !have.has(kind.name.replace(/\s*m$/, '')),
  );
  const add = (/** @type {any} */ band) => {
    chosen.band = bands.length;
    editBrief(store, `Add ${bandName(band)}`, { bands: [...bands, band] });
  };
  return html(
    'div',
    { class: 'adder' },
    html(
      'div',
      { class: 'chips', role: 'group', 'aria-label': 'Add a band' },
      ...rest.map((/** @type {any} */ kind) =>
        html(
          'button',
          {
            type: 'button',
            class: 'chip add',
            'data-key': `add-${kind.id}`,
            title: `${kind.regions[region].join(' to ')} MHz`,
            onclick: () =>
              add({ name: kind.name, frequencies: spread(kind.regions[region]), weight: 1, receiveOnly: false }),
          },
          `+ ${kind.name}`,
        ),
      ),
      html(
        'button',
        {
          type: 'button',
          class: 'chip add',
          'data-key': 'add-own',
          onclick: () => add({ name: freeName(bands), frequencies: [10], weight: 1, receiveOnly: false }),
        },
        '+ own frequencies',
      ),
    ),
    html(
      'p',
      { class: 'soft' },
      html('label', { for: 'brief-region' }, 'Band edges of region '),
      html(
        'select',
        {
          id: 'brief-region',
          value: region,
          'data-key': 'region',
          onchange: (/** @type {Event} */ event) => {
            chosen.region = /** @type {HTMLSelectElement} */ (event.target).value;
            draft.ask();
          },
        },
        html('option', { value: '1' }, '1, Europe and Africa'),
        html('option', { value: '2' }, '2, the Americas'),
        html('option', { value: '3' }, '3, Asia and the Pacific'),
      ),
      '; the national table decides.',
    ),
  );
}

/** @param {any[]} bands */
function freeName(bands) {
  let number = 1;
  while (bands.some((band) => bandName(band) === `Own ${number}`)) number += 1;
  return `Own ${number}`;
}
