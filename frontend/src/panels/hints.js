// @ts-check
/** Three short hints on a first visit, the notice about the plot, and the buttons on the plan. */
import { mark } from '../draw/mark.js';
import { things } from '../state/kinds.js';
import { button, el, link } from './el.js';

const HINTS = [
  'This is a demo plot, ready to search. Click anything on it to see and change its figures.',
  'The places at the top go in order: survey the plot, say what the station must do, get placements, take the sheet.',
  'Your own plot: click the plot\u2019s name at the top, then New plot. Begin with the boundary.',
];

/**
 * @param {HTMLElement} root the plan's box
 * @param {import('../state/store.js').Store} store
 * @param {any} shell
 */
export function mount(root, store, shell) {
  const hint = el('div', { class: 'hint', role: 'note', 'aria-label': 'Hint' });
  const notice = el('div', { class: 'notice', role: 'alert' });
  const empty = el('p', { class: 'empty' });
  root.append(
    el('div', { class: 'plan-buttons', role: 'group', 'aria-label': 'View of the plan' }, [
      button('+', () => shell.zoom(1 / 1.4), { 'aria-label': 'Nearer', title: 'Nearer (+)' }),
      button('−', () => shell.zoom(1.4), { 'aria-label': 'Farther', title: 'Farther (−)' }),
      button('All', () => shell.planView.fit(), { 'aria-label': 'All of the plot', title: 'All of it (0)' }),
    ]),
    hint, notice, empty,
  );
  // The first hint speaks of the demo plot, so on an empty one it gives way to the words in the middle of the plan.
  store.subscribe((s) => [s.hint, s.place, things(s.plan).length === 0], () => {
    const { hint: n } = store.get();
    hint.hidden = n === 0 || store.get().place !== 'survey' || things(store.get().plan).length === 0;
    if (n === 0) return;
    hint.replaceChildren(
      el('p', { text: HINTS[n - 1] }),
      el('div', { class: 'hint-foot' }, [
        el('span', { text: `${n} of ${HINTS.length}` }),
        n < HINTS.length ? link('Next', () => store.set({ hint: n + 1 })) : null,
        link('Put the hints away', () => store.set({ hint: 0 })),
      ]),
    );
  });
  store.subscribe((s) => [s.notice, s.clash], () => {
    const { notice: text, clash } = store.get();
    notice.hidden = !text;
    notice.replaceChildren(mark('foul'), el('p', { text: text ?? '' }),
      clash ? link('Open the other one', () => shell.keeper.open(clash)) : '',
      link('Put away', () => store.set({ notice: null, clash: null })));
  });
  store.subscribe((s) => [s.plan, s.draft, s.place], () => {
    const { plan, draft, place } = store.get();
    const bare = store.get().opened > 0 && things(plan).length === 0 && !draft && place === 'survey';
    empty.hidden = !bare;
    empty.replaceChildren('Begin with the boundary: ', link('take its tool', () => shell.desk.take('boundary')),
      ', click the first corner, type the length of the first side and press Enter.');
  });
}
