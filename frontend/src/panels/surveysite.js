// @ts-check
/** The plot as a whole: its name, notes, where it lies, north, ground. */
import { withField } from '../state/edits.js';
import { number } from '../units/figures.js';
import { el } from './el.js';
import { box, choice } from './fields.js';

/** @typedef {import('../state/store.js').Store} Store */

/** @param {Store} store @returns {{root: HTMLElement, show: () => void}} */
export function site(store) {
  const getUnits = () => store.get().units;
  /** @param {string} path @param {any} value @param {string} label */
  const set = (path, value, label) => store.edit(label, (plan) => withField(plan, path.split('.'), value ?? undefined));
  const boxes = [
    { path: 'title', box: box({ id: 'plot-title', label: 'Name of the plot', type: 'text', getUnits, onchange: (v) => set('title', v, 'Rename the plot') }) },
    { path: 'site.planNorth', box: box({ id: 'site-north', label: 'Plan\u2019s up points to', type: 'direction', getUnits, hint: 'True bearing of the way up the drawing.', onchange: (v) => set('site.planNorth', v, 'Set north') }) },
    { path: 'site.magneticVariation', box: box({ id: 'site-variation', label: 'Magnetic variation', type: 'degrees', optional: true, least: -180, most: 180, getUnits, hint: 'East positive; 6° W is −6.', onchange: (v) => set('site.magneticVariation', v, 'Set the variation') }) },
    { path: 'site.latitude', box: box({ id: 'site-latitude', label: 'Latitude', type: 'degrees', optional: true, least: -90, most: 90, getUnits, onchange: (v) => set('site.latitude', v, 'Set the latitude') }) },
    { path: 'site.longitude', box: box({ id: 'site-longitude', label: 'Longitude', type: 'degrees', optional: true, least: -180, most: 180, getUnits, onchange: (v) => set('site.longitude', v, 'Set the longitude') }) },
    { path: 'notes', box: box({ id: 'plot-notes', label: 'Notes', type: 'notes', optional: true, getUnits, onchange: (v) => set('notes', v ?? '', 'Write notes') }) },
  ];
  const [title, north, variation, latitude, longitude, notes] = boxes.map((b) => b.box);
  const soilHead = el('div');
  let soils = choice({ id: 'site-soil', label: 'Ground', options: [], onchange: setSoil });
  soilHead.append(soils.root);
  const permittivity = box({ id: 'site-permittivity', label: 'Permittivity', type: 'number', least: 1, most: 100, getUnits, onchange: (v) => setGround({ permittivity: v }) });
  const conductivity = box({ id: 'site-conductivity', label: 'Conductivity, S/m', type: 'number', least: 0, most: 10, getUnits, onchange: (v) => setGround({ conductivity: v }) });

  /** @param {any} patch */
  function setGround(patch) {
    store.edit('Set the ground', (plan) => {
      const now = plan.site?.ground ?? { permittivity: 13, conductivity: 0.005 };
      return withField(plan, ['site', 'ground'], { ...now, ...patch });
    });
  }

  /** @param {string} id */
  function setSoil(id) {
    const soil = (store.get().catalogue?.soils ?? []).find((/** @type {any} */ s) => s.id === id);
    if (soil) setGround({ permittivity: soil.permittivity, conductivity: soil.conductivity });
  }

  store.subscribe((s) => s.catalogue, (catalogue) => {
    const options = (catalogue?.soils ?? []).map((/** @type {any} */ s) => ({
      value: s.id, label: `${s.name} (${number(s.permittivity, 0)}, ${s.conductivity} S/m)`,
    }));
    soils = choice({ id: 'site-soil', label: 'Ground', options: [...options, { value: '', label: 'its own figures' }], onchange: setSoil });
    soilHead.replaceChildren(soils.root);
    show();
  });

  function show() {
    const { plan, units, catalogue } = store.get();
    for (const { path, box: one } of boxes) {
      const value = path.split('.').reduce((so, key) => so?.[key], plan);
      one.show(value ?? (path === 'site.planNorth' || path === 'site.magneticVariation' ? 0 : value), units);
    }
    const ground = plan.site?.ground ?? { permittivity: 13, conductivity: 0.005 };
    const match = (catalogue?.soils ?? []).find((/** @type {any} */ s) => s.permittivity === ground.permittivity && s.conductivity === ground.conductivity);
    soils.show(match?.id ?? '', units);
    permittivity.show(ground.permittivity, units);
    conductivity.show(ground.conductivity, units);
  }

  const halves = (/** @type {any[]} */ ...list) => el('div', { class: 'halves' }, list.map((b) => b.root));
  const root = el('details', { class: 'site', id: 'site' }, [
    el('summary', { text: 'Plot, north and ground' }),
    title.root, halves(north, variation), halves(latitude, longitude), soilHead, halves(permittivity, conductivity), notes.root,
  ]);
  return { root, show };
}
