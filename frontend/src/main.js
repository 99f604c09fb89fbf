// @ts-check
/** Wiring: makes the store, mounts the panels, opens the first plot. */
import * as api from './api/client.js';
import { createStore } from './state/store.js';

const store = createStore({
  plan: { format: 'spanwright-plan/1', title: '', boundary: [] },
  planId: null, etag: '', saved: { state: 'saved', at: null }, notice: null, place: 'survey',
  selection: null, tool: 'select', draft: null, cursor: null, hovered: null, units: 'm', faults: [],
  catalogue: null, demos: [], plots: [],
  search: { id: null, state: 'none', progress: 0, what: '', found: [], result: null, error: null, planAtSearch: null },
  chosen: null, chosenBand: null, pinned: null, shownRefusal: null, view: null, hint: 0,
});
store.subscribe((s) => s.place, (place) => {
  document.body.dataset.place = place;
});
void api;
