// @ts-check
/**
 * The hand on the plan: wheel, drag, pinch and keys move the view; what is left is told onward in
 * plan metres (see tools/types.js). One drag at a time; a second finger ends it and pinches.
 */
import { panned, zoomed } from '../geometry/view.js';

const DRAG_FROM = 4;

/**
 * @param {import('./planview.js').PlanView} view
 * @param {(event: any) => boolean} told answers true to a `down` it wants to drag
 */
export function mountInput(view, told) {
  const { root } = view;
  /** @type {Map<number, {x: number, y: number}>} */
  const fingers = new Map();
  /** @type {null|{x: number, y: number, moved: boolean, claimed: boolean, id: number}} */
  let press = null;
  /** @type {null|{apart: number, x: number, y: number}} */
  let pinch = null;
  let lastTap = { time: 0, x: 0, y: 0 };

  /** @param {string} type @param {PointerEvent} event @param {boolean} [again] */
  function tell(type, event, again = false) {
    const target = /** @type {Element|null} */ (event.target instanceof Element ? event.target : null);
    const handle = target?.closest('[data-vertex], [data-edge]');
    const vertex = handle?.getAttribute('data-vertex');
    const edge = handle?.getAttribute('data-edge');
    return told({
      type,
      at: view.toPlan(event.clientX, event.clientY),
      ppm: view.sight().ppm,
      ref: target?.closest('[data-ref]')?.getAttribute('data-ref') ?? null,
      vertex: vertex ? Number(vertex) : null,
      edge: edge ? Number(edge) : null,
      shift: event.shiftKey,
      free: event.altKey || event.ctrlKey,
      touch: event.pointerType === 'touch',
      again,
    });
  }

  root.addEventListener('pointerdown', (event) => {
    if (event.pointerType === 'mouse' && event.button > 1) return;
    fingers.set(event.pointerId, { x: event.clientX, y: event.clientY });
    if (fingers.size === 2) {
      if (press?.claimed) tell('cancel', event);
      press = null;
      pinch = pinchOf(fingers);
      return;
    }
    if (fingers.size > 2) return;
    root.setPointerCapture(event.pointerId);
    const claimed = event.button === 0 && tell('down', event);
    press = { x: event.clientX, y: event.clientY, moved: false, claimed, id: event.pointerId };
  });

  root.addEventListener('pointermove', (event) => {
    if (fingers.has(event.pointerId)) fingers.set(event.pointerId, { x: event.clientX, y: event.clientY });
    if (pinch && fingers.size >= 2) {
      const now = pinchOf(fingers);
      const { ppm, ...sight } = view.sight();
      const about = view.toPlan(now.x, now.y);
      const next = zoomed(sight, pinch.apart / Math.max(1, now.apart), about);
      view.setView(panned(next, (pinch.x - now.x) / ppm, (now.y - pinch.y) / ppm));
      pinch = now;
      return;
    }
    if (!press || press.id !== event.pointerId) {
      if (!fingers.size) tell('move', event);
      return;
    }
    const dx = event.clientX - press.x;
    const dy = event.clientY - press.y;
    if (!press.moved && Math.hypot(dx, dy) < DRAG_FROM * (event.pointerType === 'touch' ? 2 : 1)) return;
    press.moved = true;
    if (press.claimed) {
      tell('drag', event);
      return;
    }
    const { ppm, ...sight } = view.sight();
    view.setView(panned(sight, -dx / ppm, dy / ppm));
    press.x = event.clientX;
    press.y = event.clientY;
    root.classList.add('panning');
  });

  /** @param {PointerEvent} event */
  function lift(event) {
    fingers.delete(event.pointerId);
    root.classList.remove('panning');
    if (pinch) {
      if (fingers.size < 2) pinch = null;
      return;
    }
    if (!press || press.id !== event.pointerId) return;
    const was = press;
    press = null;
    if (event.type === 'pointercancel') {
      tell('cancel', event);
      return;
    }
    if (was.claimed) tell('up', event);
    if (was.moved || event.button > 0) return;
    const near = Math.hypot(event.clientX - lastTap.x, event.clientY - lastTap.y) < 6;
    const again = near && event.timeStamp - lastTap.time < 350;
    lastTap = { time: event.timeStamp, x: event.clientX, y: event.clientY };
    // Capture sends the lift to the root; what lies under the pointer is asked anew.
    const under = document.elementFromPoint(event.clientX, event.clientY);
    tell('tap', withTarget(event, under ?? root), again);
  }
  root.addEventListener('pointerup', lift);
  root.addEventListener('pointercancel', lift);
  root.addEventListener('pointerleave', (event) => {
    if (!fingers.size) tell('leave', event);
  });

  root.addEventListener('wheel', (event) => {
    event.preventDefault();
    const { ppm, ...sight } = view.sight();
    const lines = event.deltaMode === 1 ? 16 : 1;
    if (event.shiftKey || Math.abs(event.deltaX) > Math.abs(event.deltaY)) {
      const dx = (event.deltaX || event.deltaY) * lines;
      view.setView(panned(sight, dx / ppm, event.deltaX ? (-event.deltaY * lines) / ppm : 0));
      return;
    }
    const factor = Math.exp(Math.max(-120, Math.min(120, event.deltaY * lines)) * 0.0022);
    view.setView(zoomed(sight, factor, view.toPlan(event.clientX, event.clientY)));
  }, { passive: false });
}

/** @param {PointerEvent} event @param {Element} target @returns {any} the parts of it that `tell` reads */
const withTarget = (event, target) => ({
  target, clientX: event.clientX, clientY: event.clientY, shiftKey: event.shiftKey,
  altKey: event.altKey, ctrlKey: event.ctrlKey, pointerType: event.pointerType,
});

/** @param {Map<number, {x: number, y: number}>} fingers */
function pinchOf(fingers) {
  const [a, b] = [...fingers.values()];
  return { apart: Math.hypot(a.x - b.x, a.y - b.y), x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 };
}

/**
 * The view by keys: + and − nearer and farther, 0 all of it, Ctrl or Alt with arrows pans.
 * @param {import('./planview.js').PlanView} view
 * @param {{key: string, alt: boolean, ctrl: boolean, shift: boolean}} event
 * @param {boolean} arrows whether plain arrows pan too
 * @returns {boolean} it was used
 */
export function viewKey(view, event, arrows) {
  const { ppm: _ppm, ...sight } = view.sight();
  const middle = [sight.x + sight.width / 2, sight.y + sight.height / 2];
  if (event.ctrl) return false;
  if (event.key === '+' || event.key === '=') view.setView(zoomed(sight, 1 / 1.25, middle));
  else if (event.key === '-' || event.key === '−') view.setView(zoomed(sight, 1.25, middle));
  else if (event.key === '0' || event.key === 'Home') view.fit();
  else if (event.key.startsWith('Arrow') && (event.alt || arrows)) {
    const [x, y] = { ArrowLeft: [-1, 0], ArrowRight: [1, 0], ArrowUp: [0, 1], ArrowDown: [0, -1] }[event.key] ?? [0, 0];
    view.setView(panned(sight, x * sight.width * 0.1, y * sight.width * 0.1));
  } else return false;
  return true;
}

/** Nearer or farther about the middle, for buttons. @param {import('./planview.js').PlanView} view @param {number} factor */
export function zoomBy(view, factor) {
  const { ppm: _ppm, ...sight } = view.sight();
  view.setView(zoomed(sight, factor, [sight.x + sight.width / 2, sight.y + sight.height / 2]));
}
