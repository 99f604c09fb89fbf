// @ts-check
/** The focus ring of a thing on the plan: drawn, because a browser's own outline grows with the scale. */
import { set, svg } from './svg.js';

/** @param {import('./planview.js').PlanView} view */
export function mountFocus(view) {
  const ring = svg('rect', { class: 'focus-ring', visibility: 'hidden' });
  view.layer('focus').append(ring);
  /** @type {SVGGraphicsElement|null} */
  let on = null;

  function show() {
    if (!on || !on.isConnected) {
      set(ring, { visibility: 'hidden' });
      return;
    }
    const box = on.getBBox();
    const pad = 5 / view.sight().ppm;
    set(ring, {
      x: box.x - pad, y: box.y - pad, width: box.width + 2 * pad, height: box.height + 2 * pad, visibility: 'visible',
    });
  }

  view.root.addEventListener('focusin', (event) => {
    const target = event.target instanceof SVGGraphicsElement ? event.target : null;
    on = target && target.matches('.thing:focus-visible') ? target : null;
    show();
  });
  view.root.addEventListener('focusout', () => {
    on = null;
    show();
  });
  view.onView(() => requestAnimationFrame(show));
}
