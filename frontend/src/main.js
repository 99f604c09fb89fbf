// @ts-check
/** Wiring: makes the store, mounts the panels, opens the first plot. */
import * as api from './api/client.js';
import { createPlanView } from './draw/planview.js';
import { mountFrame } from './draw/sheetframe.js';
import { mountSurvey } from './draw/survey.js';
import { createStore } from './state/store.js';
import { extentOf } from './state/kinds.js';
import { newPlan } from './state/made.js';

const store = createStore({
  plan: newPlan(),
  planId: null, etag: '', saved: { state: 'saved', at: null }, notice: null, place: 'survey',
  selection: null, tool: 'select', draft: null, cursor: null, hovered: null, units: 'm', faults: [],
  catalogue: null, demos: [], plots: [],
  search: { id: null, state: 'none', progress: 0, what: '', found: [], result: null, error: null, planAtSearch: null },
  chosen: null, chosenBand: null, pinned: null, shownRefusal: null, view: null, hint: 0,
});
store.subscribe((s) => s.place, (place) => {
  document.body.dataset.place = place;
});
const box = /** @type {HTMLElement} */ (document.getElementById('plan-box'));
const view = createPlanView(box, store, extentOf);
mountSurvey(view, store);
mountFrame(view, store);
api.demos().then((d) => api.demo(d[1].name)).then((plan) => store.load(plan, { view: null }));
