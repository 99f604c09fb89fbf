// @ts-check
import { bearingOf, compass, radiusOf, spotOf } from '../charts/compass.js';
import { html } from '../charts/html.js';
import { editEntry } from './brief-fields.js';

/**
 * The compass of the brief: targets are turned on it by hand or with the arrow keys.
 * @typedef {import('../state/store.js').Store} Store
 */

const SIZE = 280;

/**
 * @param {any[]} targets
 * @param {Store} store
 * @returns {HTMLElement}
 */
export function compassNode(targets, store) {
  const marks = targets.map((target) => ({
    name: target.name ?? 'target',
    bearing: target.bearing ?? null,
    distanceKm: target.distanceKm ?? null,
    nearVerticalKm: target.nearVerticalKm ?? null,
  }));
  const drawing = compass(marks, SIZE);
  const turn = (/** @type {number} */ index, /** @type {number} */ bearing) =>
    editEntry(
      store,
      `Turn ${targets[index].name ?? 'target'}`,
      'targets',
      index,
      { bearing: ((bearing % 360) + 360) % 360 },
      `turn-${index}`,
    );
  for (const handle of drawing.querySelectorAll('[data-target]')) {
    const index = Number(handle.getAttribute('data-target'));
    handle.addEventListener('pointerdown', (event) =>
      turnByHand(
        /** @type {PointerEvent} */ (event),
        drawing,
        handle,
        targets[index],
        (bearing) => turn(index, bearing),
        () => store.endGroup(),
      ),
    );
    handle.addEventListener('keydown', (event) => {
      const { key, shiftKey } = /** @type {KeyboardEvent} */ (event);
      const way = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1 }[key];
      if (!way) return;
      event.preventDefault();
      event.stopPropagation();
      turn(index, Math.round(targets[index].bearing) + way * (shiftKey ? 10 : 1));
    });
  }
  return html('div', { class: 'compass-box' }, drawing);
}

/**
 * Follows the hand round the compass; the handle moves at once, the panel when it is let go.
 * @param {PointerEvent} event
 * @param {SVGElement} drawing
 * @param {Element} handle
 * @param {any} target
 * @param {(bearing: number) => void} turn
 * @param {() => void} done
 */
function turnByHand(event, drawing, handle, target, turn, done) {
  if (event.button !== 0) return;
  event.preventDefault();
  /** @type {SVGElement} */ (handle).focus({ preventScroll: true });
  const follow = (/** @type {PointerEvent} */ next) => {
    const box = drawing.getBoundingClientRect();
    const bearing = bearingOf(next.clientX - box.left - box.width / 2, next.clientY - box.top - box.height / 2);
    showBearing(handle, bearing, target.distanceKm);
    turn(bearing);
  };
  const end = () => {
    window.removeEventListener('pointermove', follow);
    window.removeEventListener('pointerup', end);
    window.removeEventListener('pointercancel', end);
    done();
  };
  window.addEventListener('pointermove', follow);
  window.addEventListener('pointerup', end);
  window.addEventListener('pointercancel', end);
}

/**
 * @param {Element} handle
 * @param {number} bearing
 * @param {number} distanceKm
 */
function showBearing(handle, bearing, distanceKm) {
  const [x, y] = spotOf(bearing, Math.max(12, radiusOf(distanceKm, SIZE / 2 - 26)));
  handle.setAttribute('aria-valuenow', String(bearing));
  handle.querySelector('path')?.setAttribute('d', `M0 0L${x} ${y}`);
  for (const circle of handle.querySelectorAll('circle')) {
    circle.setAttribute('cx', String(x));
    circle.setAttribute('cy', String(y));
  }
  const text = handle.querySelector('text');
  text?.setAttribute('x', String(x + (x < 0 ? -9 : 9)));
  text?.setAttribute('y', String(y + 4));
  text?.classList.toggle('end', x < 0);
}
