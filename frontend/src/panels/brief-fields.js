// @ts-check
import { html } from '../charts/html.js';
import { stateMark } from '../charts/marks.js';
import { parseNumber } from '../units/figures.js';

/**
 * Labelled boxes of the brief. What cannot be read stays in its box with a sentence under it until it is mended;
 * what can be read is taken into the plan at once.
 *
 * @typedef {import('../state/store.js').Store} Store
 * @typedef {{typed: Map<string, {text: string, wrong: string}>, ask: () => void}} Draft what stands in boxes that could
 *   not be read, and why; Escape gives the plan's own figure back
 */

/**
 * Changes the brief as one undo step.
 * @param {Store} store
 * @param {string} label
 * @param {object} patch
 * @param {string} [group]
 */
export function editBrief(store, label, patch, group) {
  store.edit(label, (plan) => ({ ...plan, brief: { ...(plan.brief ?? {}), ...patch } }), group);
}

/**
 * Changes one entry of a list in the brief.
 * @param {Store} store
 * @param {string} label
 * @param {'bands'|'targets'} list
 * @param {number} index
 * @param {object} patch a value of undefined takes a field away
 * @param {string} [group]
 */
export function editEntry(store, label, list, index, patch, group) {
  store.edit(
    label,
    (plan) => {
      const entries = [...(plan.brief?.[list] ?? [])];
      const entry = { ...entries[index], ...patch };
      entries[index] = Object.fromEntries(Object.entries(entry).filter(([, value]) => value !== undefined));
      return { ...plan, brief: { ...(plan.brief ?? {}), [list]: entries } };
    },
    group,
  );
}

/**
 * @typedef {object} Box
 * @property {string} key unique in the panel
 * @property {string} label
 * @property {string} value
 * @property {string} [unit]
 * @property {(text: string) => string|null} take reads and keeps what was typed; a sentence when it cannot
 * @property {boolean} [hideLabel] only for screen readers, where a column says it
 * @property {string} [placeholder]
 * @property {string} [mode] which keyboard a phone shows
 * @property {string|null} [fault] what the plan's check says of it
 * @property {boolean} [disabled]
 */

/**
 * @param {Draft} draft
 * @param {Box} box
 * @returns {HTMLElement}
 */
export function textBox(draft, box) {
  const typed = draft.typed.get(box.key);
  const value = typed?.text ?? box.value;
  const wrong = typed?.wrong ?? box.fault ?? null;
  const id = `brief-${box.key}`;
  return html(
    'div',
    { class: 'field' },
    html('label', { for: id, class: box.hideLabel ? 'visually-hidden' : null }, box.label),
    html(
      'span',
      { class: 'typing' },
      html('input', {
        type: 'text',
        id,
        value,
        'data-key': box.key,
        inputmode: box.mode ?? null,
        autocomplete: 'off',
        spellcheck: 'false',
        placeholder: box.placeholder ?? null,
        disabled: box.disabled ?? false,
        'aria-invalid': wrong ? 'true' : null,
        'aria-describedby': wrong ? `${id}-fault` : null,
        onchange: (/** @type {Event} */ event) => {
          const text = /** @type {HTMLInputElement} */ (event.target).value;
          const problem = box.take(text);
          if (problem === null) draft.typed.delete(box.key);
          else draft.typed.set(box.key, { text, wrong: problem });
          draft.ask();
        },
        onkeydown: (/** @type {KeyboardEvent} */ event) => {
          if (event.key !== 'Escape' || !draft.typed.delete(box.key)) return;
          event.stopPropagation();
          draft.ask();
        },
      }),
      box.unit ? html('span', { class: 'unit', 'aria-hidden': 'true' }, box.unit) : null,
    ),
    wrong ? sentence(`${id}-fault`, wrong) : null,
  );
}

/**
 * @param {string|null} id
 * @param {string} words
 * @returns {HTMLElement}
 */
export function sentence(id, words) {
  return html('p', { class: 'brief-fault', id }, stateMark('foul', 'Fault'), ` ${words}`);
}

/**
 * A box for a number.
 * @param {Draft} draft
 * @param {Omit<Box, 'value'|'take'> & {value: number|null|undefined, least?: number, most?: number, may?: boolean,
 *   take: (value: number|null) => void}} box `may`: it may be empty
 * @returns {HTMLElement}
 */
export function numberBox(draft, box) {
  const text = box.value === null || box.value === undefined ? '' : String(box.value).replace('-', '−');
  return textBox(draft, {
    ...box,
    mode: 'decimal',
    value: text,
    take: (typed) => {
      if (typed.trim() === '' && box.may) {
        if (box.value !== null && box.value !== undefined) box.take(null);
        return null;
      }
      const value = parseNumber(typed);
      const range = `${box.least ?? ''}${box.most === undefined ? ' or more' : ` to ${box.most}`}`;
      if (value === null)
        return `${box.label}: “${typed}” is not a number. Type a figure${box.least === undefined ? '' : ` of ${range}`}.`;
      if ((box.least !== undefined && value < box.least) || (box.most !== undefined && value > box.most)) {
        return `${box.label} is ${typed.trim()}; it has to be ${range}${box.unit ? ` ${box.unit}` : ''}.`;
      }
      if (value !== box.value) box.take(value);
      return null;
    },
  });
}

/**
 * A weight: a slider whose track is the bar itself, its figure beside it.
 * @param {Store} store
 * @param {{key: string, label: string, value: number, set: (value: number) => void}} weight
 * @returns {HTMLElement}
 */
export function weightBar(store, { key, label, value, set }) {
  const figure = html('output', { class: 'weight-figure' }, value.toFixed(1));
  const slider = html('input', {
    type: 'range',
    min: 0,
    max: Math.max(2, Math.ceil(value)),
    step: 0.1,
    value,
    'aria-label': label,
    'data-key': key,
    class: 'weight',
    oninput: () => {
      const now = Number(/** @type {HTMLInputElement} */ (slider).value);
      figure.textContent = now.toFixed(1);
      fillBar(/** @type {HTMLInputElement} */ (slider));
      set(now);
    },
    onchange: () => store.endGroup(),
  });
  fillBar(/** @type {HTMLInputElement} */ (slider));
  return html('span', { class: 'weight-row' }, html('span', { class: 'soft' }, 'weight'), slider, figure);
}

/** @param {HTMLInputElement} slider */
function fillBar(slider) {
  slider.style.setProperty('--share', `${(Number(slider.value) / Number(slider.max)) * 100}%`);
}

/**
 * A choice from a catalogue; empty stands for its default.
 * @param {{key: string, label: string, value: string|undefined, kinds: {id: string, name: string, default?: boolean}[],
 *   extra?: [string, string], choose: (id: string) => void}} choice
 * @returns {HTMLElement}
 */
export function kindSelect({ key, label, value, kinds, extra, choose }) {
  const standard = kinds.find((kind) => kind.default)?.id ?? kinds[0]?.id ?? '';
  const id = `brief-${key}`;
  return html(
    'div',
    { class: 'field' },
    html('label', { for: id }, label),
    html(
      'select',
      {
        id,
        'data-key': key,
        value: value ?? standard,
        onchange: (/** @type {Event} */ event) => choose(/** @type {HTMLSelectElement} */ (event.target).value),
      },
      ...kinds.map((kind) => html('option', { value: kind.id }, kind.name)),
      extra ? html('option', { value: extra[0] }, extra[1]) : null,
    ),
  );
}

/**
 * Faults of the plan's check that belong to a part of the brief.
 * @param {{path: string, message: string}[]} faults
 * @param {string} start of their path, "brief.bands[1]"
 * @returns {string[]} sentences
 */
export function faultsAt(faults, start) {
  return faults
    .filter(({ path }) => path === start || (path.startsWith(start) && /^[.[]/.test(path.slice(start.length))))
    .map(({ message }) => message);
}
