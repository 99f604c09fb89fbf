// @ts-check
/** Walls of a ring, or lengths of a path, as a table: what is typed moves the corner at their end. */
import { walls } from '../geometry/polygon.js';
import { along, direction, distance, tidyPoint } from '../geometry/vector.js';
import { moveVertex, removeVertex, setBoundaryRule } from '../state/edits.js';
import { find, KINDS, nameOf, pointsOf } from '../state/kinds.js';
import { formatDirection } from '../units/angle.js';
import { formatLength } from '../units/length.js';
import { el, link } from './el.js';
import { box, choice } from './fields.js';

/** @typedef {import('../state/store.js').Store} Store */

/** Rows shown before the rest is folded away. */
const MOST_ROWS = 40;

/**
 * @param {Store} store @param {string} ref
 * @returns {{root: HTMLElement, show: () => void}}
 */
export function wallTable(store, ref) {
  const found = find(store.get().plan, ref);
  if (!found) return { root: el('div'), show() {} };
  const { kind } = found;
  const closed = KINDS[kind].shape === 'ring';
  const heights = KINDS[kind].heights;
  const own = kind === 'boundary';
  const points = pointsOf(kind, found.thing);
  const getUnits = () => store.get().units;
  const name = nameOf(kind, found.thing, found.index);
  const rows = walls(points, closed).slice(0, MOST_ROWS).map((side) => makeRow(side.from));
  const last = heights && !closed ? [heightRow(points.length - 1)] : [];
  const corner = cornerLine();
  const agreed = own ? agreedPart(store) : null;
  const fourth = heights ? 'Height' : own ? 'Over it' : 'Corner';
  const table = el('table', { class: 'walls' }, [
    el('thead', {}, [el('tr', {}, [closed ? (kind === 'buildings' ? 'Wall' : 'Side') : 'Run', 'Length', 'Direction', fourth].map((text) => el('th', { scope: 'col', text })))]),
    el('tbody', {}, [...rows, ...last].map((r) => r.root)),
  ]);
  return {
    root: el('div', { class: 'walls-part' }, [table, agreed?.root, corner.root]),
    show() {
      const { plan, units } = store.get();
      const now = find(plan, ref);
      if (!now) return;
      const list = walls(pointsOf(kind, now.thing), closed);
      rows.forEach((row, i) => list[i] && row.show(list[i], pointsOf(kind, now.thing), units));
      last.forEach((row) => row.show(null, pointsOf(kind, now.thing), units));
      agreed?.show();
      corner.show();
    },
  };

  /** @param {number} i @returns {any} the rule of a side of the boundary */
  function ruleOf(i) {
    return (store.get().plan.boundaryRules ?? []).find((/** @type {any} */ r) => r.edge === i);
  }

  /** @param {number} i */
  function makeRow(i) {
    const key = `wall-${i}`;
    const words = `${name}, ${i + 1} to ${closed ? ((i + 1) % points.length) + 1 : i + 2}`;
    const lengthBox = box({
      id: `${key}-length`, label: `Length of ${words}`, type: 'length', bare: true, least: 0.01, getUnits,
      onchange: (value) => edit(`Set a length of ${name}`, i, (a, b) => along(a, direction(a, b), value), value),
    });
    const wayBox = box({
      id: `${key}-direction`, label: `Direction of ${words}`, type: 'direction', bare: true, getUnits,
      onchange: (value) => edit(`Set a direction of ${name}`, i, (a, b) => along(a, value, distance(a, b)), null, value),
    });
    const heightBox = heights ? box({
      id: `${key}-height`, label: `Height at point ${i + 1} of ${name}`, type: 'length', bare: true, least: 0, getUnits,
      onchange: (value) => setHeight(i, value),
    }) : null;
    const over = own ? choice({
      id: `${key}-over`, label: `What may hang over side ${i + 1}`, bare: true,
      options: [{ value: 'none', label: 'nothing' }, { value: 'ropes', label: 'ropes' }, { value: 'wires', label: 'wires' }],
      onchange: (overhang) => store.edit(`Say what may hang over side ${i + 1}`, (plan) => setBoundaryRule(plan, i, { ...ruleOf(i), overhang })),
    }) : null;
    const turn = el('td', { class: 'figure' });
    const row = el('tr', { onfocusin: () => pickVertex(i) }, [
      el('th', { scope: 'row', text: `${i + 1}–${closed ? ((i + 1) % points.length) + 1 : i + 2}` }),
      el('td', {}, [lengthBox.root]),
      el('td', {}, [wayBox.root]),
      heightBox || over ? el('td', {}, [heightBox?.root ?? over?.root]) : turn,
    ]);
    return {
      root: row,
      /** @param {any} side @param {number[][]} now @param {'m'|'ft'} units */
      show(side, now, units) {
        lengthBox.show(side.length, units);
        wayBox.show(side.direction, units);
        heightBox?.show(now[i][2] ?? 0, units);
        turn.textContent = side.turn === null ? '–' : formatDirection(side.turn).replace(/^0+(?=\d)/, '');
        if (over) over.show(ruleOf(i)?.overhang ?? 'none', units);
      },
    };
  }

  /** The height of a path's last point. @param {number} i */
  function heightRow(i) {
    const end = box({
      id: `wall-${i}-height`, label: `Height at point ${i + 1} of ${name}`, type: 'length', bare: true, least: 0, getUnits,
      onchange: (value) => setHeight(i, value),
    });
    return {
      root: el('tr', { onfocusin: () => pickVertex(i) }, [el('th', { scope: 'row', text: `at ${i + 1}` }), el('td', { colspan: 2 }), el('td', {}, [end.root])]),
      show: (/** @type {any} */ _, /** @type {number[][]} */ now, /** @type {'m'|'ft'} */ units) => end.show(now[i]?.[2] ?? 0, units),
    };
  }

  /** @param {number} i */
  function pickVertex(i) {
    if (store.get().selection?.vertex !== i) store.set({ selection: { ref, vertex: i } });
  }

  /** @param {number} i @param {number} value */
  function setHeight(i, value) {
    store.edit(`Set a height of ${name}`, (plan) => {
      const now = find(plan, ref);
      const p = now && pointsOf(kind, now.thing)[i];
      return p ? moveVertex(plan, ref, i, [p[0], p[1], value]) : plan;
    });
  }

  /**
   * Moves the corner at a wall's end; for the wall that closes the ring, the one at its start.
   * @param {string} label @param {number} i
   * @param {(a: number[], b: number[]) => number[]} to @param {number|null} length @param {number} [way]
   */
  function edit(label, i, to, length, way) {
    store.edit(label, (plan) => {
      const now = find(plan, ref);
      if (!now) return plan;
      const list = pointsOf(kind, now.thing);
      const j = (i + 1) % list.length;
      if (closed && j === 0) {
        const back = along(list[0], way !== undefined ? way + 180 : direction(list[0], list[i]), length ?? distance(list[0], list[i]));
        return moveVertex(plan, ref, i, tidyPoint(back));
      }
      return moveVertex(plan, ref, j, tidyPoint(to(list[i], list[j])));
    });
  }

  /** East and north of the selected corner. */
  function cornerLine() {
    const set = (/** @type {0|1} */ axis, /** @type {number} */ value) => {
      const { selection } = store.get();
      if (!selection || selection.vertex === null) return;
      const { vertex } = selection;
      store.edit(`Move a corner of ${name}`, (plan) => {
        const now = find(plan, ref);
        const p = now && pointsOf(kind, now.thing)[vertex];
        if (!p) return plan;
        return moveVertex(plan, ref, vertex, axis === 0 ? [value, p[1]] : [p[0], value]);
      });
    };
    const east = box({ id: 'corner-east', label: 'East', type: 'length', getUnits, onchange: (v) => set(0, v) });
    const north = box({ id: 'corner-north', label: 'North', type: 'length', getUnits, onchange: (v) => set(1, v) });
    const head = el('p', { class: 'corner-head' });
    const take = link('Take this corner out', () => {
      const { selection, plan } = store.get();
      if (!selection || selection.vertex === null) return;
      const next = removeVertex(plan, ref, selection.vertex);
      store.edit(`Take a corner from ${name}`, () => next);
      store.set({ selection: { ref, vertex: null } });
    });
    const root = el('div', { class: 'corner' }, [head, el('div', { class: 'halves' }, [east.root, north.root]), take]);
    return {
      root,
      show() {
        const { selection, plan, units } = store.get();
        const now = find(plan, ref);
        const p = now && selection?.ref === ref && selection.vertex !== null ? pointsOf(kind, now.thing)[selection.vertex] : null;
        root.hidden = !p;
        if (!p || !now || !selection) return;
        head.textContent = `Corner ${(selection.vertex ?? 0) + 1}`;
        take.hidden = pointsOf(kind, now.thing).length <= KINDS[kind].least;
        east.show(p[0], units);
        north.show(p[1], units);
      },
    };
  }
}

/** Who agreed to what may hang over a side. @param {Store} store */
function agreedPart(store) {
  const root = el('div', { class: 'agreed' });
  let drawn = '';
  return {
    root,
    show() {
      const rules = store.get().plan.boundaryRules ?? [];
      const stamp = JSON.stringify(rules);
      if (stamp === drawn) return;
      drawn = stamp;
      root.replaceChildren(...rules.map((/** @type {any} */ rule) => {
        const by = box({
          id: `agreed-${rule.edge}`, label: `${rule.overhang} over side ${rule.edge + 1}: agreed by`, type: 'text', optional: true,
          getUnits: () => store.get().units,
          onchange: (value) => store.edit('Say who agreed', (plan) => {
            const { agreedBy: _old, ...bare } = rule;
            return setBoundaryRule(plan, rule.edge, value === null ? bare : { ...bare, agreedBy: value });
          }),
        });
        by.show(rule.agreedBy, store.get().units);
        return by.root;
      }));
    },
  };
}

/** The walls of what is being drawn, only to read. @param {any} draft @param {'m'|'ft'} units @returns {HTMLElement} */
export function draftTable(draft, units) {
  const last = draft.points[draft.points.length - 1];
  const live = draft.at && !(last && distance(last, draft.at) < 1e-3);
  const points = live ? [...draft.points, draft.at] : draft.points;
  const list = points.length > 1 ? walls(points, false) : [];
  return el('table', { class: 'walls' }, [
    el('thead', {}, [el('tr', {}, [draft.shape === 'ring' ? (draft.kind === 'buildings' ? 'Wall' : 'Side') : 'Run', 'Length', 'Direction', 'Corner'].map((text) => el('th', { scope: 'col', text })))]),
    el('tbody', {}, list.map((side, i) => el('tr', { class: i === list.length - 1 && live ? 'live' : null }, [
      el('th', { scope: 'row', text: `${i + 1}–${i + 2}` }),
      el('td', { class: 'figure', text: formatLength(side.length, units, 2) }),
      el('td', { class: 'figure', text: formatDirection(side.direction) }),
      el('td', { class: 'figure', text: side.turn === null ? '–' : formatDirection(side.turn).replace(/^0+(?=\d)/, '') }),
    ]))),
  ]);
}
