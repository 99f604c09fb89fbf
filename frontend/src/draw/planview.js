// @ts-check
/**
 * The plan on the screen: one SVG whose viewBox is in metres, turned y-up once, with named layers.
 *
 *   const view = createPlanView(box, store);
 *   view.layer('placement')      a <g> in plan metres, y north; strokes are in screen pixels
 *   view.onView(({x, y, width, height, ppm}) => …)   at once and whenever the view changes
 *   view.toPlan(clientX, clientY) → [x, y]; view.toScreen([x, y]) → [left, top] within the box
 *   view.fit()
 */
export {};
