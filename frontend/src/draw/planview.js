// @ts-check
/**
 * The plan on the screen: one SVG whose viewBox is in metres, turned y-up once, with named layers.
 * Strokes and lettering stay in screen pixels: lines by `vector-effect`, symbols and text by
 * `atPlace` (svg.js), drawn anew when the scale changes.
 */
import { around, shaped } from '../geometry/view.js';
import { figure, set, svg } from './svg.js';

/** @typedef {import('../geometry/vector.js').Point} Point */
/** @typedef {import('../state/types.js').View & {ppm: number}} Sight a view and its scale, pixels per metre */

/**
 * @typedef {object} PlanView
 * @property {HTMLElement} box the element the plan fills
 * @property {SVGSVGElement} root
 * @property {(name: string) => SVGGElement} layer a group in plan metres, y north; made at need, on top
 * @property {(callback: (sight: Sight) => void) => () => void} onView at once and on every change
 * @property {() => Sight} sight
 * @property {(view: import('../state/types.js').View) => void} setView
 * @property {() => void} fit shows the whole plot
 * @property {(clientX: number, clientY: number) => Point} toPlan
 * @property {(p: Point) => [number, number]} toScreen pixels from the left and top of the box
 * @property {(name: string, letters: import('./kinds/env.js').Letters|null) => void} letter
 *   gives the lettering of one drawing over the plot; null takes it away
 * @property {() => import('./kinds/env.js').Letters[]} letters
 * @property {(callback: () => void) => void} onLetters whenever `letter` was called
 * @property {() => {left: number, top: number, width: number, height: number}} frame
 *   the drawing's frame within the box, pixels
 */

/** Layers from the ground up; what must be kept from an overhead line lies over every roof. */
const LAYERS = [
  'ground', 'grid', 'areas', 'canopies', 'buildings', 'zones', 'corridors', 'boundary', 'metal',
  'lines', 'supports', 'points', 'rose', 'candidates', 'ghosts', 'placement', 'labels', 'draft',
  'handles', 'faults',
];

/**
 * @param {HTMLElement} box
 * @param {import('../state/store.js').Store} store
 * @param {(plan: any) => Point[]} extent the points that `fit` must show
 * @returns {PlanView}
 */
export function createPlanView(box, store, extent) {
  const root = /** @type {SVGSVGElement} */ (svg('svg', { class: 'plan', role: 'group', tabindex: -1, 'aria-label': 'Plan of the plot' }));
  const upright = svg('g', { transform: 'matrix(1 0 0 -1 0 0)' });
  root.append(svg('defs'), upright);
  box.append(root);
  /** @type {Map<string, SVGGElement>} */
  const layers = new Map();
  /** @type {Set<(sight: Sight) => void>} */
  const watchers = new Set();
  /** @type {Map<string, import('./kinds/env.js').Letters>} */
  const letters = new Map();
  /** @type {Set<() => void>} */
  const letterers = new Set();
  let frame = { left: 0, top: 0, width: 1, height: 1 };
  /** @type {Sight} */
  let sight = { x: 0, y: 0, width: 1, height: 1, ppm: 1 };

  /** @param {string} name */
  function layer(name) {
    let group = layers.get(name);
    if (!group) {
      group = /** @type {SVGGElement} */ (svg('g', { class: `layer layer-${name}` }));
      layers.set(name, group);
      upright.append(group);
    }
    return group;
  }
  LAYERS.forEach(layer);

  const ratio = () => frame.width / frame.height;

  function show() {
    const state = store.get();
    const wanted = state.view
      ? shaped(state.view, ratio())
      : around(extent(state.plan), 0.07, ratio());
    // shaped() grows a view that has another shape than the frame; one of the right shape stays.
    sight = { ...wanted, ppm: frame.width / wanted.width };
    set(root, {
      viewBox: [sight.x, -(sight.y + sight.height), sight.width, sight.height].map(figure).join(' '),
    });
    for (const watcher of [...watchers]) watcher(sight);
  }

  function measure() {
    const rect = box.getBoundingClientRect();
    if (rect.width < 8 || rect.height < 8) return;
    const inset = rect.width < 560 ? { l: 0, t: 0, r: 0, b: 0 } : { l: 30, t: 8, r: 8, b: 22 };
    frame = {
      left: inset.l,
      top: inset.t,
      width: Math.max(8, rect.width - inset.l - inset.r),
      height: Math.max(8, rect.height - inset.t - inset.b),
    };
    box.classList.toggle('no-margin', inset.l === 0);
    root.style.left = `${frame.left}px`;
    root.style.top = `${frame.top}px`;
    root.style.width = `${frame.width}px`;
    root.style.height = `${frame.height}px`;
    show();
  }

  new ResizeObserver(measure).observe(box);
  store.subscribe((s) => [s.view, s.opened], show);
  measure();

  return {
    box,
    root,
    layer,
    onView(callback) {
      watchers.add(callback);
      callback(sight);
      return () => watchers.delete(callback);
    },
    sight: () => sight,
    setView: (view) => store.set({ view: shaped(view, ratio()) }),
    fit: () => store.set({ view: around(extent(store.get().plan), 0.07, ratio()) }),
    toPlan(clientX, clientY) {
      const rect = box.getBoundingClientRect();
      return [
        sight.x + (clientX - rect.left - frame.left) / sight.ppm,
        sight.y + sight.height - (clientY - rect.top - frame.top) / sight.ppm,
      ];
    },
    toScreen: (p) => [
      frame.left + (p[0] - sight.x) * sight.ppm,
      frame.top + (sight.y + sight.height - p[1]) * sight.ppm,
    ],
    letter(name, part) {
      if (part === null && !letters.has(name)) return;
      if (part === null) letters.delete(name);
      else letters.set(name, part);
      for (const letterer of letterers) letterer();
    },
    letters: () => [...letters.values()],
    onLetters: (callback) => void letterers.add(callback),
    frame: () => frame,
  };
}
