// @ts-check
/** Placing a single point: click, or arrow keys and Enter; the common part of such tools. */
import { make } from '../state/made.js';
import { KINDS } from '../state/kinds.js';
import { stepped } from './drawing.js';
import { snapOn } from './snapping.js';

/** @typedef {import('./types.js').Draft} Draft */
/** @typedef {import('./types.js').Bench} Bench */

/**
 * @param {{name: string, kind: string, label: string, height?: string,
 *   variant?: (draft: Draft) => string}} config
 * @returns {import('./types.js').Tool}
 */
export function placing(config) {
  const heights = KINDS[config.kind].heights;

  /** @param {string} [variant] @returns {Draft} */
  const fresh = (variant) => ({
    tool: config.name, kind: config.kind, shape: 'point', points: [], at: null, reason: '', guide: null,
    fields: heights ? [{ name: 'height', label: 'Height', unit: 'height' }] : [],
    typed: /** @type {Record<string, string>} */ (heights ? { height: config.height ?? '0' } : {}),
    focus: null,
    variant,
  });

  /** @param {Bench} bench @param {Draft} draft @param {boolean} more stay with the tool */
  function place(bench, draft, more) {
    if (!draft.at) return;
    const height = heights ? [bench.length(draft.typed.height ?? '') ?? 0] : [];
    let ref = '';
    bench.store.edit(`Place ${config.label}`, (plan) => {
      const made = make(plan, config.kind, [[draft.at?.[0] ?? 0, draft.at?.[1] ?? 0, ...height]], config.variant?.(draft));
      ref = made.ref;
      return made.plan;
    });
    if (more) bench.store.set({ draft: fresh(draft.variant), selection: null });
    else bench.store.set({ selection: { ref, vertex: null }, draft: null, tool: 'select' });
    bench.say(`${config.label} placed. Its figures are in the panel.`);
  }

  return {
    name: config.name,
    start: (bench) => bench.store.set({ draft: fresh(), selection: null }),
    pointer(bench, event) {
      const draft = /** @type {Draft} */ (bench.store.get().draft ?? fresh());
      if (event.type === 'leave') bench.store.set({ cursor: null, draft: { ...draft, at: null } });
      if (event.type !== 'move' && event.type !== 'tap') return false;
      const snapped = snapOn(bench.store.get().plan, event.at, event);
      const next = { ...draft, at: snapped.point, reason: snapped.reason };
      bench.store.set({ draft: next, cursor: { point: snapped.point, reason: snapped.reason } });
      if (event.type === 'tap') place(bench, next, event.shift);
      return false;
    },
    key(bench, event) {
      const draft = /** @type {Draft|null} */ (bench.store.get().draft);
      if (!draft) return false;
      if (event.key === 'Enter') {
        place(bench, draft, event.shift);
        return true;
      }
      if (!event.key.startsWith('Arrow')) return false;
      const at = stepped(bench, draft, event);
      const reason = 'by arrow keys';
      bench.store.set({ draft: { ...draft, at, reason }, cursor: { point: at, reason } });
      return true;
    },
    type(bench, field, text) {
      const draft = /** @type {Draft|null} */ (bench.store.get().draft);
      if (draft) bench.store.set({ draft: { ...draft, typed: { ...draft.typed, [field]: text }, focus: field } });
    },
  };
}
