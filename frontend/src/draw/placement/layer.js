// @ts-check
import { bearing as bearingText } from '../../charts/figures.js';
import { number } from '../../units/figures.js';
import { distanceFigure, formatLength } from '../../units/length.js';
import { dimension, dimensionLabel, toDimension } from './dimensions.js';
import { handles } from './drag.js';
import { candidates, ghosts } from './ghosts.js';
import { along, inPixels, toMetres, toPixels, WEIGHT } from './labels.js';
import { bearings, roseFrame, roseNode } from './rose.js';
import { chosenWire, wireLengths } from './wire.js';

/**
 * Placements over the plan: candidates as they are found, ghosts of refusals, the chosen wire with its tightest
 * dimensions, and its reach rose with the bearings of the targets.
 *
 * @typedef {import('../../state/types.js').State} State
 * @typedef {{layer: (name: string) => SVGGElement, onView: (callback: (view: any) => void) => void,
 *   letter: (name: string, letters: import('../kinds/env.js').Letters|null) => void,
 *   toPlan: (x: number, y: number) => number[]}} PlanView
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
  const layers = Object.fromEntries(
    ['candidates', 'ghosts', 'rose', 'placement'].map((name) => [name, planView.layer(name)]),
  );
  for (const layer of Object.values(layers)) layer.classList.add('placement-layer');
  const drag = handles(planView, store, shell);

  const draw = () => {
    asked = false;
    const state = store.get();
    const shown = state.place === 'placements' && view !== null;
    if (state.place === 'brief' && view !== null) {
      drawAims(state);
      return;
    }
    const focused = document.activeElement?.closest('.placement-layer [data-key]')?.getAttribute('data-key');
    for (const layer of Object.values(layers)) layer.replaceChildren();
    if (!shown || !placementsOf(state).chosen) planView.letter('placement', null);
    if (!shown) return;
    const { list, chosen } = placementsOf(state);
    layers.candidates.append(
      ...candidates(
        list.filter((one) => one !== chosen),
        (id) => store.set({ chosen: id, shownRefusal: null }),
      ),
    );
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
   * In the brief, the bearings of its targets from the middle of the plot.
   * @param {State} state
   */
  function drawAims(state) {
    for (const layer of Object.values(layers)) layer.replaceChildren();
    const corners = state.plan.boundary ?? [];
    const centre = corners.length
      ? [0, 1].map(
          (k) =>
            (Math.min(...corners.map((/** @type {number[]} */ corner) => corner[k])) +
              Math.max(...corners.map((/** @type {number[]} */ corner) => corner[k]))) /
            2,
        )
      : [view.x + view.width / 2, view.y + view.height / 2];
    const targets = (state.plan.brief?.targets ?? [])
      .filter((/** @type {any} */ target) => typeof target.bearing === 'number')
      .map((/** @type {any} */ target) => ({
        name: target.name ?? 'target',
        bearing: target.bearing,
        distance: distanceWords(target.bearing, target.distanceKm),
      }));
    const aims = bearings(targets, { middle: toPixels(view, centre), ring: 0 }, view, state.plan.site?.planNorth ?? 0);
    layers.rose.append(inPixels(view, aims.nodes, 'rose-drawing'));
    planView.letter('placement', { labels: aims.labels, symbols: aims.symbols, hide: [] });
  }

  /**
   * @param {State} state
   * @param {any} chosen
   */
  function drawChosen(state, chosen) {
    const plan = state.search.planAtSearch ?? state.plan;
    const planNorth = plan.site?.planNorth ?? 0;
    const length = (/** @type {number} */ metres) => formatLength(metres, state.units, 2);
    /** @type {(metres: number, sense?: import('../../units/length.js').Sense) => string} */
    const distance = (metres, sense) => distanceFigure(metres, state.units, sense);
    const clearances = toDimension(chosen.clearances);
    const band = bandShown(state, chosen);
    const frame = roseFrame(chosen, view);
    const aims = bearings(band?.rose ? targetsOf(plan, band) : [], frame, view, planNorth);
    layers.rose.append(
      inPixels(view, [...aims.nodes, band?.rose ? roseNode(band.rose, frame, planNorth) : null], 'rose-drawing'),
    );
    layers.placement.append(
      ...chosenWire(chosen, view.ppm),
      inPixels(
        view,
        clearances.flatMap((one) => dimension(one, view)),
        'placement-dimensions',
      ),
      ...drag(chosen, plan, view),
    );
    planView.letter('placement', {
      labels: [
        ...clearances.map((one, index) =>
          dimensionLabel(one, index, {
            figure: one.distance < 0 ? `inside by ${distance(-one.distance, 'required')}` : distance(one.distance),
            words: [
              `${one.distance < 0 ? '' : 'to '}${nameIn(plan, one.to)}${one.what && one.what !== 'wire' ? `, ${one.what}` : ''}`,
              `must keep ${distance(one.required, 'required')}`,
            ],
          }),
        ),
        ...aims.labels,
        ...(band?.rose ? [roseLegend(band, view)] : []),
        ...chosen.attachments.map((/** @type {any} */ hold, /** @type {number} */ index) =>
          holdLabel(plan, hold, index, state),
        ),
        ...wireLengths(chosen, view.ppm, length),
      ],
      symbols: [
        ...aims.symbols,
        chosen.feed.at,
        ...chosen.conductors.flatMap((/** @type {any} */ one) =>
          one.points
            .slice(1)
            .flatMap((/** @type {number[]} */ point, /** @type {number} */ index) =>
              along(view, toPixels(view, one.points[index]), toPixels(view, point)),
            ),
        ),
      ],
      hide: chosen.attachments.flatMap((/** @type {any} */ hold) =>
        ['supports', 'supports-short'].map((kind) => `${kind}:${hold.on}`),
      ),
    });
  }

  store.subscribe(
    (state) => [
      state.search,
      state.chosen,
      state.chosenBand,
      state.shownRefusal,
      state.units,
      state.place,
      state.plan.brief,
      state.plan.boundary,
      state.plan.site,
    ],
    ask,
  );
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
  const weight = (/** @type {string} */ name) =>
    (state.plan.brief?.bands ?? []).find((/** @type {any} */ band) => band.name === name)?.weight ?? 1;
  const aimed = rows.filter((/** @type {any} */ row) =>
    row.targets.some((/** @type {any} */ target) => typeof target.bearing === 'number'),
  );
  const heaviest = [...(aimed.length ? aimed : rows)].sort((a, b) => weight(b.name) - weight(a.name))[0];
  return rows.find((/** @type {any} */ row) => row.name === state.chosenBand) ?? heaviest ?? null;
}

/** @param {any} plan @param {any} band */
function targetsOf(plan, band) {
  return band.targets
    .filter((/** @type {any} */ target) => typeof target.bearing === 'number')
    .map((/** @type {any} */ target) => {
      const km = (plan.brief?.targets ?? []).find((/** @type {any} */ one) => one.name === target.name)?.distanceKm;
      return { name: target.name, bearing: target.bearing, distance: distanceWords(target.bearing, km) };
    });
}

/** @param {number} bearing @param {number|undefined} km */
function distanceWords(bearing, km) {
  return `${bearingText(bearing)}${km === undefined ? '' : `  ${number(km, 0)} km`}`;
}

/**
 * The legend takes a free corner; the same is said in the panel for when there is none.
 * @param {any} band
 * @param {import('./labels.js').View} view
 * @returns {import('../kinds/env.js').Label}
 */
function roseLegend(band, view) {
  const [width, height] = [view.width * view.ppm, view.height * view.ppm];
  const [first, ...others] = [
    [100, 28],
    [100, height - 28],
    [width - 200, 28],
    [width - 330, height - 28],
    [width / 2, 28],
  ].map((at) => toMetres(view, at));
  return {
    id: 'rose',
    weight: WEIGHT.legend,
    at: first,
    also: others,
    sit: 'middle',
    lines: [
      { text: `Reach rose, ${band.name} at ${number(band.rose.elevation, 0)}° up`, bold: true },
      { text: 'outside the dotted ring is better' },
    ],
  };
}

/**
 * @param {any} plan
 * @param {any} hold
 * @param {number} index
 * @param {State} state
 * @returns {import('../kinds/env.js').Label}
 */
function holdLabel(plan, hold, index, state) {
  const isNew = (plan.mastZones ?? []).some((/** @type {any} */ zone) => zone.id === hold.on);
  return {
    id: `hold-${index}`,
    weight: WEIGHT.hold - index,
    at: hold.at,
    sit: 'around',
    gap: 13,
    lines: [
      {
        text: `${isNew ? 'New mast' : nameIn(plan, hold.on)} ${formatLength(hold.aboveGround, state.units, 1)}`,
        bold: true,
      },
    ],
  };
}

/** @param {any} plan @param {string} id */
function nameIn(plan, id) {
  for (const kind of [
    'supports',
    'mastZones',
    'bracketLines',
    'buildings',
    'trees',
    'overheadLines',
    'zones',
    'people',
    'metalwork',
  ]) {
    const thing = (plan[kind] ?? []).find((/** @type {any} */ one) => one.id === id);
    if (thing) return thing.name ?? id.replace(/[-_]+/g, ' ');
  }
  return id === 'ground' || id === 'boundary' ? `the ${id}` : id.replace(/[-_]+/g, ' ');
}
