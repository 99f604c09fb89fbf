// @ts-check
/** The plots that are kept: open, new, copy, delete (undo brings it back), export, import, demo plots. */
import { clock } from '../units/figures.js';
import { button, el, link } from './el.js';

/**
 * @param {import('../state/store.js').Store} store
 * @param {any} keeper opens, makes and deletes plots (see state/keeper.js)
 * @param {(sentence: string) => void} say
 * @returns {{root: HTMLElement, open: () => void}}
 */
export function createPlots(store, keeper, say) {
  const rows = el('ul', { class: 'plots-rows' });
  const demos = el('ul', { class: 'plots-rows' });
  const told = el('p', { class: 'panel-note', role: 'status' });
  const file = el('input', { type: 'file', accept: '.json,application/json', class: 'visually-hidden', id: 'plot-file', tabindex: -1, 'aria-label': 'Plan file to import' });
  file.addEventListener('change', () => {
    const [one] = file.files ?? [];
    file.value = '';
    if (one) act(async () => keeper.take(await one.text(), one.name));
  });
  const dialog = /** @type {HTMLDialogElement} */ (el('dialog', { class: 'plots', 'aria-labelledby': 'plots-head' }, [
    el('div', { class: 'plots-top' }, [el('h2', { id: 'plots-head', class: 'panel-head', text: 'Plots' }), button('Close', () => dialog.close(), { class: 'plain' })]),
    el('div', { class: 'panel-actions' }, [
      button('New plot', () => act(() => keeper.begin()), { class: 'strong' }),
      link('Copy this plot', () => act(() => keeper.copy())),
      link('Import a file', () => file.click()),
      link('Export this plot', () => save(store.get().plan)),
      file,
    ]),
    told,
    el('h3', { text: 'Kept here' }), rows,
    el('h3', { text: 'To try things on' }), demos,
  ]));

  /** @param {() => Promise<any>} work */
  async function act(work) {
    told.textContent = '';
    try {
      const sentence = await work();
      if (typeof sentence === 'string') told.textContent = sentence;
      else dialog.close();
    } catch (problem) {
      told.textContent = problem instanceof Error ? problem.message : String(problem);
    }
  }

  /** @type {{id: string, plan: any}|null} */
  let gone = null;

  /** @param {any} entry */
  async function drop(entry) {
    await act(async () => {
      gone = { id: entry.id, plan: await keeper.drop(entry.id) };
      say(`${entry.title} deleted.`);
      return ' ';
    });
    if (gone) {
      const back = gone;
      told.replaceChildren(`${entry.title || 'The plot'} is deleted. `, link('Bring it back', () => act(async () => {
        await keeper.restore(back.plan, back.id);
        gone = null;
        return `${entry.title || 'The plot'} is back.`;
      })));
    }
  }

  store.subscribe((s) => [s.plots, s.planId], () => {
    const { plots, planId } = store.get();
    rows.replaceChildren(...(plots.length ? plots.map((entry) => el('li', {}, [
      el('button', { type: 'button', class: 'plots-open', 'aria-current': entry.id === planId ? 'true' : null, onclick: () => act(() => keeper.open(entry.id)) }, [
        el('span', { text: entry.title || 'Plot without a name' }),
        el('span', { class: 'listing-figures', text: entry.id === planId ? 'open now' : when(entry.savedAt) }),
      ]),
      link('Delete', () => drop(entry), { 'aria-label': `Delete ${entry.title || 'plot'}` }),
    ])) : [el('li', { class: 'panel-note', text: 'None yet. A plot is kept as soon as you draw on it.' })]));
  });
  store.subscribe((s) => s.demos, (list) => {
    demos.replaceChildren(...list.map((demo) => el('li', {}, [
      el('button', { type: 'button', class: 'plots-open', onclick: () => act(() => keeper.demo(demo.name)) }, [el('span', { text: demo.title })]),
    ])));
  });

  return {
    root: dialog,
    open() {
      told.textContent = '';
      keeper.list();
      dialog.showModal();
    },
  };
}

/** @param {string|undefined} iso */
function when(iso) {
  if (!iso) return '';
  const date = new Date(iso);
  if (Number.isNaN(date.getTime())) return '';
  const today = new Date().toDateString() === date.toDateString();
  return today ? clock(iso) : date.toISOString().slice(0, 10);
}

/** @param {any} plan offers the plan as a file */
function save(plan) {
  const address = URL.createObjectURL(new Blob([`${JSON.stringify(plan, null, 2)}\n`], { type: 'application/json' }));
  const name = (plan.title || 'plot').toLowerCase().replace(/[^a-z0-9]+/g, '-').replace(/^-|-$/g, '') || 'plot';
  const anchor = el('a', { href: address, download: `${name}.json` });
  document.body.append(anchor);
  anchor.click();
  anchor.remove();
  setTimeout(() => URL.revokeObjectURL(address), 10000);
}
