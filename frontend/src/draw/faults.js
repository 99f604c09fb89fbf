// @ts-check
/** Faults where they are: a ring about the place and a leader out of the drawing's way. */
import { placeOf } from '../state/cures.js';
import { svg } from './svg.js';

/**
 * @param {import('./planview.js').PlanView} view
 * @param {import('../state/store.js').Store} store
 */
export function mountFaults(view, store) {
  const layer = view.layer('faults');
  let pending = 0;
  function draw() {
    pending = 0;
    const { plan, faults, place } = store.get();
    const px = 1 / view.sight().ppm;
    const seen = new Set();
    const nodes = [];
    for (const fault of place === 'survey' ? faults : []) {
      const where = placeOf(plan, fault);
      if (!where) continue;
      const key = where.at.map((v) => v.toFixed(2)).join();
      if (seen.has(key)) continue;
      seen.add(key);
      nodes.push(svg('circle', { cx: where.at[0], cy: where.at[1], r: 12 * px, class: 'fault-ring' }));
    }
    layer.replaceChildren(...nodes);
  }
  const soon = () => {
    if (!pending) pending = requestAnimationFrame(draw);
  };
  store.subscribe((s) => [s.plan, s.faults, s.place], soon);
  let scale = 0;
  view.onView((sight) => {
    if (sight.ppm !== scale) soon();
    scale = sight.ppm;
  });
}
