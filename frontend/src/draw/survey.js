// @ts-check
/**
 * The plot itself: every thing of the plan in its layer, kept by ref and drawn anew only when it,
 * the scale or the units change. Each thing is a button a keyboard and a screen reader can reach.
 */
import { KINDS, pointsOf, things } from '../state/kinds.js';
import { DRAWERS } from './kinds/index.js';
import { createLettering } from './lettering.js';
import { set, svg } from './svg.js';
import { spoken } from './words.js';

/** More things than this are not drawn anew at every step of a zoom. */
const MANY = 120;

/**
 * @typedef {object} Kept
 * @property {any} thing
 * @property {string} stamp what else its drawing depends on
 * @property {SVGGElement} main
 * @property {SVGGElement[]} under
 * @property {import('./kinds/env.js').Label[]} labels
 * @property {any} plan the plan it was last drawn in
 */

/**
 * @param {import('./planview.js').PlanView} view
 * @param {import('../state/store.js').Store} store
 */
export function mountSurvey(view, store) {
  /** @type {Map<string, Kept>} */
  const kept = new Map();
  const lettering = createLettering(view);
  addPatterns(view);
  let pending = 0;
  /** @type {number|undefined} */
  let resting;
  /** @type {{labels: import('./kinds/env.js').Label[], symbols: number[][], lines: number[][][]}} */
  let own = { labels: [], symbols: [], lines: [] };

  /** Things can be taken hold of in Survey; elsewhere the Tab key passes them by. */
  const reachable = () => (store.get().place === 'survey' ? 0 : -1);

  /** @param {string} ref @returns {SVGGElement} */
  const group = (ref) => /** @type {SVGGElement} */ (svg('g', { 'data-ref': ref, class: 'thing' }));

  function draw() {
    pending = 0;
    const { plan, units, selection } = store.get();
    const { ppm } = view.sight();
    const px = 1 / ppm;
    const all = things(plan);
    const present = new Set(all.map((t) => t.ref));
    for (const [ref, old] of kept) {
      if (present.has(ref)) continue;
      old.main.remove();
      old.under.forEach((g) => g.remove());
      kept.delete(ref);
    }
    /** @type {import('./kinds/env.js').Label[]} */
    const labels = [];
    for (const { ref, kind, thing, index } of all) {
      const selected = selection?.ref === ref;
      const leans = ['entry', 'supports', 'boundary'].includes(kind);
      const stamp = `${px} ${units} ${index} ${selected}`;
      let one = kept.get(ref);
      const stale =
        !one || one.thing !== thing || one.stamp !== stamp || (leans && one.plan !== plan && beside(one.plan, plan));
      if (stale) {
        if (!one) {
          one = { thing, stamp, main: group(ref), under: [], labels: [], plan };
          set(one.main, { tabindex: reachable(), role: 'button' });
          kept.set(ref, one);
        }
        const env = { px, units, plan, selected };
        const drawn = DRAWERS[kind].draw(thing, env);
        one.thing = thing;
        one.stamp = stamp;
        one.main.replaceChildren(...drawn.nodes.filter((n) => n !== null));
        set(one.main, { 'aria-label': spoken(kind, thing, index, units) });
        one.main.classList.toggle('selected', selected);
        set(one.main, { 'aria-pressed': selected ? 'true' : 'false' });
        if (!one.main.parentNode) view.layer(drawn.layer).append(one.main);
        one.under.forEach((g) => g.remove());
        one.under = (drawn.under ?? []).map((part) => {
          const g = /** @type {SVGGElement} */ (svg('g', { class: 'part' }, part.nodes));
          view.layer(part.layer).append(g);
          return g;
        });
        one.labels = pointsOf(kind, thing).length ? DRAWERS[kind].label(thing, env, index) : [];
      }
      if (one) one.plan = plan;
      labels.push(...(one?.labels ?? []));
    }
    own = { labels, symbols: symbolsOf(all), lines: linesOf(all) };
    letter();
  }

  function letter() {
    const others = view.letters();
    const hidden = new Set(others.flatMap((other) => other.hide));
    const labels = own.labels.filter((label) => !hidden.has(label.id) && !hidden.has(label.insteadOf ?? ''));
    lettering.show(
      [...labels, ...others.flatMap((other) => other.labels)],
      [...own.symbols, ...others.flatMap((other) => other.symbols)],
      own.lines,
    );
  }

  function atRest() {
    clearTimeout(resting);
    resting = setTimeout(soon, 90);
  }

  function soon() {
    if (!pending) pending = requestAnimationFrame(draw);
  }

  store.subscribe((s) => [s.plan, s.units, s.selection], soon);
  view.onLetters(letter);
  let scale = 0;
  view.onView((sight) => {
    if (sight.ppm !== scale) {
      scale = sight.ppm;
      setPatterns(view, 1 / sight.ppm);
      // A large plot is drawn anew when the zooming rests; until then symbols grow with the plan.
      if (kept.size > MANY) atRest();
      else soon();
    } else {
      lettering.moved();
    }
  });
  store.subscribe((s) => s.place, () => {
    for (const { main } of kept.values()) set(main, { tabindex: reachable() });
  });
  store.subscribe((s) => s.hovered, (ref, before) => {
    if (before) kept.get(before)?.main.classList.remove('hovered');
    if (ref) kept.get(ref)?.main.classList.add('hovered');
  });
}

/** What symbols a thing leans on has changed. @param {any} a @param {any} b */
const beside = (a, b) => a?.buildings !== b?.buildings || a?.boundaryRules !== b?.boundaryRules;

/** Places of symbols, which lettering must not cover. @param {ReturnType<typeof things>} all */
const symbolsOf = (all) =>
  all.flatMap(({ kind, thing }) =>
    ['supports', 'datums', 'entry', 'noise'].includes(kind) ? pointsOf(kind, thing) : [],
  );

/** Lines that lettering had better not lie on. @param {ReturnType<typeof things>} all @returns {number[][][]} */
const linesOf = (all) =>
  all.flatMap(({ kind, thing }) => {
    const { shape } = KINDS[kind];
    if (shape === 'point' || kind === 'people') return [];
    const points = pointsOf(kind, thing);
    return points.slice(shape === 'ring' ? 0 : 1).map((p, i) => [points[shape === 'ring' ? (i || points.length) - 1 : i], p]);
  });

/** @param {import('./planview.js').PlanView} view */
function addPatterns(view) {
  const line = (/** @type {string} */ d) => svg('path', { d, class: 'hatch-line' });
  const pattern = (/** @type {string} */ id, /** @type {Node[]} */ nodes) =>
    svg('pattern', { id, width: 5.5, height: 5.5, patternUnits: 'userSpaceOnUse' }, nodes);
  view.root.querySelector('defs')?.append(
    pattern('hatch', [line('M0 0H5.5')]),
    pattern('hatch-metal', [line('M0 0H5.5M0 0V5.5')]),
  );
}

/** Patterns keep their size on the screen. @param {import('./planview.js').PlanView} view @param {number} px */
function setPatterns(view, px) {
  for (const id of ['hatch', 'hatch-metal']) {
    const pattern = view.root.querySelector(`#${id}`);
    if (pattern) set(pattern, { patternTransform: `scale(${px}) rotate(45)` });
  }
}
