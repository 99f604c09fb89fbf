// @ts-check
import { corridor } from '../../geometry/corridor.js';
import { crossing, nearestOnSegment, pathLength, placeAlong } from '../../geometry/line.js';
import { overlap, placeLabels } from '../../geometry/labels.js';
import { area, centre, contains, labelPlace, selfCrossings, uncrossed, walls } from '../../geometry/polygon.js';
import { onScreen, scaled } from '../../geometry/picture.js';
import { defaultRidge } from '../../geometry/roof.js';
import { guidesFor, snap } from '../../geometry/snap.js';
import { crossingAngle, twoTapes } from '../../geometry/twotapes.js';
import { along, direction, distance } from '../../geometry/vector.js';
import { around, roundStep, shaped, zoomed } from '../../geometry/view.js';
import { zigzag } from '../../geometry/figures.js';
import { assert, test } from './harness.js';

const SQUARE = [[0, 0], [4, 0], [4, 3], [0, 3]];

test('a direction is clockwise from plan north', () => {
  assert.near(direction([0, 0], [0, 5]), 0);
  assert.near(direction([0, 0], [5, 0]), 90);
  assert.near(direction([0, 0], [-1, -1]), 225);
});

test('going along a direction and back again ends where it began', () => {
  for (const degrees of [0, 12.5, 90, 181, 359.9]) {
    const out = along([3, -2], degrees, 7.25);
    assert.near(distance(along(out, degrees + 180, 7.25), [3, -2]), 0, 1e-9);
    assert.near(direction([3, -2], out), degrees, 1e-9);
  }
});

test('areas, centres and what lies inside', () => {
  assert.near(area(SQUARE), 12);
  assert.same(centre(SQUARE), [2, 1.5]);
  assert(contains([1, 1], SQUARE));
  assert(!contains([5, 1], SQUARE));
  const ell = [[0, 0], [10, 0], [10, 1], [1, 1], [1, 10], [0, 10]];
  assert(contains(labelPlace(ell), ell), 'a label of an L stands inside it');
});

test('walls give length, direction and the angle inside the corner, either way round', () => {
  for (const ring of [SQUARE, [...SQUARE].reverse()]) {
    for (const wall of walls(ring, true)) assert.near(wall.turn, 90, 1e-9);
  }
  const ell = [[0, 0], [4, 0], [4, 4], [2, 4], [2, 2], [0, 2]];
  assert.near(walls(ell, true)[4].turn, 270, 1e-9);
  assert.same(walls(SQUARE, false).map((w) => w.length), [4, 3, 4]);
});

test('a ring that crosses itself is found, and uncrossed with the same corners', () => {
  const bow = [[0, 0], [4, 3], [4, 0], [0, 3]];
  assert.same(selfCrossings(bow).length, 1);
  const mended = uncrossed(bow);
  assert.same(selfCrossings(mended).length, 0);
  assert.same([...mended].sort(), [...bow].sort());
  assert.near(area(mended), 12);
});

test('segments meet where they cross and nowhere else', () => {
  assert.same(crossing([0, 0], [2, 2], [0, 2], [2, 0]), [1, 1]);
  assert.same(crossing([0, 0], [1, 0], [0, 1], [1, 1]), null);
  assert.same(crossing([0, 0], [1, 1], [3, 0], [0, 3]), null);
  assert.near(nearestOnSegment([5, 1], [0, 0], [4, 0]).distance, Math.SQRT2);
});

test('a place along a path is at that length from its start', () => {
  const path = [[0, 0], [3, 0], [3, 4]];
  assert.near(pathLength(path), 7);
  assert.same(placeAlong(path, 5), { point: [3, 2], edge: 1 });
});

test('two tapes give two places, each at both distances', () => {
  const { points, gap } = twoTapes([0, 0], 5, [6, 0], 5);
  assert.same(points, [[3, 4], [3, -4]]);
  assert.near(gap, 0);
  for (const p of twoTapes([1, 2], 7.3, [9, -1], 4.4).points) {
    assert.near(distance(p, [1, 2]), 7.3, 1e-9);
    assert.near(distance(p, [9, -1]), 4.4, 1e-9);
  }
});

test('tapes that do not meet say by how much', () => {
  assert.near(twoTapes([0, 0], 2, [6, 0], 3).gap, 1);
  assert.near(twoTapes([0, 0], 9, [6, 0], 2).gap, 1);
  assert.same(twoTapes([0, 0], 2, [0, 0], 3).points, []);
  assert.same(twoTapes([0, 0], 2, [5, 0], 3).points.length, 1);
  assert.near(crossingAngle([3, 4], [0, 0], [6, 0]), 73.74, 0.01);
});

test('snapping takes corners before edges and says why', () => {
  const near = { corners: [{ at: [4, 0], name: 'corner, House' }], edges: [{ a: [0, 0], b: [4, 0], name: 'on House' }], guides: [] };
  assert.same(snap([3.97, 0.02], near, { ppm: 100 }).reason, 'corner, House');
  const edge = snap([2.04, 0.05], near, { ppm: 100 });
  assert.same(edge.point, [2, 0]);
  assert.same(edge.reason, 'on House');
  assert.same(snap([2.04, 0.55], near, { ppm: 100 }).point, [2, 0.6]);
  assert.same(snap([2.043, 0.05], near, { ppm: 100, free: true }).point, [2.043, 0.05]);
});

test('the tolerance of a snap is in pixels', () => {
  const near = { corners: [{ at: [4, 0], name: 'c' }], edges: [], guides: [] };
  assert.same(snap([4.3, 0], near, { ppm: 10 }).reason, 'c');
  assert.same(snap([4.3, 0], near, { ppm: 100 }).reason, 'whole decimetres');
});

test('a right angle to the last wall is kept, at whole decimetres along it', () => {
  const turnedWall = [[0, 0], [3, 4]];
  const at = snap([-0.95, 6.95], { corners: [], edges: [], guides: guidesFor(turnedWall) }, { ppm: 50 });
  assert.same(at.reason, 'square to the last wall');
  const along1 = (at.point[0] - 3) * 3 + (at.point[1] - 4) * 4;
  assert.near(along1, 0, 1e-3);
  assert.near(distance(at.point, [3, 4]) * 10, Math.round(distance(at.point, [3, 4]) * 10), 1e-2);
});

test('every point of a kept distance lies at that distance of its line', () => {
  const path = [[0, 0], [10, 0], [14, 6]];
  const ring = corridor(path, 3);
  for (const p of ring) {
    const d = Math.min(nearestOnSegment(p, path[0], path[1]).distance, nearestOnSegment(p, path[1], path[2]).distance);
    assert.near(d, 3, 1e-6);
  }
  assert(area(ring) > 6 * pathLength(path), 'it holds the round ends too');
});

test('ridges run along the longest wall, in its middle', () => {
  assert.same(defaultRidge(SQUARE, 'gable'), [[0, 1.5], [4, 1.5]]);
  assert.same(defaultRidge(SQUARE, 'flat'), null);
  const hip = /** @type {number[][]} */ (defaultRidge(SQUARE, 'hip'));
  assert.near(hip[0][0], 1.5);
  assert.near(hip[1][0], 2.5);
  assert.same(defaultRidge(SQUARE, 'lean-to'), [[0, 0], [4, 0]]);
});

test('a view keeps the place under the pointer while zooming, and the shape of its frame', () => {
  const view = { x: 0, y: 0, width: 40, height: 20 };
  const near = zoomed(view, 0.5, [10, 5]);
  assert.near((10 - near.x) / near.width, 0.25);
  assert.near((5 - near.y) / near.height, 0.25);
  const tall = shaped(view, 0.5);
  assert.near(tall.width / tall.height, 0.5);
  assert(tall.width >= view.width && tall.height >= view.height);
  assert.near(around([[0, 0], [10, 4]], 0.1, 2).width / around([[0, 0], [10, 4]], 0.1, 2).height, 2);
  assert.near(roundStep(10, 46), 5);
});

test('lettering never covers lettering, and the lesser gives way', () => {
  const frame = { left: 0, top: 0, width: 100, height: 100 };
  const box = (/** @type {number} */ left) => ({ left, top: 10, width: 30, height: 10 });
  const placed = placeLabels([
    { id: 'less', weight: 1, places: [[box(20)]] },
    { id: 'more', weight: 9, places: [[box(10)], [box(60)]] },
  ], [], frame);
  assert.same(placed.get('more'), 0);
  assert.same(placed.has('less'), false);
  assert.near(overlap(box(10), box(20)), 200);
});

test('lettering keeps off lines where it has the choice', () => {
  const frame = { left: 0, top: 0, width: 100, height: 100 };
  const places = [[{ left: 10, top: 10, width: 30, height: 10 }], [{ left: 10, top: 50, width: 30, height: 10 }]];
  const soft = [{ left: 15, top: 12, width: 10, height: 4 }];
  assert.same(placeLabels([{ id: 'a', weight: 1, places }], [], frame, soft).get('a'), 1);
});

test('a zig-zag ends where its line ends', () => {
  const line = zigzag([[0, 0], [10, 0]], 3, 0.3);
  assert.same(line[0], [0, 0]);
  assert.same(line[line.length - 1], [10, 0]);
  assert(line.length > 10);
});

test('a picture scaled by two points keeps the first and puts the second at its true distance', () => {
  const lay = { at: [2, 3], width: 40, turn: 0 };
  const picture = { width: 800, height: 600 };
  const pixel = (/** @type {any} */ l, /** @type {number[]} */ uv) => {
    const [a, b, c, d, e, f] = onScreen(l, picture, 1, [l.at[0], -l.at[1]]);
    return [a * uv[0] + c * uv[1] + e, -(b * uv[0] + d * uv[1] + f)];
  };
  const [p, q] = [[100, 500], [500, 200]];
  const [a, b] = [pixel(lay, p), pixel(lay, q)];
  const next = scaled(lay, a, b, 12.5, 200);
  const [c, d] = [pixel(next, p), pixel(next, q)];
  assert.near(distance(a, c), 0, 1e-9);
  assert.near(distance(c, d), 12.5, 1e-9);
  assert.near(direction(c, d), 200, 1e-9);
});
