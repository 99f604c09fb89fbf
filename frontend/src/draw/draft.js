// @ts-check
/** What is being drawn: walls so far, the one that follows the pointer, live dimensions, guides. */
import { direction, distance, left, same, unit } from '../geometry/vector.js';
import { signedArea } from '../geometry/polygon.js';
import { around } from '../geometry/view.js';
import { formatLength } from '../units/length.js';
import { formatDirection } from '../units/angle.js';
import { dimension, readingTurn } from './dimension.js';
import { figure, pathOf, svg } from './svg.js';

/**
 * @param {import('./planview.js').PlanView} view
 * @param {import('../state/store.js').Store} store
 */
export function mountDraft(view, store) {
  const layer = view.layer('draft');
  let pending = 0;
  function draw() {
    pending = 0;
    const { draft, units, place } = store.get();
    const px = 1 / view.sight().ppm;
    if (!draft || place !== 'survey' || draft.shape === 'drag') {
      layer.replaceChildren();
      return;
    }
    const env = { px, units };
    layer.replaceChildren(
      ...(draft.then ? shapeOf({ ...draft.then, at: null }, env) : []),
      ...(draft.shape === 'tapes' ? tapesOf(draft, env) : shapeOf(draft, env)),
    );
  }
  const soon = () => {
    if (!pending) pending = requestAnimationFrame(draw);
  };
  store.subscribe((s) => [s.draft, s.units, s.place], soon);
  // A corner typed beyond the frame draws the view out to show it.
  store.subscribe((s) => s.draft?.points, (points) => {
    const last = points?.[points.length - 1];
    const { ppm: _ppm, ...sight } = view.sight();
    const shown = !last || (last[0] > sight.x && last[0] < sight.x + sight.width && last[1] > sight.y && last[1] < sight.y + sight.height);
    if (!shown) view.setView(around([...points, [sight.x, sight.y], [sight.x + sight.width, sight.y + sight.height]], 0.05, sight.width / sight.height));
  });
  let scale = 0;
  view.onView((sight) => {
    if (sight.ppm !== scale) soon();
    scale = sight.ppm;
  });
}

/** @typedef {{px: number, units: 'm'|'ft'}} Env */

/** @param {any} draft @param {Env} env @returns {Node[]} */
function shapeOf(draft, env) {
  const { points, at } = draft;
  const { px } = env;
  const nodes = [];
  if (draft.shape === 'point') return at ? [cross(at, px)] : [];
  const live = at && points.length && !same(points[points.length - 1], at) ? [points[points.length - 1], at] : null;
  const all = at && !(live === null && points.length) ? [...points, at] : points;
  if (draft.shape === 'ring' && all.length > 2) {
    nodes.push(svg('path', { d: pathOf(all, true), class: 'draft-wash' }));
    nodes.push(svg('path', { d: pathOf([all[all.length - 1], all[0]]), class: 'draft-rest' }));
  }
  if (draft.guide && at) nodes.push(guideLine(draft.guide, at, px));
  if (points.length > 1) nodes.push(svg('path', { d: pathOf(points), class: draft.kind ? 'draft-done' : 'tape' }));
  if (live) nodes.push(svg('path', { d: pathOf(live), class: 'draft-live' }));
  const outward = draft.shape === 'ring' && all.length > 2 && signedArea(all) < 0 ? 1 : -1;
  for (let i = 0; i + 1 < all.length; i++) {
    if (same(all[i], all[i + 1])) continue;
    nodes.push(...live && i === all.length - 2 ? length(all[i], all[i + 1], outward, env, true) : length(all[i], all[i + 1], outward, env, false));
  }
  if (live && /square/.test(draft.reason) && points.length > 1) nodes.push(squareMark(points, at, px));
  points.forEach((/** @type {number[]} */ p, /** @type {number} */ i) => {
    const r = 4 * px;
    nodes.push(svg('rect', { x: p[0] - r, y: p[1] - r, width: 2 * r, height: 2 * r, class: 'draft-corner' }));
    if (i === 0 && draft.shape === 'ring' && points.length > 2) {
      nodes.push(svg('circle', { cx: p[0], cy: p[1], r: 8 * px, class: 'draft-first' }));
    }
  });
  if (at) nodes.push(cross(at, px));
  return nodes;
}

/** @param {number[]} a @param {number[]} b @param {number} outward @param {Env} env @param {boolean} live @returns {Node[]} */
function length(a, b, outward, env, live) {
  const d = distance(a, b);
  if (d / env.px < 26) return [];
  const off = outward * 18 * env.px;
  const n = left(unit(a, b));
  const m = [(a[0] + b[0]) / 2 + n[0] * off, (a[1] + b[1]) / 2 + n[1] * off];
  const text = formatLength(d, env.units, 2) + (live ? `  ${formatDirection(direction(a, b))}` : '');
  return [dimension(a, b, off, env.px, 'dimension'), words(m, text, env.px, 'figure live', readingTurn(a, b))];
}

/** @param {number[]} at @param {string} text @param {number} px @param {string} look @param {number} [turn] */
function words(at, text, px, look, turn = 0) {
  return svg('text', {
    class: `lettering ${look}`, 'text-anchor': 'middle', y: 4,
    transform: `translate(${figure(at[0])} ${figure(at[1])}) scale(${px} ${-px}) rotate(${turn.toFixed(2)})`,
  }, [text]);
}

/** @param {number[]} at @param {number} px */
const cross = (at, px) =>
  svg('g', {}, [
    svg('circle', { cx: at[0], cy: at[1], r: 6 * px, class: 'draft-at' }),
    svg('path', { d: `M${at[0] - 2 * px} ${at[1]}h${4 * px}M${at[0]} ${at[1] - 2 * px}v${4 * px}`, class: 'draft-at' }),
  ]);

/** @param {any} guide @param {number[]} at @param {number} px */
function guideLine(guide, at, px) {
  const far = Math.max(distance(guide.through, at) + 60 * px, 80 * px);
  const s = Math.sign((at[0] - guide.through[0]) * guide.along[0] + (at[1] - guide.through[1]) * guide.along[1]) || 1;
  const end = [guide.through[0] + guide.along[0] * far * s, guide.through[1] + guide.along[1] * far * s];
  return svg('path', { d: pathOf([guide.through, end]), class: 'guide' });
}

/** @param {number[][]} points @param {number[]} at @param {number} px */
function squareMark(points, at, px) {
  const c = points[points.length - 1];
  const u = unit(c, points[points.length - 2]);
  const v = unit(c, at);
  const s = 8 * px;
  return svg('path', {
    d: pathOf([[c[0] + u[0] * s, c[1] + u[1] * s], [c[0] + (u[0] + v[0]) * s, c[1] + (u[1] + v[1]) * s], [c[0] + v[0] * s, c[1] + v[1] * s]]),
    class: 'square-mark',
  });
}

/** Two tapes: arcs about the known points, and both answers. @param {any} draft @param {Env} env @returns {Node[]} */
function tapesOf(draft, env) {
  const { px } = env;
  const { first, second, answers, chosen } = draft.tapes;
  const nodes = [];
  [first, second].forEach((r, i) => {
    const p = draft.points[i];
    if (p && r > 0) nodes.push(svg('circle', { cx: p[0], cy: p[1], r, class: 'tape-arc' }));
  });
  draft.points.forEach((/** @type {number[]} */ p, /** @type {number} */ i) => {
    nodes.push(svg('circle', { cx: p[0], cy: p[1], r: 6 * px, class: 'draft-corner' }), words([p[0], p[1] + 15 * px], String(i + 1), px, 'live'));
  });
  answers.forEach((/** @type {number[]} */ p, /** @type {number} */ i) => {
    const on = i === chosen;
    if (on) nodes.push(svg('path', { d: pathOf([draft.points[0], p, draft.points[1]]), class: 'draft-live' }));
    nodes.push(svg('circle', { cx: p[0], cy: p[1], r: (on ? 7 : 5) * px, class: 'tape-answer' }));
    nodes.push(words([p[0], p[1] + 16 * px], i === 0 ? 'left' : 'right', px, on ? 'live copper' : 'second'));
  });
  if (draft.at && !answers.length && draft.points.length < 2) nodes.push(cross(draft.at, px));
  return nodes;
}
