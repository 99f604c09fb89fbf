// @ts-check
/**
 * Drawing corner by corner, the common part of every tool that draws a ring or a path: click, or
 * type a length and a direction; Enter sets the corner, Backspace takes one back, C closes.
 * All of it lives in `state.draft`; nothing is kept here.
 */
import { pathLength } from '../geometry/line.js';
import { along, direction, distance, same, tidyPoint, turned } from '../geometry/vector.js';
import { make } from '../state/made.js';
import { KINDS } from '../state/kinds.js';
import { snapOn } from './snapping.js';

/** @typedef {import('./types.js').Bench} Bench */
/** @typedef {import('./types.js').Draft} Draft */
/** @typedef {import('./types.js').Tool} Tool */

/** @type {import('./types.js').Field[]} */
const WALL = [
  { name: 'length', label: 'Length', unit: 'length' },
  { name: 'direction', label: 'Direction', unit: 'direction' },
];
/** @type {import('./types.js').Field} */
const HEIGHT = { name: 'height', label: 'Height', unit: 'height' };

/**
 * @param {{name: string, kind: string|null, shape: 'ring'|'path', height?: string, label: string,
 *   done?: (bench: Bench, points: number[][]) => void}} config `height`: what the box starts with
 * @returns {Tool}
 */
export function drawing(config) {
  const heights = config.kind !== null && KINDS[config.kind].heights;
  const least = config.shape === 'ring' ? 3 : 2;

  /** @returns {Draft} */
  const fresh = () => ({
    tool: config.name, kind: config.kind, shape: config.shape, points: [], at: null, reason: '',
    guide: null, fields: heights ? [...WALL, HEIGHT] : WALL,
    typed: { length: '', direction: '', ...(heights ? { height: config.height ?? '' } : {}) },
    focus: null,
  });

  /** @param {Bench} bench @param {Draft} draft */
  function finish(bench, draft) {
    if (draft.points.length < least) {
      bench.say(config.shape === 'ring' ? 'Three corners are the least.' : 'Two points are the least.');
      return;
    }
    if (config.done) {
      config.done(bench, draft.points);
      return;
    }
    let ref = '';
    const kind = /** @type {string} */ (config.kind);
    bench.store.edit(`Draw ${config.label}`, (plan) => {
      const made = make(plan, kind, draft.points);
      ref = made.ref;
      return made.plan;
    });
    bench.store.set({ selection: { ref, vertex: null }, draft: null, tool: 'select' });
    bench.say(`${config.label} drawn. Its figures are in the panel.`);
  }

  /** @param {Bench} bench @param {Draft} draft */
  function setCorner(bench, draft) {
    if (!draft.at) return;
    const last = draft.points[draft.points.length - 1];
    if (last && same(last, draft.at)) {
      if (draft.points.length >= least) finish(bench, draft);
      return;
    }
    if (config.shape === 'ring' && draft.points.length >= 3 && same(draft.points[0], draft.at)) {
      finish(bench, draft);
      return;
    }
    const corner = tidyPoint([draft.at[0], draft.at[1], ...(heights ? [heightOf(bench, draft)] : [])]);
    bench.store.set({
      draft: {
        ...draft,
        points: [...draft.points, corner],
        typed: { ...draft.typed, length: '', direction: '' },
        focus: draft.focus === null ? null : draft.points.length ? 'length' : draft.focus,
        reason: '',
        guide: null,
      },
    });
  }

  return {
    name: config.name,
    start(bench) {
      bench.store.set({ draft: fresh(), selection: null });
    },
    pointer(bench, event) {
      const draft = /** @type {Draft} */ (bench.store.get().draft ?? fresh());
      if (event.type === 'move' || event.type === 'tap') {
        const next = led(bench, draft, event);
        bench.store.set({ draft: next, cursor: next.at ? { point: next.at, reason: next.reason } : null });
        if (event.type === 'tap') {
          if (event.again && draft.points.length >= least) finish(bench, draft);
          else setCorner(bench, next);
        }
      } else if (event.type === 'leave') {
        bench.store.set({ cursor: null });
      }
      return false;
    },
    key(bench, event) {
      const draft = /** @type {Draft|null} */ (bench.store.get().draft);
      if (!draft) return false;
      if (event.key === 'Enter') {
        const typed = draft.typed.length !== '' || draft.typed.direction !== '';
        if (draft.at || typed) setCorner(bench, typed ? typedAt(bench, draft) : draft);
        return true;
      }
      if (event.key === 'Backspace') {
        bench.store.set({ draft: { ...draft, points: draft.points.slice(0, -1), reason: '' } });
        return true;
      }
      if (event.key === 'c' || event.key === 'C') {
        finish(bench, draft);
        return true;
      }
      if (event.key.startsWith('Arrow')) {
        const at = stepped(bench, draft, event);
        bench.store.set({
          draft: { ...draft, at, reason: 'by arrow keys', guide: null },
          cursor: { point: at, reason: 'by arrow keys' },
        });
        return true;
      }
      if (/^[0-9.,]$/.test(event.key) && draft.points.length) {
        bench.store.set({
          draft: typedAt(bench, { ...draft, typed: { ...draft.typed, length: event.key }, focus: 'length' }),
        });
        return true;
      }
      return false;
    },
    type(bench, field, text) {
      const draft = /** @type {Draft|null} */ (bench.store.get().draft);
      if (!draft) return;
      const next = typedAt(bench, { ...draft, typed: { ...draft.typed, [field]: text }, focus: field });
      bench.store.set({ draft: next, cursor: next.at ? { point: next.at, reason: next.reason } : null });
    },
  };
}

/** Where the pointer leads, unless figures are typed. @param {Bench} bench @param {Draft} draft @param {import('./types.js').PointerTold} event @returns {Draft} */
function led(bench, draft, event) {
  const snapped = snapOn(bench.store.get().plan, event.at, event, { drawn: draft.points });
  const next = { ...draft, at: snapped.point, reason: snapped.reason, guide: snapped.guide };
  return draft.typed.length !== '' || draft.typed.direction !== '' ? typedAt(bench, next) : next;
}

/**
 * Where the typed figures put the next corner; what is not typed comes from the pointer.
 * @param {Bench} bench @param {Draft} draft
 * @returns {Draft}
 */
export function typedAt(bench, draft) {
  const last = draft.points[draft.points.length - 1];
  if (!last) return draft;
  const before = draft.points[draft.points.length - 2];
  const lastWay = before ? direction(before, last) : null;
  const wantedLength = draft.typed.length === '' ? null : bench.length(draft.typed.length);
  const wantedWay = draft.typed.direction === '' ? null : bench.direction(draft.typed.direction, lastWay);
  if (wantedLength === null && wantedWay === null) return draft;
  const pointed = draft.at && !same(draft.at, last) ? draft.at : null;
  const way = wantedWay ?? (pointed ? direction(last, pointed) : turned((lastWay ?? 0) + (lastWay === null ? 90 : -90)));
  const length = wantedLength ?? (pointed ? distance(last, pointed) : 0);
  return { ...draft, at: tidyPoint(along(last, way, length)), reason: reasonOf(way, lastWay), guide: draft.guide };
}

/** @param {number} way @param {number|null} lastWay */
function reasonOf(way, lastWay) {
  if (lastWay === null) return '';
  const turn = turned(way - lastWay);
  if (Math.abs(turn - 90) < 0.05 || Math.abs(turn - 270) < 0.05) return 'square to the last wall';
  return Math.min(turn, 360 - turn) < 0.05 ? 'straight on' : '';
}

/** @param {Bench} bench @param {Draft} draft @returns {number} metres */
function heightOf(bench, draft) {
  const typed = bench.length(draft.typed.height ?? '');
  const last = draft.points[draft.points.length - 1];
  return typed ?? last?.[2] ?? 0;
}

/** @param {Bench} bench @param {Draft} draft @param {import('./types.js').KeyTold} event @returns {number[]} */
export function stepped(bench, draft, event) {
  const step = event.shift ? 1 : 0.1;
  const from = draft.at ?? draft.points[draft.points.length - 1] ?? rounded(bench.middle().at);
  const way = { ArrowLeft: [-1, 0], ArrowRight: [1, 0], ArrowUp: [0, 1], ArrowDown: [0, -1] }[event.key] ?? [0, 0];
  return tidyPoint([from[0] + way[0] * step, from[1] + way[1] * step]);
}

/** @param {number[]} p whole metres: a fair place to begin by keys */
const rounded = (p) => p.map((v) => Math.round(v));

/** @param {number[][]} points @returns {number} metres along them */
export const drawnLength = (points) => pathLength(points);
