// @ts-check
/**
 * Survey, right: what is being drawn, or the figures of what is selected, or the plot itself; then
 * the faults as sentences and the ledger "On this plot".
 */
import { area } from '../geometry/polygon.js';
import { curesFor, placeOf } from '../state/cures.js';
import { find, KINDS, nameOf, pointsOf, things } from '../state/kinds.js';
import { ledger, nextStep, plotArea } from '../state/ledger.js';
import { mark } from '../draw/mark.js';
import { shortFigures } from '../draw/words.js';
import { area as areaText, lengthWithUnit } from '../units/length.js';
import { el, link, renew } from './el.js';
import { pick } from './fields.js';
import { figures } from './surveyfigures.js';
import { site } from './surveysite.js';
import { trace } from './surveytrace.js';
import { draftTable } from './surveywalls.js';

/** @typedef {import('../state/store.js').Store} Store */

/**
 * @param {HTMLElement} root
 * @param {Store} store
 * @param {any} shell
 */
export function mount(root, store, shell) {
  root.classList.add('survey');
  const top = el('div', { class: 'survey-top' });
  const faultPart = el('section', { class: 'survey-faults', 'aria-label': 'Faults' });
  const rowsPart = el('div');
  const areaPart = el('span', { class: 'ledger-area' });
  const next = el('p', { class: 'next-step' });
  const listHead = el('summary');
  const listRows = el('ul', { class: 'listing-rows' });
  const list = el('details', { class: 'listing', ontoggle: () => showListing() }, [listHead, listRows]);
  const plot = site(store);
  root.append(
    top, faultPart,
    el('section', { class: 'ledger', 'aria-labelledby': 'ledger-head' }, [
      el('div', { class: 'section-head' }, [el('h2', { id: 'ledger-head', text: 'On this plot' }), areaPart]), rowsPart, next, list,
    ]),
    plot.root,
    trace(store, shell),
  );

  /** @type {{key: string, show: () => void}} */
  let shown = { key: '', show() {} };

  function showTop() {
    const { plan, selection, draft, tool, units } = store.get();
    const found = selection && find(plan, selection.ref);
    const drawing = draft && draft.shape !== 'drag' ? draft : null;
    if (drawing) {
      const key = `draft ${tool} ${JSON.stringify([drawing.points, drawing.at, drawing.variant, drawing.tapes, units])}`;
      if (key !== shown.key) {
        shown = { key, show() {} };
        renew(top, drawingPart(drawing, store));
      }
      return;
    }
    if (found && selection) {
      const points = pointsOf(found.kind, found.thing).length;
      const key = `figures ${selection.ref} ${points}`;
      if (key !== shown.key) {
        const part = figures(store, shell, selection.ref);
        shown = { key, show: part.show };
        top.replaceChildren(part.root);
      }
      shown.show();
      return;
    }
    if (shown.key !== 'none') {
      shown = { key: 'none', show() {} };
      top.replaceChildren();
    }
  }

  function showFaults() {
    const { faults, plan } = store.get();
    const words = faults.filter((f) => !missing(f, plan));
    faultPart.hidden = words.length === 0;
    faultPart.replaceChildren(...words.slice(0, 20).map((fault) => faultRow(fault, store)),
      words.length > 20 ? el('p', { class: 'panel-note', text: `and ${words.length - 20} more` }) : '');
  }

  function showLedger() {
    const { plan, faults, units } = store.get();
    areaPart.textContent = plotArea(plan) ? areaText(plotArea(plan), units) : '';
    renew(rowsPart, [el('table', { class: 'ledger-table' }, [el('tbody', {}, ledger(plan, faults, (m) => lengthWithUnit(m, units)).map((row) =>
      el('tr', { class: `ledger-${row.state}` }, [
        el('th', { scope: 'row' }, [
          row.tool === 'site'
            ? link(row.what, openSite, { 'data-key': row.what })
            : link(row.what, () => shell.desk.take(row.tool), { title: 'Take the tool', 'data-key': row.what }),
        ]),
        el('td', { text: row.held }),
        el('td', { class: 'ledger-mark' }, stateMark(row)),
      ])))])]);
    const step = nextStep(plan, faults);
    next.replaceChildren(step ?? '', ...(step ? [] : [
      el('span', { text: 'This plot can be searched. ' }), link('Say what the station must do', () => shell.go('brief'))]));
    next.classList.toggle('ready', !step);
    showListing();
    plot.show();
  }

  /** The list is made only while it is open: a plot can hold hundreds. */
  function showListing() {
    const { plan, units, selection } = store.get();
    const all = things(plan);
    listHead.textContent = `Everything drawn, ${all.length}`;
    renew(listRows, (list.open ? all : []).map(({ ref, kind, thing, index }) =>
      el('li', {}, [el('button', {
        type: 'button', class: 'listing-row', 'data-key': ref, 'aria-pressed': String(selection?.ref === ref),
        onclick: () => {
          if (store.get().tool !== 'select') shell.desk.take('select');
          store.set({ selection: { ref, vertex: null } });
        },
        onmouseenter: () => store.set({ hovered: ref }), onmouseleave: () => store.set({ hovered: null }),
      }, [el('span', { text: nameOf(kind, thing, index) }), el('span', { class: 'listing-figures', text: shortFigures(kind, thing, units) })])])));
  }

  function openSite() {
    plot.root.setAttribute('open', '');
    plot.root.scrollIntoView({ block: 'start' });
    plot.root.querySelector('summary')?.focus();
  }

  store.subscribe((s) => [s.plan, s.selection, s.draft, s.tool, s.units, s.place], () => {
    if (store.get().place === 'survey') showTop();
  });
  store.subscribe((s) => [s.faults, s.plan], showFaults);
  let pending = 0;
  store.subscribe((s) => [s.plan, s.faults, s.units, s.selection?.ref], () => {
    if (!pending) {
      pending = requestAnimationFrame(() => {
        pending = 0;
        showLedger();
      });
    }
  });
}

/** A fault that only says that something is still to be drawn: the ledger says it better. @param {any} fault @param {any} plan */
const missing = (fault, plan) => !placeOf(plan, fault) && ['boundary', 'entry', 'supports'].includes(fault.path.replace(/[$/]/g, ''));

/** @param {import('../state/ledger.js').Row} row @returns {(Node|string)[]} */
function stateMark(row) {
  if (row.state === 'fault') return [mark('foul'), el('span', { class: 'foul', text: ` ${row.faults} ${row.faults === 1 ? 'fault' : 'faults'}` })];
  if (row.state === 'held') return [mark('clear'), el('span', { class: 'visually-hidden', text: 'held' })];
  if (row.state === 'lacks') return [mark('tight'), el('span', { class: 'tight', text: ' needed' })];
  return [el('span', { class: 'may', text: 'if any' })];
}

/** @param {any} fault @param {Store} store */
function faultRow(fault, store) {
  const { plan } = store.get();
  const where = placeOf(plan, fault);
  const cures = curesFor(plan, fault);
  return el('div', { class: 'fault' }, [
    el('p', {}, [mark('foul'), ' ', el('span', { text: fault.message })]),
    el('p', { class: 'fault-cures' }, [
      where ? link('Show it', () => store.set({ selection: { ref: where.ref, vertex: where.vertex }, tool: 'select', draft: null })) : null,
      ...cures.map((cure) => link(cure.label, () => store.edit(cure.label, cure.change))),
    ]),
  ]);
}

/** The head of the panel while a tool is in hand. @param {any} draft @param {Store} store @returns {(Node|string)[]} */
function drawingPart(draft, store) {
  const { units } = store.get();
  const kind = draft.kind ? KINDS[draft.kind].one : draft.shape === 'tapes' ? 'point by two tapes' : draft.tool === 'scale' ? 'scale of the picture' : 'tape';
  const title = kind.charAt(0).toUpperCase() + kind.slice(1);
  const ring = draft.at ? [...draft.points, draft.at] : draft.points;
  const parts = [
    el('p', { class: 'panel-kind', text: draft.shape === 'point' ? 'To be placed' : draft.points.length ? 'Being drawn' : 'To be drawn' }),
    el('h2', { class: 'panel-head', text: title }),
  ];
  if (draft.tool === 'supports') {
    const kinds = pick({
      id: 'draft-kind', label: 'Kind',
      options: ['tree', 'mast', 'pole', 'chimney', 'wall', 'other'].map((value) => ({ value, label: value })),
      onchange: (variant) => store.set({ draft: { ...store.get().draft, variant } }),
    });
    kinds.show(draft.variant ?? 'mast', units);
    parts.push(kinds.root);
  }
  if (draft.shape === 'point') parts.push(el('p', { class: 'panel-note', text: 'Click its place, or press the arrow keys and Enter. Shift and click places more than one.' }));
  else if (draft.shape === 'tapes') parts.push(tapesNote(draft, units));
  else {
    parts.push(draftTable(draft, units));
    if (draft.shape === 'ring' && ring.length > 2) parts.push(el('p', { class: 'panel-note', text: `Closed here it has ${areaText(area(ring), units)}.` }));
    if (!draft.points.length) parts.push(el('p', { class: 'panel-note', text: 'Click the first corner, or press the arrow keys and Enter.' }));
  }
  return parts;
}

/** @param {any} draft @param {'m'|'ft'} units */
function tapesNote(draft, units) {
  const { gap, answers, angle } = draft.tapes;
  const text = gap > 0
    ? `These two tapes do not meet: ${lengthWithUnit(gap, units, 2)} is missing. Measure again.`
    : answers.length
      ? `Two places fit. Point at the right one and click.${angle !== null && (angle < 30 || angle > 150) ? ' The tapes cross flatly here: a small error in one moves the point far.' : ''}`
      : draft.points.length < 2
        ? `Point at the ${draft.points.length ? 'second' : 'first'} place you measured from: a corner, a datum, a support.`
        : 'Type both tape lengths.';
  return el('p', { class: gap > 0 ? 'panel-note foul' : 'panel-note', text });
}
