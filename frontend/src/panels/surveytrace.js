// @ts-check
/** Tracing over a picture: load it, set its scale by two points, turn and fade it, take it away. */
import { el, link } from './el.js';
import { box } from './fields.js';

/** Longest side kept, pixels: enough to trace by, and little enough to move smoothly. */
const LONGEST = 3000;

/**
 * @param {import('../state/store.js').Store} store
 * @param {any} shell `pictures` keeps them (api/pictures.js)
 * @returns {HTMLElement}
 */
export function trace(store, shell) {
  const getUnits = () => store.get().units;
  const file = el('input', { type: 'file', id: 'trace-file', accept: 'image/png,image/jpeg,image/webp', class: 'visually-hidden', tabindex: -1, 'aria-label': 'Picture to trace over' });
  const told = el('p', { class: 'panel-note', role: 'status' });
  const fade = el('input', { type: 'range', id: 'trace-fade', min: '0.1', max: '1', step: '0.05' });
  const turn = box({ id: 'trace-turn', label: 'Turned by', type: 'direction', getUnits, onchange: (v) => change({ turn: v }) });
  const width = box({ id: 'trace-width', label: 'Picture is wide', type: 'length', least: 0.1, getUnits, onchange: (v) => change({ width: v }) });
  const own = el('div', { class: 'trace-own' }, [
    link('Set its scale by two points', () => shell.desk.take('scale')),
    el('div', { class: 'halves' }, [width.root, turn.root]),
    el('div', { class: 'slot' }, [el('label', { for: 'trace-fade', text: 'How strongly it shows' }), fade]),
    link('Take the picture away', () => {
      store.set({ trace: null });
      shell.pictures.drop(key()).catch(() => {});
    }),
  ]);
  const root = el('details', { class: 'site' }, [
    el('summary', { text: 'Trace over a picture' }),
    el('p', { class: 'panel-note', text: 'A plan, a map or a photograph from above. It stays in this browser.' }),
    link('Choose a picture', () => file.click()), file, told, own,
  ]);
  const key = () => store.get().planId ?? 'new';

  /** @param {any} patch */
  function change(patch) {
    const now = store.get().trace;
    if (now) store.set({ trace: { ...now, ...patch } });
  }

  /** @param {Blob} blob @param {any} lay */
  async function show(blob, lay) {
    const whole = await createImageBitmap(blob);
    const k = Math.min(1, LONGEST / Math.max(whole.width, whole.height));
    const bitmap = k < 1 ? await createImageBitmap(whole, { resizeWidth: Math.round(whole.width * k), resizeHeight: Math.round(whole.height * k), resizeQuality: 'high' }) : whole;
    store.set({ trace: { fade: 0.5, turn: 0, ...lay, blob, bitmap } });
  }

  file.addEventListener('change', async () => {
    const [one] = file.files ?? [];
    file.value = '';
    if (!one) return;
    const { x, y, width: across } = shell.planView.sight();
    try {
      await show(one, { name: one.name, at: [x + across * 0.1, y + across * 0.05], width: across * 0.8 });
      told.textContent = 'Now set its scale: two of its points whose distance you know.';
    } catch {
      told.textContent = `${one.name} could not be read as a picture. PNG, JPEG and WebP can.`;
    }
  });
  fade.addEventListener('input', () => change({ fade: Number(fade.value) }));

  /** @type {number|undefined} */
  let timer;
  store.subscribe((s) => [s.trace, s.units], () => {
    const { trace: now, units } = store.get();
    own.hidden = !now;
    if (!now) return;
    width.show(now.width, units);
    turn.show(now.turn, units);
    fade.value = String(now.fade);
    clearTimeout(timer);
    const { bitmap: _drawn, ...kept } = now;
    timer = setTimeout(() => shell.pictures.put(key(), kept).catch(() => {
      told.textContent = 'This browser does not keep the picture; load it again next time.';
    }), 400);
  });
  store.subscribe((s) => s.opened, async () => {
    const { opened } = store.get();
    store.set({ trace: null });
    told.textContent = '';
    const kept = await shell.pictures.get(key()).catch(() => null);
    if (!kept || store.get().opened !== opened) return;
    const { blob, ...lay } = kept;
    await show(blob, lay).catch(() => {});
  });
  // A plot begun and then saved for the first time takes its picture along.
  store.subscribe((s) => s.planId, (id, before) => {
    const { trace: now } = store.get();
    if (before === null && id && now) change({ fade: now.fade });
  });
  return root;
}
