// @ts-check
/**
 * Draws candidates, the chosen placement, its rose and the ghosts of refusals over the plan.
 * @param {{layer: (name: string) => SVGGElement, onView: (callback: (view: any) => void) => void}} planView the plan drawing
 * @param {import('../../state/store.js').Store} store the page's one store
 */
export function mount(planView, store) {
  const layer = planView.layer('placement');
  layer.classList.add('placement-layer');
  void store;
}
