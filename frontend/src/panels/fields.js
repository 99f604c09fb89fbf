// @ts-check
/**
 * Boxes to type in. Each is made once and then told its value; what is being typed is left alone
 * until it is done. A text that cannot be read is said under the box and nothing is changed.
 */
import { degreesInBox, formatDirection, parseDegrees, parseDirection } from '../units/angle.js';
import { MINUS, parseNumber } from '../units/figures.js';
import { formatLength, lengthInBox, parseLength } from '../units/length.js';
import { el } from './el.js';

/** @typedef {'m'|'ft'} Units */
/** @typedef {{root: HTMLElement, input: HTMLElement, show: (value: any, units: Units) => void}} Box */
/** @typedef {'text'|'notes'|'length'|'direction'|'degrees'|'number'|'force'|'date'|'millimetres'} Type */

/** @param {Type} type @param {any} value @param {Units} units @returns {string} */
export function toText(type, value, units) {
  if (value === null || value === undefined) return '';
  switch (type) {
    case 'length':
      return lengthInBox(value, units);
    case 'direction':
      return formatDirection(value);
    case 'degrees':
      return degreesInBox(value);
    case 'millimetres':
      return String(Math.round(value * 1e5) / 100);
    case 'number':
    case 'force':
      return String(value).replace('-', MINUS);
    default:
      return String(value);
  }
}

/** What a type wants to read, for the sentence under a box. @type {Record<string, string>} */
const WANTED = {
  length: 'a length such as 6.86, 6.86 m or 22\u2032 6\u2033',
  direction: 'a direction such as 90, 90.0° or NE',
  degrees: 'degrees such as 51.5, −1.2 or 1° 12′ W',
  number: 'a number',
  force: 'newtons, a number',
  millimetres: 'millimetres, a number',
};

/** @param {Type} type @param {string} text @param {Units} units @returns {any} undefined: cannot be read; null: empty */
export function fromText(type, text, units) {
  const clean = text.trim();
  if (type === 'text' || type === 'notes' || type === 'date') return clean === '' ? null : clean;
  if (clean === '') return null;
  const read = {
    length: () => parseLength(clean, units),
    direction: () => parseDirection(clean),
    degrees: () => parseDegrees(clean),
    number: () => parseNumber(clean),
    force: () => parseNumber(clean.replace(/\s*N$/i, '')),
    millimetres: () => {
      const mm = parseNumber(clean.replace(/\s*mm$/i, ''));
      return mm === null ? null : mm / 1000;
    },
  }[type]();
  return read === null ? undefined : read;
}

/** @param {Type} type @param {Units} units @returns {string} */
export const unitOf = (type, units) =>
  ({ length: units === 'm' ? 'm' : 'ft', force: 'N', millimetres: 'mm', direction: '', degrees: '°' })[/** @type {'length'} */ (type)] ?? '';

/**
 * @param {{id: string, label: string, type: Type, optional?: boolean, least?: number, most?: number,
 *   hint?: string, bare?: boolean, onchange: (value: any) => void, getUnits: () => Units}} config
 *   `bare`: without its label on show (in a table); null is passed on only where it is optional
 * @returns {Box}
 */
export function box(config) {
  const error = el('span', { class: 'slot-error', id: `${config.id}-error`, role: 'alert' });
  const unit = el('span', { class: 'slot-unit', 'aria-hidden': 'true' });
  const notes = config.type === 'notes';
  const input = el(notes ? 'textarea' : 'input', {
    id: config.id,
    ...(notes ? { rows: 3 } : { type: config.type === 'date' ? 'date' : 'text' }),
    ...(notes || config.type === 'text' || config.type === 'date' ? {} : { inputmode: 'text' }),
    autocomplete: 'off',
    spellcheck: 'false',
    'aria-label': config.bare ? config.label : null,
    'aria-describedby': config.hint ? `${config.id}-hint ${config.id}-error` : `${config.id}-error`,
  });
  let shown = '';

  function commit() {
    const units = config.getUnits();
    if (input.value === shown) return fail('');
    const value = fromText(config.type, input.value, units);
    if (value === undefined) return fail(`Write ${WANTED[config.type] ?? 'it again'}.`);
    if (value === null && !config.optional) return fail(config.type === 'text' ? 'This cannot be empty.' : 'This figure is needed.');
    if (typeof value === 'number' && config.least !== undefined && value < config.least) {
      return fail(`At least ${toText(config.type, config.least, units)}.`);
    }
    if (typeof value === 'number' && config.most !== undefined && value > config.most) {
      return fail(`At most ${toText(config.type, config.most, units)}.`);
    }
    fail('');
    shown = input.value;
    config.onchange(value);
  }

  /** @param {string} sentence */
  function fail(sentence) {
    error.textContent = sentence;
    if (sentence) input.setAttribute('aria-invalid', 'true');
    else input.removeAttribute('aria-invalid');
  }

  input.addEventListener('change', commit);
  input.addEventListener('keydown', (/** @type {KeyboardEvent} */ event) => {
    if (event.key === 'Enter' && !notes) commit();
    if (event.key === 'Escape') {
      // The first gives up what was typed; with nothing to give up it leaves the box, so that letters are tools again.
      if (input.value === shown && !error.textContent) input.blur();
      input.value = shown;
      fail('');
      event.stopPropagation();
    }
  });
  const field = el('span', { class: 'slot-field' }, [input, unit]);
  const root = config.bare
    ? el('span', { class: 'slot bare' }, [field, error])
    : el('div', { class: `slot slot-${config.type}` }, [
        el('label', { for: config.id, text: config.label }),
        field,
        config.hint ? el('span', { class: 'slot-hint', id: `${config.id}-hint`, text: config.hint }) : null,
        error,
      ]);
  return {
    root,
    input,
    show(value, units) {
      unit.textContent = config.bare ? '' : unitOf(config.type, units);
      const exact = toText(config.type, value, units);
      // In a table decimals stand under one another; a value with more of them is only shown short.
      const text = config.bare && config.type === 'length' && value !== null ? formatLength(value, units, 2) : exact;
      if (text === shown && input.value === text) return;
      if (document.activeElement === input && input.value !== shown) return;
      shown = text;
      input.value = text;
      fail('');
    },
  };
}

/**
 * @param {{id: string, label: string, options: {value: string, label: string}[],
 *   onchange: (value: string) => void, bare?: boolean}} config
 * @returns {Box}
 */
export function choice(config) {
  const input = el('select', { id: config.id, 'aria-label': config.bare ? config.label : null },
    config.options.map((o) => el('option', { value: o.value, text: o.label })));
  input.addEventListener('change', () => config.onchange(input.value));
  const root = config.bare
    ? el('span', { class: 'slot bare' }, [input])
    : el('div', { class: 'slot' }, [el('label', { for: config.id, text: config.label }), input]);
  return {
    root,
    input,
    show(value) {
      input.value = value ?? '';
    },
  };
}

/**
 * A row of pictures to choose from, as radio buttons.
 * @param {{id: string, label: string, options: {value: string, label: string, picture?: () => Node}[],
 *   onchange: (value: string) => void}} config
 * @returns {Box}
 */
export function pick(config) {
  const inputs = config.options.map((o) =>
    el('input', { type: 'radio', name: config.id, value: o.value, 'data-key': `${config.id}-${o.value}`, id: `${config.id}-${o.value}`, onchange: () => config.onchange(o.value) }),
  );
  const root = el('fieldset', { class: 'pick' }, [
    el('legend', { text: config.label }),
    el('div', { class: 'pick-row' }, config.options.map((o, i) =>
      el('label', { class: 'pick-one', for: `${config.id}-${o.value}` }, [inputs[i], o.picture?.() ?? null, el('span', { text: o.label })]),
    )),
  ]);
  return {
    root,
    input: inputs[0],
    show(value) {
      inputs.forEach((input, i) => {
        input.checked = config.options[i].value === value;
      });
    },
  };
}

/** @param {{id: string, label: string, onchange: (value: boolean) => void}} config @returns {Box} */
export function flag(config) {
  const input = el('input', { type: 'checkbox', id: config.id, onchange: () => config.onchange(input.checked) });
  return {
    root: el('div', { class: 'slot slot-flag' }, [input, el('label', { for: config.id, text: config.label })]),
    input,
    show(value) {
      input.checked = Boolean(value);
    },
  };
}
