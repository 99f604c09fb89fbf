// @ts-check
/** Handles of the selected thing: a square at each corner, a small ring amid each edge. */
import { between, distance } from '../geometry/vector.js';
import { find, KINDS, pointsOf } from '../state/kinds.js';
import { pathOf, svg } from './svg.js';

/**
 * @param {import('./planview.js').PlanView} view
 * @param {import('../state/store.js').Store} store
 */
export function mountHandles(view, store) {
  const layer = view.layer('handles');
  let pending = 0;
  function draw() {
    pending = 0;
    const { plan, selection, place, tool } = store.get();
    const found = selection && place === 'survey' && tool === 'select' ? find(plan, selection.ref) : null;
    layer.replaceChildren(...(found && selection ? handles(found, selection, 1 / view.sight().ppm) : []));
  }
  const soon = () => {
    if (!pending) pending = requestAnimationFrame(draw);
  };
  store.subscribe((s) => [s.plan, s.selection, s.place, s.tool], soon);
  let scale = 0;
  view.onView((sight) => {
    if (sight.ppm !== scale) soon();
    scale = sight.ppm;
  });
}

/** @param {{kind: string, thing: any}} found @param {{ref: string, vertex: number|null}} selection @param {number} px */
function handles(found, selection, px) {
  const { shape } = KINDS[found.kind];
  const points = pointsOf(found.kind, found.thing);
  const marks = { 'data-ref': selection.ref };
  if (shape === 'point') {
    const [p] = points;
    return p ? [svg('circle', { cx: p[0], cy: p[1], r: 13 * px, class: 'selected-ring', ...marks }),
      svg('circle', { cx: p[0], cy: p[1], r: 15 * px, class: 'handle-hit', 'data-vertex': 0, ...marks })] : [];
  }
  const closed = shape === 'ring';
  const nodes = [svg('path', { d: pathOf(points, closed), class: 'selected-edge' })];
  const count = closed ? points.length : points.length - 1;
  for (let i = 0; i < count; i++) {
    const a = points[i];
    const b = points[(i + 1) % points.length];
    if (distance(a, b) < 44 * px) continue;
    const m = between(a, b, 0.5);
    nodes.push(
      svg('circle', { cx: m[0], cy: m[1], r: 3.4 * px, class: 'handle-mid' }),
      svg('circle', { cx: m[0], cy: m[1], r: 10 * px, class: 'handle-hit', 'data-edge': i, ...marks }),
    );
  }
  points.forEach((p, i) => {
    const r = (selection.vertex === i ? 5.5 : 4.2) * px;
    nodes.push(
      svg('rect', { x: p[0] - r, y: p[1] - r, width: 2 * r, height: 2 * r, class: selection.vertex === i ? 'handle handle-on' : 'handle' }),
      svg('circle', { cx: p[0], cy: p[1], r: 13 * px, class: 'handle-hit', 'data-vertex': i, ...marks }),
    );
  });
  return nodes;
}
