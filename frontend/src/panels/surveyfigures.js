// @ts-check
/** The figures of the selected thing, all of them to be changed. */
import { area, perimeter } from '../geometry/polygon.js';
import { changeThing, moveVertex, setField, withField } from '../state/edits.js';
import { find, KINDS, nameOf, pointsOf } from '../state/kinds.js';
import { ridgeTurned, withFollowing } from '../state/made.js';
import { area as areaText, lengthWithUnit } from '../units/length.js';
import { el, link } from './el.js';
import { box, choice, flag, pick } from './fields.js';
import { FIELDS } from './surveyfields.js';
import { wallTable } from './surveywalls.js';

/** @typedef {import('../state/store.js').Store} Store */

/** @param {any} thing @param {string} path */
const valueAt = (thing, path) => path.split('.').reduce((so, key) => so?.[key], thing);

/**
 * @param {Store} store @param {any} shell @param {string} ref
 * @returns {{root: HTMLElement, show: () => void}}
 */
export function figures(store, shell, ref) {
  const found = find(store.get().plan, ref);
  if (!found) return { root: el('div'), show() {} };
  const { kind } = found;
  const getUnits = () => store.get().units;
  const head = el('p', { class: 'panel-kind' });
  const title = el('h2', { class: 'panel-head', tabindex: -1 });
  const said = el('p', { class: 'panel-note' });

  /** @param {string} path @param {any} value */
  function change(path, value) {
    const name = nameOf(kind, find(store.get().plan, ref)?.thing ?? {}, found?.index ?? 0);
    store.edit(`Change ${path === 'name' ? 'the name of' : 'figures of'} ${name}`, (plan) => {
      const thing = find(plan, ref)?.thing;
      const followed = thing && withFollowing(thing, kind, path, value);
      return followed ? changeThing(plan, ref, () => followed) : setField(plan, ref, path, value ?? undefined);
    });
  }

  const rows = (FIELDS[kind] ?? []).map((row) => {
    const base = { id: `figure-${row.path.replace('.', '-')}`, label: row.label, onchange: (/** @type {any} */ v) => change(row.path, v) };
    const control =
      row.type === 'pick' ? pick({ ...base, options: row.options ?? [] })
        : row.type === 'choice' ? choice({ ...base, options: row.options ?? [] })
          : row.type === 'flag' ? flag(base)
            : box({ ...base, type: row.type, optional: row.optional, least: row.least, hint: row.hint, getUnits });
    if (row.half) control.root.classList.add('half');
    return { row, control };
  });
  const place = KINDS[kind].shape === 'point' ? pointPlace() : null;
  const table = KINDS[kind].shape === 'point' ? null : wallTable(store, ref);
  const consents = kind === 'mastZones' ? consentPart() : null;
  const turn = kind === 'buildings'
    ? link('Turn the ridge the other way', () => store.edit('Turn a ridge', (plan) => changeThing(plan, ref, ridgeTurned)))
    : null;
  const actions = el('div', { class: 'panel-actions' }, [
    KINDS[kind].kept === 'single' ? null : link('Duplicate', () => shell.desk.duplicateSelected()),
    link(`Delete`, () => {
      store.set({ selection: { ref, vertex: null } });
      shell.desk.deleteSelected();
    }),
    link('Done', () => store.set({ selection: null })),
  ]);
  const root = el('section', { class: 'thing-figures', 'aria-label': 'Figures of the selected thing' }, [
    head, title, said,
    el('div', { class: 'figure-grid' }, [...rows.map((r) => r.control.root), place?.root]),
    turn, consents?.root, table?.root, actions,
  ]);

  return {
    root,
    show() {
      const { plan, units } = store.get();
      const now = find(plan, ref);
      if (!now) return;
      const { thing, index } = now;
      const name = nameOf(kind, thing, index);
      const what = KINDS[kind].one;
      head.textContent = what.charAt(0).toUpperCase() + what.slice(1);
      head.hidden = head.textContent === name;
      title.textContent = name;
      const points = pointsOf(kind, thing);
      said.textContent = KINDS[kind].shape === 'ring'
        ? `${areaText(area(points), units)}, ${lengthWithUnit(perimeter(points), units)} round` : '';
      for (const { row, control } of rows) {
        control.root.hidden = row.when ? !row.when(thing) : false;
        const value = valueAt(thing, row.path);
        control.show(row.type === 'flag' ? Boolean(value) : value, units);
      }
      if (turn) turn.hidden = thing.roof === 'flat';
      place?.show(points[0], units);
      consents?.show(thing, units);
      table?.show();
    },
  };

  function pointPlace() {
    const set = (/** @type {0|1|2} */ axis, /** @type {number} */ value) =>
      store.edit(`Move ${nameOf(kind, find(store.get().plan, ref)?.thing ?? {}, 0)}`, (plan) => {
        const now = find(plan, ref);
        const p = now && pointsOf(kind, now.thing)[0];
        if (!p) return plan;
        const next = [...p];
        next[axis] = value;
        return moveVertex(plan, ref, 0, next);
      });
    const east = box({ id: 'place-east', label: 'East', type: 'length', getUnits, onchange: (v) => set(0, v) });
    const north = box({ id: 'place-north', label: 'North', type: 'length', getUnits, onchange: (v) => set(1, v) });
    const up = KINDS[kind].heights
      ? box({ id: 'place-up', label: 'Height above the plan\u2019s zero', type: 'length', getUnits, onchange: (v) => set(2, v) }) : null;
    return {
      root: el('div', { class: 'halves' }, [east.root, north.root, up?.root]),
      /** @param {number[]} p @param {'m'|'ft'} units */
      show(p, units) {
        if (!p) return;
        east.show(p[0], units);
        north.show(p[1], units);
        up?.show(p[2] ?? 0, units);
      },
    };
  }

  /** What a mast of a height needs: rows by rising height. */
  function consentPart() {
    const list = el('div', { class: 'consents' });
    /** @param {(all: any[]) => any[]} make @param {string} label */
    const edit = (make, label) => store.edit(label, (plan) =>
      changeThing(plan, ref, (zone) => withField(zone, ['consents'], make(zone.consents ?? []).sort((a, b) => a.highest - b.highest))));
    let drawn = '';
    return {
      root: el('fieldset', { class: 'part' }, [
        el('legend', { text: 'What a mast here needs' }), list,
        link('Add a height', () => edit((all) => [...all, { highest: (all[all.length - 1]?.highest ?? 2) + 1, needs: 'none' }], 'Add a consent')),
      ]),
      /** @param {any} zone @param {'m'|'ft'} units */
      show(zone, units) {
        const all = zone.consents ?? [];
        const stamp = JSON.stringify(all) + units;
        if (stamp === drawn) return;
        drawn = stamp;
        list.replaceChildren(...all.map((/** @type {any} */ one, /** @type {number} */ i) => {
          const to = box({ id: `consent-${i}-to`, label: 'Up to', type: 'length', least: 0, getUnits,
            onchange: (v) => edit((now) => now.map((c, k) => (k === i ? { ...c, highest: v } : c)), 'Change a consent') });
          const needs = box({ id: `consent-${i}-needs`, label: 'needs', type: 'text', getUnits,
            onchange: (v) => edit((now) => now.map((c, k) => (k === i ? { ...c, needs: v } : c)), 'Change a consent') });
          to.show(one.highest, units);
          needs.show(one.needs, units);
          return el('div', { class: 'halves consent' }, [to.root, needs.root,
            link('Take out', () => edit((now) => now.filter((_, k) => k !== i), 'Take out a consent'), { 'aria-label': `Take out consent ${i + 1}` })]);
        }));
      },
    };
  }
}
