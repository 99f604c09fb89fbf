// @ts-check
/** Kind of thing to what draws it and what letters it. */
import { drawMastZone, drawPeople, drawZone, labelMastZone, labelPeople, labelZone } from './areas.js';
import { drawBoundary, labelBoundary } from './boundary.js';
import { drawBuilding, labelBuilding } from './building.js';
import {
  drawBracketLine, drawMetalwork, drawOverheadLine, labelBracketLine, labelMetalwork, labelOverheadLine,
} from './lines.js';
import {
  drawDatum, drawEntry, drawNoise, drawSpot, labelDatum, labelEntry, labelNoise, labelSpot,
} from './points.js';
import { drawSupport, drawTree, labelSupport, labelTree } from './support.js';

/** @type {Record<string, {draw: (thing: any, env: import('./env.js').Env) => import('./env.js').Drawn, label: (thing: any, env: import('./env.js').Env, index: number) => import('./env.js').Label[]}>} */
export const DRAWERS = {
  people: { draw: drawPeople, label: labelPeople },
  zones: { draw: drawZone, label: labelZone },
  mastZones: { draw: drawMastZone, label: labelMastZone },
  trees: { draw: drawTree, label: labelTree },
  buildings: { draw: drawBuilding, label: labelBuilding },
  boundary: { draw: drawBoundary, label: labelBoundary },
  bracketLines: { draw: drawBracketLine, label: labelBracketLine },
  metalwork: { draw: drawMetalwork, label: labelMetalwork },
  overheadLines: { draw: drawOverheadLine, label: labelOverheadLine },
  supports: { draw: drawSupport, label: labelSupport },
  noise: { draw: drawNoise, label: labelNoise },
  spots: { draw: drawSpot, label: labelSpot },
  entry: { draw: drawEntry, label: labelEntry },
  datums: { draw: drawDatum, label: labelDatum },
};
