// @ts-check
import { atPlace, pathOf, svg } from '../svg.js';
import { holdings, movedLayout } from './holding.js';

/**
 * Handles on the attachments of the chosen placement. Dragging one carries it to the nearest place that may hold it;
 * every move is assessed by the server, the latest wins, and the answer is shown as a placement of its own.
 * Keys: arrows move it on the plan, Page Up and Page Down change its height.
 */

const STEP = 0.1;
const BIG_STEP = 1;

/**
 * @param {{toPlan: (x: number, y: number) => number[]}} planView
 * @param {import('../../state/store.js').Store} store
 * @param {{api: any, say: (sentence: string) => void}} shell
 * @returns {(placement: any, plan: any, view: any) => SVGElement[]} makes the handles
 */
export function handles(planView, store, shell) {
  /** What waits while the server works on one move; only the latest is kept. @type {(() => void)|null} */
  let waiting = null;
  let working = false;
  /** Where the hand is, while it drags. @type {{index: number, point: [number, number]}|null} */
  let held = null;
  /** The placement a drag or a row of key presses began from. @type {any} */
  let origin = null;

  /**
   * @param {any} plan
   * @param {any} placement
   * @param {number} index
   * @param {[number, number]} point
   * @param {number} height wished above the ground
   * @param {number[]} [way] plan direction of a key, which leaves a support for the next one that way
   */
  async function move(plan, placement, index, point, height, way) {
    const spot = way ? towards(plan, placement.attachments[index], way) : holdings(plan, point)[0];
    if (!spot) return;
    const now = placement.attachments[index];
    const ground = now.at[2] - now.aboveGround;
    const above = Math.min(spot.highest, Math.max(spot.lowest, height));
    const layout = movedLayout(placement, index, { on: spot.on, at: spot.at, z: ground + above });
    if (working) {
      waiting = () => void assess(plan, layout, placement);
      return;
    }
    await assess(plan, layout, placement);
  }

  /**
   * @param {any} plan
   * @param {any} layout
   * @param {any} placement
   */
  async function assess(plan, layout, placement) {
    working = true;
    try {
      const answer = await shell.api.assess(plan, layout);
      keep({
        ...answer,
        id: 'moved',
        rank: 0,
        madeFrom: movedName(origin ?? placement),
        from: (origin ?? placement).from ?? (origin ?? placement).id,
      });
    } catch (problem) {
      shell.say(`That could not be worked out. ${/** @type {Error} */ (problem).message}`);
    }
    working = false;
    const next = waiting;
    waiting = null;
    next?.();
  }

  /** @param {any} from */
  function movedName(from) {
    return from.madeFrom ?? `Moved from ${from.rank || 'the list'}`;
  }

  /** @param {any} placement */
  function keep(placement) {
    const search = /** @type {any} */ (store.get().search);
    const own = [placement, ...(search.own ?? []).filter((/** @type {any} */ one) => one.id !== placement.id)];
    store.set({ search: { ...search, own }, chosen: placement.id });
  }

  return (placement, plan, view) => [
    ...guide(placement),
    ...placement.attachments.map((/** @type {any} */ hold, /** @type {number} */ index) => {
      const name =
        [...(plan.supports ?? []), ...(plan.mastZones ?? []), ...(plan.bracketLines ?? [])].find(
          (one) => one.id === hold.on,
        )?.name ?? hold.on;
      const handle = atPlace(
        hold.at,
        view.ppm,
        [svg('circle', { class: 'hold-hit', r: 22 }), svg('circle', { class: 'hold-handle', r: 6.5 })],
        {
          class: 'hold',
          tabindex: 0,
          role: 'button',
          'data-key': `hold-${index}`,
          'aria-label': `${name}, ${hold.aboveGround.toFixed(1)} metres up. Arrow keys move it, Page Up and Page Down change its height.`,
        },
      );
      handle.addEventListener('pointerdown', (event) =>
        grab(/** @type {PointerEvent} */ (event), placement, plan, index, view),
      );
      handle.addEventListener('keydown', (event) =>
        nudge(/** @type {KeyboardEvent} */ (event), placement, plan, index),
      );
      return handle;
    }),
  ];

  /** @param {any} placement */
  function guide(placement) {
    if (!held) return [];
    return [svg('path', { class: 'hold-guide', d: pathOf([placement.attachments[held.index].at, held.point]) })];
  }

  /**
   * @param {PointerEvent} event
   * @param {any} placement
   * @param {any} plan
   * @param {number} index
   * @param {any} view
   */
  function grab(event, placement, plan, index, view) {
    if (event.button !== 0) return;
    event.preventDefault();
    event.stopPropagation();
    origin = placement;
    const start = placement.attachments[index];
    let moved = false;
    const follow = (/** @type {PointerEvent} */ next) => {
      const point = planView.toPlan(next.clientX, next.clientY);
      if (!moved && Math.hypot(point[0] - start.at[0], point[1] - start.at[1]) * view.ppm < 4) return;
      moved = true;
      held = { index, point: [point[0], point[1]] };
      void move(plan, origin, index, [point[0], point[1]], start.aboveGround);
    };
    const end = () => {
      window.removeEventListener('pointermove', follow);
      window.removeEventListener('pointerup', end);
      window.removeEventListener('pointercancel', end);
      held = null;
      store.set({});
    };
    window.addEventListener('pointermove', follow);
    window.addEventListener('pointerup', end);
    window.addEventListener('pointercancel', end);
  }

  /**
   * @param {KeyboardEvent} event
   * @param {any} placement
   * @param {any} plan
   * @param {number} index
   */
  function nudge(event, placement, plan, index) {
    const step = event.shiftKey ? BIG_STEP : STEP;
    const ways = /** @type {Record<string, number[]>} */ ({
      ArrowLeft: [-step, 0, 0],
      ArrowRight: [step, 0, 0],
      ArrowUp: [0, step, 0],
      ArrowDown: [0, -step, 0],
      PageUp: [0, 0, step],
      PageDown: [0, 0, -step],
    });
    const way = ways[event.key];
    if (!way) return;
    event.preventDefault();
    event.stopPropagation();
    origin = placement;
    const hold = placement.attachments[index];
    const point = /** @type {[number, number]} */ ([hold.at[0] + way[0], hold.at[1] + way[1]]);
    void move(plan, placement, index, point, hold.aboveGround + way[2], way[2] ? undefined : way);
  }
}

/**
 * Where a key takes an attachment: on within its zone or along its bracket line; from a support, to the next holding
 * place in that direction.
 * @param {any} plan
 * @param {any} hold
 * @param {number[]} way
 * @returns {import('./holding.js').Holding|undefined}
 */
function towards(plan, hold, way) {
  const near = holdings(plan, [hold.at[0] + way[0], hold.at[1] + way[1]]);
  const same = near.find((one) => one.on === hold.on);
  if (same && Math.hypot(same.at[0] - hold.at[0], same.at[1] - hold.at[1]) > 1e-6) return same;
  return near.find((one) => {
    const [dx, dy] = [one.at[0] - hold.at[0], one.at[1] - hold.at[1]];
    const along = (dx * way[0] + dy * way[1]) / (Math.hypot(way[0], way[1]) * (Math.hypot(dx, dy) || 1));
    return one.on !== hold.on && along > 0.5;
  });
}
