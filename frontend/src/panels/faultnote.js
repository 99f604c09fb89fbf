// @ts-check
/**
 * The fault at hand beside the place it speaks of, tied to its ring by a leader: that of the
 * selected thing, else the first that has a place in sight. All faults stand in the panel as well.
 */
import { curesFor, placeOf } from '../state/cures.js';
import { mark } from '../draw/mark.js';
import { el, link } from './el.js';

const GAP = 34;
const RING = 12;

/**
 * @param {HTMLElement} root the plan's box
 * @param {import('../state/store.js').Store} store
 * @param {any} shell
 */
export function mount(root, store, shell) {
  const leader = el('span', { class: 'fault-leader', 'aria-hidden': 'true' });
  const words = el('div', { class: 'fault' });
  const note = el('div', { class: 'fault-note', role: 'note', 'aria-label': 'Fault', hidden: true }, [leader, words]);
  root.append(note);
  /** @type {number[]|null} */
  let at = null;

  function show() {
    const { plan, faults, place, selection, draft } = store.get();
    const placed = place === 'survey' && !draft
      ? faults.map((fault) => ({ fault, where: placeOf(plan, fault) })).filter((one) => one.where !== null && inSight(one.where.at)) : [];
    const own = placed.find((one) => one.where?.ref === selection?.ref) ?? placed[0];
    at = own?.where?.at ?? null;
    if (!own) {
      note.hidden = true;
      return;
    }
    words.replaceChildren(
      el('p', {}, [mark('foul'), ' ', el('span', { text: own.fault.message })]),
      el('p', { class: 'fault-cures' }, curesFor(plan, own.fault).map((cure) => link(cure.label, () => store.edit(cure.label, cure.change)))),
    );
    stand();
  }

  /** @param {number[]} p */
  function inSight(p) {
    const frame = shell.planView.frame();
    const [x, y] = shell.planView.toScreen(p);
    return x > frame.left && x < frame.left + frame.width && y > frame.top && y < frame.top + frame.height;
  }

  function stand() {
    const frame = shell.planView.frame();
    note.hidden = !at || frame.width < 640 || !inSight(at);
    if (note.hidden || !at) return;
    const [x, y] = shell.planView.toScreen(at);
    const { offsetWidth: w, offsetHeight: h } = note;
    const right = x + GAP + w < frame.left + frame.width - 8;
    const top = Math.min(Math.max(frame.top + 8, y - 16), frame.top + frame.height - h - 8);
    note.classList.toggle('to-left', !right);
    note.style.left = `${right ? x + GAP : x - GAP - w}px`;
    note.style.top = `${top}px`;
    leader.style.top = `${Math.min(h - 2, Math.max(2, y - top))}px`;
    leader.style.width = `${GAP - RING}px`;
  }

  store.subscribe((s) => [s.faults, s.place, s.selection?.ref, s.draft], show);
  shell.planView.onView(() => {
    if (store.get().faults.length) show();
  });
}
