// @ts-check
/**
 * The small box by the cursor while drawing: digits go to the length, Tab to the direction, Enter
 * sets the corner, Backspace in an empty box takes one back, C closes. On a narrow screen it stands
 * at the foot of the plan.
 */
import { direction, distance, same } from '../geometry/vector.js';
import { formatDirection } from '../units/angle.js';
import { formatLength } from '../units/length.js';
import { button, el } from './el.js';

/**
 * @param {HTMLElement} root the plan's box
 * @param {import('../state/store.js').Store} store
 * @param {any} shell
 */
export function mount(root, store, shell) {
  const reason = el('p', { class: 'cursor-box-reason' });
  const fields = el('div', { class: 'cursor-box-fields' });
  const hand = el('div', { class: 'cursor-box-hand' });
  const panel = el('div', { class: 'cursor-box', role: 'group', 'aria-label': 'Length and direction of what is being drawn', hidden: true }, [fields, reason, hand]);
  root.append(panel);
  /** @type {Map<string, {input: HTMLInputElement, label: HTMLElement}>} */
  let boxes = new Map();
  let made = '';
  let count = 0;

  /** @param {any} draft @param {'m'|'ft'} units */
  function build(draft, units) {
    const stamp = `${draft.tool} ${draft.fields.map((/** @type {any} */ f) => f.name).join()} ${units}`;
    if (stamp === made) return;
    made = stamp;
    boxes = new Map();
    fields.replaceChildren(...draft.fields.map((/** @type {any} */ field) => {
      const label = el('label', { for: `typing-${field.name}`, text: `${field.label}${field.unit === 'direction' ? (store.get().plan.site?.planNorth ? ', plan' : '') : units === 'm' ? ', m' : ', ft'}` });
      const input = el('input', { id: `typing-${field.name}`, type: 'text', inputmode: field.unit === 'direction' || units === 'ft' ? 'text' : 'decimal', autocomplete: 'off', spellcheck: 'false' });
      input.addEventListener('input', () => shell.desk.type(field.name, input.value));
      input.addEventListener('focus', () => input.select());
      input.addEventListener('keydown', (/** @type {KeyboardEvent} */ event) => key(event, input));
      boxes.set(field.name, { input, label });
      return el('div', { class: 'cursor-box-field' }, [label, input]);
    }));
    hand.replaceChildren(...(draft.shape === 'tapes'
      ? [handButton('Set', 'Enter')]
      : draft.shape === 'point' ? [] : [
          handButton('Set corner', 'Enter'), handButton('Back', 'Backspace'),
          handButton(draft.shape === 'ring' ? 'Close' : 'End', 'c'),
          ...(draft.kind ? [button('Two tapes', () => shell.desk.take('twotapes'))] : []),
        ]));
  }

  /** @param {string} text @param {string} name */
  const handButton = (text, name) => button(text, () => shell.desk.key(plain(name)));

  /** @param {KeyboardEvent} event @param {HTMLInputElement} input */
  function key(event, input) {
    const empty = input.value === '';
    const told = event.key === 'Enter' || event.key === 'Escape' || (empty && ['Backspace', 'c', 'C'].includes(event.key));
    if (event.ctrlKey && ['z', 'y'].includes(event.key.toLowerCase())) return;
    event.stopPropagation();
    if (!told) return;
    event.preventDefault();
    if (event.key === 'Escape') {
      store.set({ draft: { ...store.get().draft, focus: null, typed: cleared(store.get().draft.typed) } });
      shell.planView.root.focus();
      return;
    }
    shell.desk.key(plain(event.key));
  }

  function show() {
    const { draft, units, place } = store.get();
    const on = place === 'survey' && draft && draft.fields?.length > 0 && (draft.points.length > 0 || draft.shape === 'point');
    panel.hidden = !on;
    if (!on) {
      made = '';
      return;
    }
    build(draft, units);
    const last = draft.points[draft.points.length - 1];
    const live = last && draft.at && !same(last, draft.at);
    for (const [name, { input }] of boxes) {
      const typed = draft.typed[name] ?? '';
      if (input.value !== typed) input.value = typed;
      input.placeholder = name === 'length' ? (live ? formatLength(distance(last, draft.at), units, 2) : '')
        : name === 'direction' ? (live ? formatDirection(direction(last, draft.at)) : '') : '';
      input.parentElement?.classList.toggle('on', draft.focus === name);
    }
    reason.textContent = draft.reason || '\u00a0';
    const fresh = draft.points.length !== count;
    count = draft.points.length;
    if (draft.focus && boxes.has(draft.focus)) {
      const { input } = /** @type {any} */ (boxes.get(draft.focus));
      if (document.activeElement !== input && (fresh || !panel.contains(document.activeElement))) {
        input.focus();
        input.setSelectionRange(input.value.length, input.value.length);
      }
    }
    stand(draft);
  }

  /** Beside the cursor, on the side where nothing is being drawn; inside the frame. @param {any} draft */
  function stand(draft) {
    const frame = shell.planView.frame();
    const narrow = frame.width < 560;
    panel.classList.toggle('at-foot', narrow);
    if (narrow) {
      panel.style.left = '';
      panel.style.top = '';
      return;
    }
    const at = draft.at ?? draft.points[draft.points.length - 1];
    if (!at) return;
    const [x, y] = shell.planView.toScreen(at);
    const { offsetWidth: w, offsetHeight: h } = panel;
    const right = x + 36 + w < frame.left + frame.width;
    const left = right ? x + 36 : x - 36 - w;
    const top = Math.min(Math.max(frame.top + 8, y - h - 28), frame.top + frame.height - h - 8);
    panel.style.left = `${Math.max(frame.left + 8, left)}px`;
    panel.style.top = `${top}px`;
  }

  store.subscribe((s) => [s.draft, s.units, s.place], show);
  shell.planView.onView(() => {
    if (!panel.hidden) show();
  });
}

/** @param {string} key */
const plain = (key) => ({ key, shift: false, ctrl: false, alt: false });

/** @param {Record<string, string>} typed */
const cleared = (typed) => ({ ...typed, length: '', direction: '' });
