// @ts-check
/** Wiring: makes the store, mounts the panels, opens the first plot. */
import * as api from './api/client.js';
import * as keep from './api/keep.js';
import * as pictures from './api/pictures.js';
import { mountDraft } from './draw/draft.js';
import { mountFaults } from './draw/faults.js';
import { mountFocus } from './draw/focus.js';
import { mountHandles } from './draw/handles.js';
import { mount as mountPlacementLayer } from './draw/placement/layer.js';
import { mountInput, viewKey, zoomBy } from './draw/planinput.js';
import { createPlanView } from './draw/planview.js';
import { mountFrame } from './draw/sheetframe.js';
import { mountSurvey } from './draw/survey.js';
import { mountTrace } from './draw/trace.js';
import { mount as mountBrief } from './panels/brief.js';
import { mount as mountFaultNote } from './panels/faultnote.js';
import { mount as mountHints } from './panels/hints.js';
import { createPlots } from './panels/plots.js';
import { mount as mountPlacement } from './panels/placement.js';
import { mount as mountPlacements } from './panels/placements.js';
import { mount as mountRefusals } from './panels/refusals.js';
import { mount as mountSheet } from './panels/sheet.js';
import { mountFoot, mountHead, PLACES } from './panels/shell.js';
import { mount as mountSurveyPanel } from './panels/survey.js';
import { mount as mountTools } from './panels/surveytools.js';
import { mount as mountTyping } from './panels/surveytyping.js';
import { createChecker } from './state/checker.js';
import { createKeeper } from './state/keeper.js';
import { extentOf } from './state/kinds.js';
import { newPlan } from './state/made.js';
import { createStore } from './state/store.js';
import { createDesk, STRIP } from './tools/desk.js';
import { parseDirectionFrom } from './units/angle.js';
import { parseLength } from './units/length.js';

/** @param {string} id @returns {HTMLElement} */
const part = (id) => /** @type {HTMLElement} */ (document.getElementById(id));

const store = createStore({
  plan: newPlan(''), planId: null, etag: '', saved: { state: 'saved', at: null }, notice: null, clash: null,
  place: 'survey', selection: null, tool: 'select', draft: null, cursor: null, hovered: null, units: 'm',
  faults: [], catalogue: null, demos: [], plots: [],
  search: { id: null, state: 'none', progress: 0, what: '', found: [], result: null, error: null, planAtSearch: null },
  chosen: null, chosenBand: null, pinned: null, shownRefusal: null, view: null, hint: 0, trace: null,
});

/** @param {string} sentence told to screen readers */
const say = (sentence) => {
  part('news').textContent = sentence;
};
const planView = createPlanView(part('plan-box'), store, extentOf);
const desk = createDesk({
  store,
  say,
  length: (text) => parseLength(text, store.get().units),
  direction: parseDirectionFrom,
  middle() {
    const { x, y, width, height, ppm } = planView.sight();
    return { at: [x + width / 2, y + height / 2], ppm };
  },
});
const keeper = createKeeper(store, api, keep, say);
createChecker(store, api.check);

/** @param {string} place */
const go = (place) => {
  location.hash = place;
};
const plots = createPlots(store, keeper, say);
document.body.append(plots.root);
const shell = {
  api, pictures, say, go, planView, desk, keeper, strip: STRIP, saveNow: keeper.saveNow, plots: plots.open,
  sideView: part('side-view'),
  zoom: (/** @type {number} */ factor) => zoomBy(planView, factor),
};

mountTrace(planView, store);
mountSurvey(planView, store);
mountPlacementLayer(planView, store, shell);
mountDraft(planView, store);
mountHandles(planView, store);
mountFaults(planView, store);
mountFocus(planView);
mountFrame(planView, store);
mountInput(planView, (event) => store.get().place === 'survey' && (freeze(event), desk.pointer(event)));
mountHead({ brand: part('brand'), places: part('places'), state: part('state') }, store, shell);
mountFoot(part('foot'), store, shell);
mountTools(part('survey-tools'), store, shell);
mountSurveyPanel(part('survey'), store, shell);
mountTyping(part('plan-box'), store, shell);
mountFaultNote(part('plan-box'), store, shell);
mountHints(part('plan-box'), store, shell);
mountBrief(part('brief'), store, shell);
mountPlacements(part('placements'), store, shell);
mountRefusals(part('refusals'), store, shell);
mountPlacement(part('placement'), store, shell);
mountSheet(part('sheet'), store, shell);

/** Once a hand is on the plan its view stays as it is when the window changes. @param {any} event */
function freeze(event) {
  if (event.type === 'down' && store.get().view === null) {
    const { ppm: _ppm, ...sight } = planView.sight();
    store.set({ view: sight });
  }
}

function placeFromAddress() {
  const named = location.hash.slice(1);
  const place = PLACES.find((one) => one === named) ?? (named === '' ? 'survey' : null);
  if (place === null || place === store.get().place) return;
  desk.rest();
  store.set({ place });
}
addEventListener('hashchange', placeFromAddress);
placeFromAddress();

document.addEventListener('keydown', (event) => {
  const target = event.target instanceof Element ? event.target : null;
  const typing = target?.closest('input, textarea, select, dialog');
  const key = { key: event.key, shift: event.shiftKey, ctrl: event.ctrlKey || event.metaKey, alt: event.altKey };
  const thing = target?.closest('.plan [data-ref]');
  if (typing && !(key.ctrl && ['z', 'y'].includes(event.key.toLowerCase()) && !target?.matches('input[type=text], textarea'))) return;
  if (thing && (event.key === 'Enter' || event.key === ' ') && store.get().tool === 'select' && store.get().place === 'survey') {
    store.set({ selection: { ref: thing.getAttribute('data-ref') ?? '', vertex: null } });
    event.preventDefault();
    return;
  }
  const button = target?.closest('button, a, summary, [role=slider]');
  if (button && (event.key === 'Enter' || event.key === ' ' || event.key.startsWith('Arrow'))) return;
  const onPlan = !target || target === document.body || Boolean(target.closest('#plan-box'));
  // Letters and figures are short cuts only where no panel is being used (WCAG 2.2, 2.1.4).
  const elsewhere = target?.closest('#right, #top, #sheet, #placements, #refusals, .cursor-box, .hint, .notice');
  if (elsewhere && !key.ctrl && event.key.length === 1) return;
  if (desk.key(key) || viewKey(planView, key, onPlan && store.get().place !== 'sheet' && !store.get().selection)) event.preventDefault();
});
planView.root.addEventListener('focusin', (event) => {
  const ref = event.target instanceof Element ? event.target.closest('[data-ref]')?.getAttribute('data-ref') : null;
  store.set({ hovered: ref ?? null });
});
// A tool taken from the strip or the ledger by key: arrows and Enter go to the plan from then on.
store.subscribe((s) => s.tool, (tool) => {
  if (tool !== 'select' && document.activeElement?.closest('button, a')) planView.root.focus({ preventScroll: true });
});
addEventListener('online', () => keeper.retry());
addEventListener('pagehide', () => store.get().opened && keeper.remember());

store.subscribe((s) => s.hint, (hint, before) => {
  if (before && hint === 0) keep.rememberHints();
});
store.subscribe((s) => s.units, () => {
  if (store.get().opened) keeper.remember();
});

/** The catalogue and the demo plots, then the first plot; tried again while the server is away. */
async function begin() {
  try {
    const [catalogue, demos] = await Promise.all([api.catalogue(), api.demos()]);
    store.set({ catalogue, demos });
  } catch {
    store.set({ saved: { state: 'offline', at: null } });
    setTimeout(begin, 4000);
    if (!keep.read() || store.get().opened) return;
  }
  if (store.get().opened) return;
  const first = await keeper.start();
  if (first && !keep.hintsSeen()) store.set({ hint: 1 });
}
begin();
