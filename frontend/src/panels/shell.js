// @ts-check
/** Head and foot of the page: places, the plot's name, saved, undo and redo, units; what to do next. */
import { svg } from '../draw/svg.js';
import { mark } from '../draw/mark.js';
import { number } from '../units/figures.js';
import { clock } from '../units/figures.js';
import { formatLength, lengthWithUnit } from '../units/length.js';
import { button, el } from './el.js';

/** @typedef {import('../state/store.js').Store} Store */

export const PLACES = /** @type {const} */ (['survey', 'brief', 'placements', 'sheet']);

/** @returns {SVGElement} two posts and the wire between them */
const sign = () => svg('svg', { class: 'sign', viewBox: '0 0 32 20', width: 30, height: 19, 'aria-hidden': 'true' }, [
  svg('path', { d: 'M3 19V2M29 19V5', class: 'sign-post' }), svg('path', { d: 'M3 3C11 12 21 13 29 6', class: 'sign-wire' }),
]);

/** @param {{brand: HTMLElement, places: HTMLElement, state: HTMLElement}} roots @param {Store} store @param {any} shell */
export function mountHead(roots, store, shell) {
  roots.brand.append(sign(), el('h1', { class: 'brand-name', text: 'Spanwright' }));
  const links = PLACES.map((place, i) =>
    el('a', { href: `#${place}`, class: 'place', 'data-place': place }, [
      el('span', { class: 'place-number', text: String(i + 1) }), el('span', { class: 'place-name', text: place.charAt(0).toUpperCase() + place.slice(1) }),
    ]));
  roots.places.append(...links);
  const title = button('', () => store.get().opened > 0 && shell.plots(), { class: 'plot-name', 'aria-haspopup': 'dialog', title: 'Plots: open, new, copy, import' });
  const saved = el('span', { class: 'saved', role: 'status' });
  const undo = button('Undo', () => store.undo(), { class: 'plain', 'aria-keyshortcuts': 'Control+Z' });
  const redo = button('Redo', () => store.redo(), { class: 'plain', 'aria-keyshortcuts': 'Control+Shift+Z' });
  const units = el('fieldset', { class: 'units' }, [
    el('legend', { class: 'visually-hidden', text: 'Units' }),
    ...(/** @type {const} */ (['m', 'ft'])).map((value) => el('label', {}, [
      el('input', { type: 'radio', name: 'units', value, onchange: () => store.set({ units: value }) }), el('span', { text: value })])),
  ]);
  roots.state.append(title, el('span', { class: 'spread' }), saved, undo, redo, units);

  store.subscribe((s) => s.place, (place) => {
    for (const one of links) {
      if (one.dataset.place === place) one.setAttribute('aria-current', 'page');
      else one.removeAttribute('aria-current');
    }
    document.body.dataset.place = place;
    document.title = `${store.get().plan.title || 'Plot'}: ${place}, Spanwright`;
  });
  store.subscribe((s) => s.plan.title, (name) => {
    title.textContent = name || 'Plot without a name';
    document.title = `${name || 'Plot'}: ${store.get().place}, Spanwright`;
  });
  store.subscribe((s) => s.units, (now) => {
    for (const input of units.querySelectorAll('input')) input.checked = input.value === now;
  });
  store.subscribe((s) => [s.undoLabel, s.redoLabel], ([back, forth]) => {
    said(undo, 'Undo', back);
    said(redo, 'Redo', forth);
  });
  store.subscribe((s) => s.saved, (state) => {
    const since = clock(state.at);
    const [look, text] = {
      saved: ['clear', since ? `Saved ${since}` : 'Saved'],
      saving: ['', 'Saving'],
      unsaved: ['', 'Not saved yet'],
      offline: ['foul', since ? `Not saved since ${since}; still yours here` : 'Not saved; still yours here'],
      conflict: ['tight', 'Kept as a copy'],
    }[state.state];
    saved.replaceChildren(...(look ? [mark(/** @type {'clear'} */ (look)), ' '] : []), el('span', { class: 'saved-text', text }));
    saved.dataset.state = state.state;
  });
}

/** @param {HTMLButtonElement} element @param {string} word @param {string|null} label */
function said(element, word, label) {
  element.setAttribute('aria-disabled', String(!label));
  element.title = label ? `${word}: ${label.charAt(0).toLowerCase()}${label.slice(1)}` : `Nothing to ${word.toLowerCase()}`;
}

/** @param {HTMLElement} root @param {Store} store @param {any} shell */
export function mountFoot(root, store, shell) {
  const doing = el('span', { class: 'foot-doing' });
  const at = el('span', { class: 'foot-at' });
  const scale = el('span', { class: 'foot-scale' });
  const snap = el('span', { class: 'foot-snap' });
  root.append(doing, el('span', { class: 'spread' }), snap, at, scale);
  store.subscribe((s) => s.place, (place) => {
    scale.hidden = place === 'sheet';
  });
  store.subscribe((s) => [s.draft, s.tool, s.selection, s.place], () => {
    const { draft, tool, selection, place } = store.get();
    doing.replaceChildren(...(place === 'survey' ? doingWords(draft, tool, selection, shell) : []));
    snap.textContent = place === 'survey' && tool !== 'select' ? 'Alt holds snapping off' : '';
  });
  store.subscribe((s) => [s.cursor, s.units, s.place], () => {
    const { cursor, units, place } = store.get();
    at.textContent = cursor && place === 'survey'
      ? `${cursor.reason ? `${cursor.reason}   ` : ''}E ${formatLength(cursor.point[0], units, 1)}  N ${lengthWithUnit(cursor.point[1], units)}` : '';
  });
  shell.planView.onView((/** @type {any} */ sight) => {
    // A CSS pixel is 1/96 inch.
    const ratio = 96 / 0.0254 / sight.ppm;
    scale.textContent = `1 : ${number(ratio < 100 ? Math.round(ratio) : Math.round(ratio / 10) * 10, 0)} on this screen`;
  });
}

/** @param {any} draft @param {string} tool @param {any} selection @param {any} shell @returns {(Node|string)[]} */
function doingWords(draft, tool, selection, shell) {
  const label = shell.strip.find((/** @type {any} */ t) => t.name === tool)?.label ?? '';
  if (tool === 'scale') return [el('b', { text: 'Scale of the picture' }), el('span', { class: 'foot-key', text: 'click two of its points' }), el('span', { class: 'foot-key', text: 'type their true distance, Enter' })];
  const keys = (/** @type {string[]} */ ...list) => list.map((text) => el('span', { class: 'foot-key', text }));
  if (draft?.shape === 'ring' || draft?.shape === 'path') {
    const n = draft.points.length + 1;
    const close = draft.shape === 'ring' ? 'C closes' : draft.kind ? 'C ends it' : 'C puts it away';
    return [el('b', { text: `${label}, ${draft.shape === 'ring' ? 'corner' : 'point'} ${n}` }),
      ...(n > 1 ? keys('type a length, Tab, a direction', 'Enter sets it', 'Backspace takes one back', close) : keys('click where it begins', 'Escape puts the tool away'))];
  }
  if (draft?.shape === 'point') return [el('b', { text: label }), ...keys('click its place', 'Escape puts the tool away')];
  if (draft?.shape === 'tapes') return [el('b', { text: label }), ...keys('point at a known place', 'type its tape', 'Enter takes the answer')];
  if (selection) {
    return [el('b', { text: 'Selected' }), ...keys('arrows move 0.1 m, with Shift 1 m', 'drag a corner', '[ and ] pick a corner', 'Delete')];
  }
  return keys('Click a thing for its figures', 'wheel or + and − for nearer and farther', '0 shows all');
}
