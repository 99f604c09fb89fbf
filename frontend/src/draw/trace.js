// @ts-check
/** The picture that is traced over: a canvas under the drawing that moves with it. */
import { onScreen } from '../geometry/picture.js';

/**
 * @param {import('./planview.js').PlanView} view
 * @param {import('../state/store.js').Store} store
 */
export function mountTrace(view, store) {
  const hold = document.createElement('div');
  hold.className = 'trace';
  const canvas = document.createElement('canvas');
  hold.append(canvas);
  view.box.prepend(hold);

  function stand() {
    const { trace, place } = store.get();
    hold.hidden = !trace || place !== 'survey';
    if (!trace || hold.hidden) return;
    const frame = view.frame();
    hold.style.left = `${frame.left}px`;
    hold.style.top = `${frame.top}px`;
    hold.style.width = `${frame.width}px`;
    hold.style.height = `${frame.height}px`;
    const [x, y] = view.toScreen(trace.at);
    const matrix = onScreen(trace, canvas, view.sight().ppm, [x - frame.left, y - frame.top]);
    canvas.style.transform = `matrix(${matrix.join(',')})`;
    canvas.style.opacity = String(trace.fade);
  }

  store.subscribe((s) => s.trace?.bitmap, (bitmap) => {
    if (!bitmap) return;
    canvas.width = bitmap.width;
    canvas.height = bitmap.height;
    canvas.getContext('2d')?.drawImage(bitmap, 0, 0);
  });
  store.subscribe((s) => [s.trace, s.place], stand);
  view.onView(stand);
}
