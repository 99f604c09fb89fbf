// @ts-check
import { contains } from '../geometry/polygon.js';
import { groundOf } from './ground.js';
import { roofHeight } from './roof.js';

/**
 * What lies along the wire: the placement and the plan unrolled onto a vertical plane. `s` is the distance along the
 * wire's course on the plan, `z` the height above the plan's zero, both in metres. Pure.
 *
 * @typedef {[number, number]} Station s, z
 * @typedef {{s0: number, s1: number, from: number, to: number, name: string, own: boolean}} CanopyCut
 * @typedef {{name: string, outline: Station[]}} BuildingCut
 * @typedef {{s: number, foot: number, top: number, aboveGround: number, name: string, kind: string, isNew: boolean}} HoldCut
 * @typedef {{s: number, top: number, bottom: number, to: string}} Drop the least height of the wire over what is under it
 */

const STEP = 0.1;

/**
 * @param {any} plan
 * @param {any} placement an element of `placements`
 */
export function alongWire(plan, placement) {
  const track = trackOf(placement.spans);
  const ground = groundOf(plan.site?.terrain?.spots ?? []);
  const places = new Map(
    ['supports', 'mastZones', 'bracketLines'].flatMap((kind) =>
      (plan[kind] ?? []).map((/** @type {any} */ thing) => [thing.id, { ...thing, is: kind }]),
    ),
  );
  const stations = walk(track);
  /** @type {BuildingCut[]} */
  const buildings = (plan.buildings ?? []).flatMap((/** @type {any} */ building) =>
    cutBuilding(building, stations, ground),
  );
  return {
    length: track.length,
    ground: stations.map(({ s, x, y }) => /** @type {Station} */ ([s, ground(x, y)])),
    runs: track.spans.map((span) => span.map((point) => /** @type {Station} */ ([point.s, point.z]))),
    wires: placement.conductors.map((/** @type {any} */ conductor) => unroll(track, conductor.points)),
    feedLine: unroll(track, placement.feed.path ?? []),
    feed: unroll(track, [placement.feed.at])[0],
    holds: holdsOf(placement, track, places, ground),
    guys: guysOf(placement, track),
    buildings,
    canopies: canopiesOf(plan, placement, stations, ground),
    lines: crossings(plan, track, ground),
    drops: dropsOf(track, buildings, ground),
  };
}

/**
 * @typedef {{s: number, x: number, y: number, z: number}} TrackPoint
 * @typedef {{spans: TrackPoint[][], length: number}} Track
 * @param {any[]} spans
 * @returns {Track}
 */
export function trackOf(spans) {
  let s = 0;
  /** @type {number[]|null} */
  let last = null;
  const unrolled = spans.map((span) =>
    span.points.map((/** @type {number[]} */ point, /** @type {number} */ index) => {
      if (last && index > 0) s += Math.hypot(point[0] - last[0], point[1] - last[1]);
      last = point;
      return { s, x: point[0], y: point[1], z: point[2] };
    }),
  );
  return { spans: unrolled, length: s };
}

/**
 * Even steps along the course, with a little of the ground before and after it.
 * @param {Track} track
 */
function walk(track) {
  const points = track.spans.flat();
  const out = [];
  let index = 0;
  for (let s = 0; s <= track.length + 1e-9; s += STEP) {
    while (index < points.length - 2 && points[index + 1].s < s) index++;
    const [a, b] = [points[index], points[Math.min(index + 1, points.length - 1)]];
    const share = b.s > a.s ? (s - a.s) / (b.s - a.s) : 0;
    out.push({ s, x: a.x + share * (b.x - a.x), y: a.y + share * (b.y - a.y), z: a.z + share * (b.z - a.z) });
  }
  const beyond = (/** @type {TrackPoint} */ from, /** @type {TrackPoint} */ to, /** @type {number} */ way) => {
    const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
    return Array.from({ length: 40 }, (_, k) => {
      const more = (k + 1) * STEP;
      return {
        s: to.s + way * more,
        z: NaN,
        x: to.x + ((to.x - from.x) / length) * more,
        y: to.y + ((to.y - from.y) / length) * more,
      };
    });
  };
  if (out.length < 2) return out;
  const before = beyond(out[Math.min(5, out.length - 1)], out[0], -1).reverse();
  const after = beyond(out[Math.max(0, out.length - 6)], out[out.length - 1], 1);
  return [...before, ...out, ...after];
}

/**
 * @param {Track} track
 * @param {number[][]} points
 * @returns {Station[]} each at the place on the course nearest to it on the plan, never going back
 */
function unroll(track, points) {
  const course = track.spans.flat();
  return points.map((point) => {
    let best = { distance: Infinity, s: 0 };
    for (let index = 1; index < course.length; index++) {
      const [a, b] = [course[index - 1], course[index]];
      const [dx, dy] = [b.x - a.x, b.y - a.y];
      const square = dx * dx + dy * dy;
      const share =
        square === 0 ? 0 : Math.min(1, Math.max(0, ((point[0] - a.x) * dx + (point[1] - a.y) * dy) / square));
      const distance =
        Math.hypot(a.x + share * dx - point[0], a.y + share * dy - point[1]) +
        0.01 * Math.abs(a.z + share * (b.z - a.z) - point[2]);
      if (distance < best.distance) best = { distance, s: a.s + share * (b.s - a.s) };
    }
    return /** @type {Station} */ ([best.s, point[2]]);
  });
}

/**
 * @param {any} placement
 * @param {Track} track
 * @param {Map<string, any>} places
 * @param {(x: number, y: number) => number} ground
 * @returns {HoldCut[]}
 */
function holdsOf(placement, track, places, ground) {
  return placement.attachments.map((/** @type {any} */ hold, /** @type {number} */ index) => {
    const before = track.spans[index - 1];
    const after = track.spans[index];
    const s = after ? after[0].s : before ? before[before.length - 1].s : 0;
    const thing = places.get(hold.on) ?? { is: 'supports', kind: 'other' };
    const mast = placement.masts.find(
      (/** @type {any} */ one) =>
        one.zone === hold.on && Math.hypot(one.foot[0] - hold.at[0], one.foot[1] - hold.at[1]) < 0.5,
    );
    return {
      s,
      top: hold.at[2],
      aboveGround: hold.aboveGround,
      foot: mast ? mast.foot[2] : ground(hold.at[0], hold.at[1]),
      name: thing.name ?? hold.on,
      kind: thing.is === 'mastZones' ? 'mast' : thing.is === 'bracketLines' ? 'wall' : (thing.kind ?? 'other'),
      isNew: thing.is === 'mastZones',
    };
  });
}

/**
 * @param {any} placement
 * @param {Track} track
 * @returns {Station[][]} as far along the course as they reach, seen from the side
 */
function guysOf(placement, track) {
  return placement.ropes
    .filter((/** @type {any} */ rope) => rope.what === 'guy')
    .map((/** @type {any} */ rope) => {
      const head = rope.points[0];
      const foot = rope.points[rope.points.length - 1];
      const hold = track.spans[rope.attachment]?.[0] ?? track.spans[rope.attachment - 1]?.slice(-1)[0];
      if (!hold) return [];
      const span = track.spans[rope.attachment] ?? track.spans[rope.attachment - 1];
      const [a, b] = [span[0], span[span.length - 1]];
      const length = Math.hypot(b.x - a.x, b.y - a.y) || 1;
      const along = ((foot[0] - head[0]) * (b.x - a.x) + (foot[1] - head[1]) * (b.y - a.y)) / length;
      return [
        [hold.s, head[2]],
        [hold.s + along, foot[2]],
      ];
    })
    .filter((/** @type {Station[]} */ guy) => guy.length > 0);
}

/**
 * @param {any} building
 * @param {TrackPoint[]} stations
 * @param {(x: number, y: number) => number} ground
 * @returns {BuildingCut[]} one for each time the course crosses it
 */
function cutBuilding(building, stations, ground) {
  /** @type {BuildingCut[]} */
  const cuts = [];
  /** @type {Station[]} */
  let roof = [];
  const close = () => {
    if (roof.length > 1) {
      const [first, last] = [roof[0], roof[roof.length - 1]];
      const foot = (/** @type {Station} */ at) => {
        const station = stations.find((one) => Math.abs(one.s - at[0]) < 1e-6);
        return /** @type {Station} */ ([at[0], station ? ground(station.x, station.y) : 0]);
      };
      cuts.push({ name: building.name ?? building.id, outline: [foot(first), ...roof, foot(last)] });
    }
    roof = [];
  };
  for (const { s, x, y } of stations) {
    if (contains([x, y], building.footprint)) roof.push([s, ground(x, y) + roofHeight(building, x, y)]);
    else close();
  }
  close();
  return cuts;
}

/**
 * @param {any} plan
 * @param {any} placement
 * @param {TrackPoint[]} stations
 * @param {(x: number, y: number) => number} ground
 * @returns {CanopyCut[]}
 */
function canopiesOf(plan, placement, stations, ground) {
  const held = new Set(placement.attachments.map((/** @type {any} */ hold) => hold.on));
  return [...(plan.supports ?? []), ...(plan.trees ?? [])]
    .filter((tree) => tree.canopy)
    .flatMap((tree) => {
      const { radius, from, to } = tree.canopy;
      const under = stations.filter(({ x, y }) => Math.hypot(x - tree.at[0], y - tree.at[1]) <= radius);
      if (under.length < 2) return [];
      const base = ground(tree.at[0], tree.at[1]);
      return [
        {
          s0: under[0].s,
          s1: under[under.length - 1].s,
          from: base + from,
          to: base + to,
          name: tree.name ?? tree.id,
          own: held.has(tree.id),
        },
      ];
    });
}

/**
 * Where overhead lines cross the course on the plan.
 * @param {any} plan
 * @param {Track} track
 * @param {(x: number, y: number) => number} ground
 * @returns {{s: number, z: number, name: string, kind: string}[]}
 */
function crossings(plan, track, ground) {
  const course = track.spans.flat();
  return (plan.overheadLines ?? []).flatMap((/** @type {any} */ line) => {
    const found = [];
    for (let k = 1; k < line.path.length; k++) {
      const [p, q] = [line.path[k - 1], line.path[k]];
      for (let index = 1; index < course.length; index++) {
        const [a, b] = [course[index - 1], course[index]];
        const cross = (b.x - a.x) * (q[1] - p[1]) - (b.y - a.y) * (q[0] - p[0]);
        if (Math.abs(cross) < 1e-12) continue;
        const t = ((p[0] - a.x) * (q[1] - p[1]) - (p[1] - a.y) * (q[0] - p[0])) / cross;
        const u = ((p[0] - a.x) * (b.y - a.y) - (p[1] - a.y) * (b.x - a.x)) / cross;
        if (t < 0 || t >= 1 || u < 0 || u > 1) continue;
        const z = p[2] + ground(p[0], p[1]) + u * (q[2] + ground(q[0], q[1]) - p[2] - ground(p[0], p[1]));
        found.push({ s: a.s + t * (b.s - a.s), z, name: line.name ?? line.id, kind: line.kind ?? 'unknown' });
      }
    }
    return found;
  });
}

/**
 * The least height over roofs or ground, once for each span.
 * @param {Track} track
 * @param {BuildingCut[]} buildings
 * @param {(x: number, y: number) => number} ground
 * @returns {Drop[]}
 */
function dropsOf(track, buildings, ground) {
  return track.spans.flatMap((span) => {
    const reach = span[span.length - 1].s - span[0].s;
    const free = span.filter((point) => point.s > span[0].s + reach * 0.06 && point.s < span[0].s + reach * 0.94);
    let least = /** @type {Drop|null} */ (null);
    for (const { s, x, y, z } of free) {
      let bottom = ground(x, y);
      let to = 'ground';
      for (const { name, outline } of buildings) {
        const roof = outline.slice(1, -1);
        if (s < roof[0][0] || s > roof[roof.length - 1][0]) continue;
        const over = roof.findIndex((station) => station[0] >= s);
        if (roof[over][1] > bottom) [bottom, to] = [roof[over][1], name];
      }
      if (!least || z - bottom < least.top - least.bottom) least = { s, top: z, bottom, to };
    }
    return least ? [least] : [];
  });
}
