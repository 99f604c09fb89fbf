// @ts-check
import { html } from '../charts/html.js';
import { svg } from '../draw/svg.js';
import { number, parseNumber } from '../units/figures.js';
import { formatLength, parseLength } from '../units/length.js';
import { editBrief, faultsAt, kindSelect, numberBox, sentence, textBox } from './brief-fields.js';

/**
 * What the station has: power, wire, rope, line, matching unit, shapes, new masts.
 * @typedef {import('../state/store.js').Store} Store
 * @typedef {import('../state/types.js').State} State
 */

/** Shape words of the plan format with a sketch each, on a box of 40 by 22. */
const SHAPES = /** @type {const} */ ([
  ['level', 'level', 'M3 6Q20 9 37 6'],
  ['sloping', 'sloping', 'M3 4Q20 13 37 18'],
  ['apex', 'apex', 'M3 18 20 4 37 18'],
  ['bent', 'bent', 'M3 5H22L34 18'],
  ['drooping', 'drooping ends', 'M5 17V5Q20 8 35 5V17'],
  ['off-centre', 'off-centre', 'M3 6H37M13 6V18'],
  ['loop', 'loop', 'M8 5H32L27 18H13Z'],
  ['inverted-l', 'inverted L', 'M6 19V5H37'],
]);

const OWN_UNIT = 'own';

/**
 * @param {State} state
 * @param {Store} store
 * @param {import('./brief-fields.js').Draft} draft
 * @returns {HTMLElement}
 */
export function powerSection(state, store, draft) {
  const brief = state.plan.brief ?? {};
  return html(
    'section',
    { class: 'brief-power' },
    html('h3', {}, 'Power'),
    html(
      'div',
      { class: 'fields two' },
      numberBox(draft, {
        key: 'power',
        label: 'Peak envelope power',
        unit: 'W',
        value: brief.power ?? 100,
        least: 0,
        most: 100000,
        take: (power) => editBrief(store, `Power ${power} W`, { power }),
      }),
      numberBox(draft, {
        key: 'duty',
        label: 'Share of the time sending',
        unit: '0–1',
        value: brief.duty ?? 1,
        least: 0,
        most: 1,
        take: (duty) => editBrief(store, `Duty ${duty}`, { duty }),
      }),
    ),
    ...['brief.power', 'brief.duty']
      .flatMap((path) => faultsAt(state.faults, path))
      .map((words) => sentence(null, words)),
  );
}

/**
 * @param {State} state
 * @param {Store} store
 * @param {import('./brief-fields.js').Draft} draft
 * @returns {HTMLElement}
 */
export function meansSection(state, store, draft) {
  const brief = state.plan.brief ?? {};
  const { wires = [], lines = [], ropes = [], matchingUnits = [] } = state.catalogue ?? {};
  const pick = (/** @type {any[]} */ kinds, /** @type {string|undefined} */ id) =>
    kinds.find((kind) => kind.id === id) ?? kinds.find((kind) => kind.default) ?? kinds[0];
  const own = brief.matching && typeof brief.matching === 'object';
  const unit = own ? brief.matching : pick(matchingUnits, brief.matching)?.unit;
  return html(
    'section',
    { class: 'brief-means' },
    html('h3', {}, 'Wire, line and matching unit'),
    kindSelect({
      key: 'wire',
      label: 'Wire',
      value: brief.wire,
      kinds: wires,
      choose: (wire) => editBrief(store, 'Choose the wire', { wire }),
    }),
    figures(wireFigures(pick(wires, brief.wire))),
    kindSelect({
      key: 'rope',
      label: 'Rope',
      value: brief.rope,
      kinds: ropes,
      choose: (rope) => editBrief(store, 'Choose the rope', { rope }),
    }),
    figures(ropeFigures(pick(ropes, brief.rope))),
    kindSelect({
      key: 'line',
      label: 'Feed line',
      value: brief.line,
      kinds: lines,
      choose: (line) => editBrief(store, 'Choose the feed line', { line }),
    }),
    figures(lineFigures(pick(lines, brief.line))),
    lineLengths(state, store, draft),
    kindSelect({
      key: 'matching',
      label: 'Matching unit',
      value: own ? OWN_UNIT : brief.matching,
      kinds: matchingUnits,
      extra: [OWN_UNIT, 'one of your own, by its figures'],
      choose: (id) => editBrief(store, 'Choose the matching unit', { matching: id === OWN_UNIT ? { ...unit } : id }),
    }),
    own ? unitEditor(store, draft, unit) : figures(unitFigures(unit)),
    ...['brief.wire', 'brief.rope', 'brief.line', 'brief.lineLengths', 'brief.matching']
      .flatMap((path) => faultsAt(state.faults, path))
      .map((words) => sentence(null, words)),
  );
}

/** @param {string} words */
const figures = (words) => html('p', { class: 'soft figures' }, words);

/** @param {any} wire */
function wireFigures(wire) {
  if (!wire) return '';
  return `${number(wire.radius * 2000, 2)} mm${wire.insulation ? `, ${number(wire.insulation.radius * 2000, 1)} mm over insulation` : ', bare'}; ${number(wire.weight * 1000, 1)} g/m; breaks at ${number(wire.breaking, 0)} N`;
}

/** @param {any} rope */
function ropeFigures(rope) {
  return rope
    ? `${number(rope.weight * 1000, 1)} g/m; breaks at ${number(rope.breaking, 0)} N, works to ${number(rope.breaking * rope.workingShare, 0)} N`
    : '';
}

/** @param {any} line */
function lineFigures(line) {
  if (!line) return '';
  const loss = line.conductorLoss * Math.sqrt(14) + line.dielectricLoss * 14;
  return `${number(line.impedance, 0)} Ω, ${line.balanced ? 'balanced' : 'unbalanced'}; velocity factor ${number(line.velocityFactor, 2)}; ${number(loss, loss < 1 ? 2 : 1)} dB per 100 m matched at 14 MHz; ${number(line.weight * 1000, 0)} g/m${line.peakVolts ? `; stands ${number(line.peakVolts, 0)} V` : ''}`;
}

/** @param {any} unit */
function unitFigures(unit) {
  if (!unit) return '';
  if (unit.network === 'balun') return `Nothing to adjust; stands ${number(unit.peakVolts, 0)} V`;
  return `${unit.network} network; ${unit.inductance.map((/** @type {number} */ value) => number(value * 1e6, 1)).join(' to ')} µH, ${unit.capacitance.map((/** @type {number} */ value) => number(value * 1e12, 0)).join(' to ')} pF; coil Q ${number(unit.coilQ, 0)}; stands ${number(unit.peakVolts, 0)} V`;
}

/**
 * @param {State} state
 * @param {Store} store
 * @param {import('./brief-fields.js').Draft} draft
 */
function lineLengths(state, store, draft) {
  const lengths = state.plan.brief?.lineLengths ?? 'free';
  const listed = Array.isArray(lengths);
  const choice = (/** @type {boolean} */ list, /** @type {string} */ words) =>
    html(
      'label',
      { class: 'tick' },
      html('input', {
        type: 'radio',
        name: 'line-lengths',
        checked: listed === list,
        'data-key': `lengths-${list}`,
        onchange: () =>
          editBrief(store, list ? 'Line lengths at hand' : 'Any line length', { lineLengths: list ? [10] : 'free' }),
      }),
      words,
    );
  return html(
    'fieldset',
    { class: 'ticks' },
    html('legend', {}, 'Line length'),
    choice(false, 'cut to any length'),
    choice(true, 'only these:'),
    listed
      ? textBox(draft, {
          key: 'lengths',
          label: 'Lengths at hand',
          hideLabel: true,
          unit: state.units,
          value: lengths.map((/** @type {number} */ one) => formatLength(one, state.units, 2)).join('; '),
          take: (text) => {
            const parts = text
              .split(/[;]|,\s+/)
              .map((part) => part.trim())
              .filter((part) => part !== '');
            const read = parts.map((part) => parseLength(part, state.units));
            const bad = read.findIndex((one) => one === null || one <= 0);
            if (parts.length === 0 || bad >= 0)
              return `${parts.length ? `“${parts[bad]}” is not a length. ` : ''}Type lengths with semicolons between, such as 10; 12.5.`;
            if (read.join() !== lengths.join()) editBrief(store, 'Line lengths at hand', { lineLengths: read });
            return null;
          },
        })
      : null,
  );
}

/**
 * @param {Store} store
 * @param {import('./brief-fields.js').Draft} draft
 * @param {any} unit
 */
function unitEditor(store, draft, unit) {
  const set = (/** @type {object} */ patch) =>
    editBrief(store, 'Describe the matching unit', { matching: { ...unit, ...patch } });
  const range = (
    /** @type {'inductance'|'capacitance'} */ field,
    /** @type {string} */ label,
    /** @type {string} */ sign,
    /** @type {number} */ scale,
  ) =>
    textBox(draft, {
      key: `unit-${field}`,
      label,
      unit: sign,
      value: (unit[field] ?? [])
        .map((/** @type {number} */ value) => String(Number((value / scale).toPrecision(6))))
        .join(' to '),
      take: (text) => {
        const ends = text
          .split(/\s*(?:to|–|;)\s*|\s+/)
          .filter((part) => part !== '')
          .map(parseNumber);
        if (ends.length !== 2 || ends.some((end) => end === null || end < 0))
          return `${label}: type the least and the most, such as 0 to 30.`;
        const [low, high] = /** @type {number[]} */ (ends);
        if (low > high) return `${label}: the least is greater than the most.`;
        const next = [low * scale, high * scale];
        if (
          next.some(
            (value, k) => Math.abs(value - (unit[field]?.[k] ?? NaN)) > scale * 1e-6 || Number.isNaN(unit[field]?.[k]),
          )
        )
          set({ [field]: next });
        return null;
      },
    });
  const figure = (
    /** @type {string} */ field,
    /** @type {string} */ label,
    /** @type {string} */ sign,
    /** @type {number} */ most,
  ) =>
    numberBox(draft, {
      key: `unit-${field}`,
      label,
      unit: sign,
      value: unit[field],
      least: 1,
      most,
      take: (value) => set({ [field]: value }),
    });
  return html(
    'div',
    { class: 'editor' },
    html(
      'div',
      { class: 'fields three' },
      html(
        'div',
        { class: 'field' },
        html('label', { for: 'brief-network' }, 'Network'),
        html(
          'select',
          {
            id: 'brief-network',
            'data-key': 'network',
            value: unit.network,
            onchange: (/** @type {Event} */ event) =>
              set({ network: /** @type {HTMLSelectElement} */ (event.target).value }),
          },
          ...['L', 'T', 'balun'].map((name) => html('option', { value: name }, name)),
        ),
      ),
      range('inductance', 'Coil', 'µH', 1e-6),
      range('capacitance', 'Capacitors', 'pF', 1e-12),
    ),
    html(
      'div',
      { class: 'fields three' },
      figure('coilQ', 'Coil Q', '', 10000),
      figure('capacitorQ', 'Capacitor Q', '', 100000),
      figure('peakVolts', 'Stands', 'V', 100000),
    ),
  );
}

/**
 * @param {State} state
 * @param {Store} store
 * @param {import('./brief-fields.js').Draft} draft
 * @returns {HTMLElement}
 */
export function shapesSection(state, store, draft) {
  const brief = state.plan.brief ?? {};
  const all = SHAPES.map(([id]) => id);
  /** @type {Set<string>} */
  const on = new Set(brief.shapes?.length ? brief.shapes : all);
  return html(
    'section',
    { class: 'brief-shapes' },
    html('h3', {}, 'Shapes allowed'),
    html(
      'div',
      { class: 'shapes', role: 'group', 'aria-label': 'Shapes allowed' },
      ...SHAPES.map(([id, name, sketch]) =>
        html(
          'button',
          {
            type: 'button',
            class: 'shape',
            'aria-pressed': String(on.has(id)),
            'data-key': `shape-${id}`,
            onclick: () => {
              const next = all.filter((one) => (one === id ? !on.has(id) : on.has(one)));
              if (next.length) editBrief(store, `${on.has(id) ? 'Leave out' : 'Allow'} ${name}`, { shapes: next });
            },
          },
          svg('svg', { viewBox: '0 0 40 22', width: 40, height: 22, 'aria-hidden': 'true' }, [
            svg('path', { d: sketch }),
          ]),
          name,
        ),
      ),
    ),
    on.size === 1 ? html('p', { class: 'soft' }, 'At least one shape stays allowed.') : null,
    html(
      'div',
      { class: 'fields two' },
      numberBox(draft, {
        key: 'new-masts',
        label: 'New masts allowed',
        value: brief.newMasts ?? 0,
        least: 0,
        most: 10,
        take: (value) => editBrief(store, `New masts allowed: ${value}`, { newMasts: Math.round(value ?? 0) }),
      }),
    ),
    ...['brief.shapes', 'brief.newMasts']
      .flatMap((path) => faultsAt(state.faults, path))
      .map((words) => sentence(null, words)),
  );
}
