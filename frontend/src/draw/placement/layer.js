// @ts-check
import { range } from '../../charts/figures.js';
import { lengthFigure } from '../../charts/lengths.js';
import { dimension, toDimension } from './dimensions.js';
import { handles } from './drag.js';
import { candidates, ghosts } from './ghosts.js';
import { inPixels, labelRoom, lettering, toPixels } from './labels.js';
import { bearings, blockBearings, roseFrame, roseNode } from './rose.js';
import { chosenWire, wireLengths } from './wire.js';

/**
 * Placements over the plan: candidates as they are found, ghosts of refusals, the chosen wire with its tightest
 * dimensions, and its reach rose with the bearings of the targets.
 *
 * @typedef {import('../../state/types.js').State} State
 * @typedef {{layer: (name: string) => SVGGElement, onView: (callback: (view: any) => void) => void,
 *   toPlan: (x: number, y: number) => [number, number]}} PlanView
 */

/**
 * @param {PlanView} planView the plan drawing
 * @param {import('../../state/store.js').Store} store the page's one store
 * @param {{api: any, say: (sentence: string) => void}} shell
 */
export function mount(planView, store, shell) {
  /** @type {any} */
  let view = null;
  let asked = false;
  const layers = Object.fromEntries(['candidates', 'ghosts', 'rose', 'placement'].map((name) => [name, planView.layer(name)]));
  for (const layer of Object.values(layers)) layer.classList.add('placement-layer');
  const drag = handles(planView, store, shell);

  const draw = () => {
    asked = false;
    const state = store.get();
    const shown = state.place === 'placements' && view !== null;
    const focused = document.activeElement?.closest('.placement-layer [data-key]')?.getAttribute('data-key');
    for (const layer of Object.values(layers)) layer.replaceChildren();
    if (!shown) return;
    const { list, chosen } = placementsOf(state);
    layers.candidates.append(...candidates(list.filter((one) => one !== chosen), (id) => store.set({ chosen: id, shownRefusal: null })));
    layers.ghosts.append(...ghosts(ghostsShown(state), state.shownRefusal, view.ppm));
    if (chosen) drawChosen(state, chosen);
    if (focused) /** @type {SVGElement|null} */ (layers.placement.querySelector(`[data-key="${focused}"]`))?.focus();
  };
  const ask = () => {
    if (asked) return;
    asked = true;
    requestAnimationFrame(draw);
  };

  /**
   * @param {State} state
   * @param {any} chosen
   */
  function drawChosen(state, chosen) {
    const plan = state.search.planAtSearch ?? state.plan;
    const planNorth = plan.site?.planNorth ?? 0;
    const size = { width: view.width * view.ppm, height: view.height * view.ppm };
    const room = labelRoom(size.width, size.height);
    const length = (/** @type {number} */ metres) => lengthFigure(metres, state.units);
    blockSymbols(chosen, room);
    const band = bandShown(state, chosen);
    const frame = roseFrame(chosen, view);
    const targets = band?.rose ? targetsOf(plan, band) : [];
    blockBearings(targets, frame, size, planNorth, room);
    const lengths = wireLengths(chosen, view.ppm, length, (middle, unit) => {
      const [x, y] = toPixels(view, middle);
      for (let far = -30; far <= 30; far += 10) {
        const [px, py] = [x + unit[0] * far, y - unit[1] * far];
        room.block({ x0: px - 14, y0: py - 14, x1: px + 14, y1: py + 14 });
      }
    });
    const dimensions = toDimension(chosen.clearances).flatMap((one) => dimension(one, view, room, {
      figure: length(one.distance),
      words: [`to ${nameIn(plan, one.to)}${one.what && one.what !== 'wire' ? `, ${one.what}` : ''}`, `must keep ${length(one.required)}`],
    }));
    const names = chosen.attachments.flatMap((/** @type {any} */ hold) => holdLabel(plan, hold, room, state));
    if (band?.rose) {
      const legend = roseLegend(band, room);
      layers.rose.append(inPixels(view, [
        ...bearings(targets, frame, size, planNorth, room), roseNode(band.rose, frame, planNorth), ...legend,
      ], 'rose-drawing'));
    }
    layers.placement.append(
      ...chosenWire(chosen, view.ppm), ...lengths,
      inPixels(view, [...dimensions, ...names], 'placement-lettering'),
      ...drag(chosen, plan, view),
    );
  }

  /** @param {any} chosen @param {ReturnType<typeof labelRoom>} room */
  function blockSymbols(chosen, room) {
    const spots = [chosen.feed.at, ...chosen.attachments.map((/** @type {any} */ hold) => hold.at)];
    for (const spot of spots) {
      const [x, y] = toPixels(view, spot);
      room.block({ x0: x - 7, y0: y - 7, x1: x + 7, y1: y + 7 });
    }
    for (const point of chosen.conductors.flatMap((/** @type {any} */ one) => one.points)) {
      const [x, y] = toPixels(view, point);
      room.block({ x0: x - 3, y0: y - 3, x1: x + 3, y1: y + 3 });
    }
  }

  /** @param {any} plan @param {any} hold @param {ReturnType<typeof labelRoom>} room @param {State} state */
  function holdLabel(plan, hold, room, state) {
    const [x, y] = toPixels(view, hold.at);
    const isNew = (plan.mastZones ?? []).some((/** @type {any} */ zone) => zone.id === hold.on);
    const words = `${isNew ? 'New mast' : nameIn(plan, hold.on)} ${lengthFigure(hold.aboveGround, state.units, 1)}`;
    const spot = room.place(x, y, [words], 13);
    return spot ? [lettering(spot.x, spot.y, [words], 'bold', spot.anchor)] : [];
  }

  store.subscribe((state) => [state.search, state.chosen, state.chosenBand, state.shownRefusal, state.units, state.place], ask);
  planView.onView((next) => {
    view = next;
    ask();
  });
}

/** @param {State} state */
function placementsOf(state) {
  const search = /** @type {any} */ (state.search);
  const list = search.result ? search.result.placements : search.found;
  const all = [...list, ...(search.own ?? [])];
  return { list: all, chosen: all.find((one) => one.id === state.chosen) ?? null };
}

/**
 * The refusal that is read; with the whole list open, all of them.
 * @param {State} state
 * @returns {any[]}
 */
function ghostsShown(state) {
  const search = /** @type {any} */ (state.search);
  const all = search.result?.refusals ?? [];
  if (search.ghosts || (search.result && search.result.placements.length === 0)) return all;
  return state.shownRefusal ? [state.shownRefusal] : [];
}

/**
 * @param {State} state
 * @param {any} placement
 * @returns {any|null} the row with the rose of the band shown
 */
function bandShown(state, placement) {
  const rows = placement.bands.filter((/** @type {any} */ row) => row.rose);
  const weight = (/** @type {string} */ name) => (state.plan.brief?.bands ?? []).find((/** @type {any} */ band) => band.name === name)?.weight ?? 1;
  const aimed = rows.filter((/** @type {any} */ row) => row.targets.some((/** @type {any} */ target) => typeof target.bearing === 'number'));
  const heaviest = [...(aimed.length ? aimed : rows)].sort((a, b) => weight(b.name) - weight(a.name))[0];
  return rows.find((/** @type {any} */ row) => row.name === state.chosenBand) ?? heaviest ?? null;
}

/** @param {any} plan @param {any} band */
function targetsOf(plan, band) {
  return band.targets.filter((/** @type {any} */ target) => typeof target.bearing === 'number').map((/** @type {any} */ target) => {
    const km = (plan.brief?.targets ?? []).find((/** @type {any} */ one) => one.name === target.name)?.distanceKm;
    const far = km === undefined ? '' : ` ${String(Math.round(km)).replace(/\B(?=(\d{3})+$)/g, '\u2009')} km`;
    return { name: target.name, bearing: target.bearing, distance: `${Math.round(target.bearing)}°${far}` };
  });
}

/** @param {any} band @param {ReturnType<typeof labelRoom>} room */
function roseLegend(band, room) {
  const lines = [`${band.name}, ${range(band.rose.elevation, band.rose.elevation).replace(/–.*$/, '°')} up; outward is better`, `betters the reference over ${Math.round(band.rose.betterShare * 100)} % of azimuths`];
  const [x, y] = [12, 22];
  room.block({ x0: x, y0: y - 12, x1: x + 220, y1: y + 32 });
  return [lettering(x, y, ['Reach rose'], 'bold rose-title'), lettering(x, y + 15, lines, 'soft')];
}

/** @param {any} plan @param {string} id */
function nameIn(plan, id) {
  for (const kind of ['supports', 'mastZones', 'bracketLines', 'buildings', 'trees', 'overheadLines', 'zones', 'people', 'metalwork']) {
    const thing = (plan[kind] ?? []).find((/** @type {any} */ one) => one.id === id);
    if (thing) return thing.name ?? id.replace(/[-_]+/g, ' ');
  }
  return id === 'ground' || id === 'boundary' ? `the ${id}` : id.replace(/[-_]+/g, ' ');
}

