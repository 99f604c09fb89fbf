// @ts-check
import { alongWire, trackOf } from '/src/charts/along.js';
import { delaunay, groundOf } from '/src/charts/ground.js';
import { roofHeight } from '/src/charts/roof.js';
import { scallops, sideScale, sideView } from '/src/charts/side-view.js';
import { assert, equal, near, test } from './harness.js';

const HOUSE = {
  id: 'house',
  name: 'House',
  footprint: [
    [8, -3],
    [14, -3],
    [14, 3],
    [8, 3],
  ],
  eaves: 4,
  ridge: 6,
  roof: 'gable',
  ridgeLine: [
    [8, 0],
    [14, 0],
  ],
};
const PLAN = {
  boundary: [
    [0, -10],
    [30, -10],
    [30, 10],
    [0, 10],
  ],
  buildings: [HOUSE],
  supports: [
    { id: 'oak', name: 'Oak', kind: 'tree', at: [0, 0], lowest: 4, highest: 9, canopy: { radius: 3, from: 3, to: 11 } },
    { id: 'pole', name: 'Pole', kind: 'pole', at: [20, 0], lowest: 2, highest: 8 },
  ],
  overheadLines: [
    {
      id: 'drop',
      name: 'Drop',
      kind: 'low-voltage',
      path: [
        [18, -10, 12],
        [18, 10, 12],
      ],
    },
  ],
};
const RUN = Array.from({ length: 21 }, (_, index) => [index, 0, 8 - 0.01 * index * (20 - index)]);
const PLACEMENT = {
  spans: [{ from: 0, to: 1, points: RUN, sag: 1, sagInWind: 1.2, blowOut: 1.5, wireLength: 18, tension: 60 }],
  conductors: [{ points: RUN.slice(1, 20), wire: 'w', length: 18 }],
  attachments: [
    { on: 'oak', at: [0, 0, 8], aboveGround: 8 },
    { on: 'pole', at: [20, 0, 8], aboveGround: 8 },
  ],
  feed: {
    at: [10, 0, 7],
    path: [
      [10, 0, 7],
      [10, 2, 1.5],
    ],
  },
  ropes: [],
  masts: [],
  clearances: [],
};

test('the course along the wire is as long as its plan', () => {
  const track = trackOf(PLACEMENT.spans);
  near(track.length, 20, 1e-9);
});

test('spans that turn a corner add up', () => {
  near(
    trackOf([
      {
        points: [
          [0, 0, 5],
          [3, 4, 5],
        ],
      },
      {
        points: [
          [3, 4, 5],
          [3, 10, 5],
        ],
      },
    ]).length,
    11,
    1e-9,
  );
});

test('a building under the wire is cut with its ridge', () => {
  const { buildings } = alongWire(PLAN, PLACEMENT);
  equal(buildings.length, 1);
  const [first] = buildings[0].outline[0];
  near(first, 8, 0.15);
  const top = Math.max(...buildings[0].outline.map((station) => station[1]));
  near(top, 6, 1e-9);
});

test('the canopy, the overhead line and the least height over the roof are found', () => {
  const along = alongWire(PLAN, PLACEMENT);
  near(along.canopies[0].s1, 3, 0.15);
  assert(along.canopies[0].own);
  near(along.lines[0].s, 18, 1e-6);
  near(along.lines[0].z, 12, 1e-9);
  equal(along.drops[0].to, 'House');
  near(along.drops[0].top - along.drops[0].bottom, 1, 0.05);
});

test('a gable roof falls evenly from ridge to eaves, a lean-to from its high side', () => {
  near(roofHeight(HOUSE, 10, 0), 6, 1e-9);
  near(roofHeight(HOUSE, 10, 1.5), 5, 1e-9);
  near(roofHeight(HOUSE, 10, -3), 4, 1e-9);
  const lean = {
    ...HOUSE,
    roof: 'lean-to',
    ridgeLine: [
      [8, 3],
      [14, 3],
    ],
  };
  near(roofHeight(lean, 10, 3), 6, 1e-9);
  near(roofHeight(lean, 10, -3), 4, 1e-9);
  near(roofHeight({ ...HOUSE, roof: 'flat', ridgeLine: [] }, 10, 0), 4, 1e-9);
});

test('a hip roof falls at its ends too', () => {
  const hip = {
    ...HOUSE,
    roof: 'hip',
    ridgeLine: [
      [10, 0],
      [12, 0],
    ],
  };
  near(roofHeight(hip, 8, 0), 4, 1e-9);
  near(roofHeight(hip, 11, 0), 6, 1e-9);
});

test('the ground is flat without spots, level past them, and straight between them', () => {
  equal(groundOf([])(3, 4), 0);
  const ground = groundOf([
    [0, 0, 0],
    [10, 0, 1],
    [0, 10, 2],
  ]);
  near(ground(2, 3), 0.2 + 0.6, 1e-9);
  near(ground(20, 0), 1, 1e-9);
  near(ground(-5, 0), 0, 1e-9);
});

test('spots in a line give the slope along it', () => {
  near(
    groundOf([
      [0, 0, 0],
      [10, 0, 2],
      [5, 0, 1],
    ])(2.5, 7),
    0.5,
    1e-9,
  );
});

test('the triangles of a square of spots cover it and hold no spot inside their circle', () => {
  const spots = [
    [0, 0, 0],
    [10, 0, 0],
    [10, 10, 0],
    [0, 10, 0],
    [4, 5, 0],
  ];
  const triangles = delaunay(spots);
  equal(triangles.length, 4);
  assert(triangles.every((triangle) => triangle.includes(4)));
});

test('the side view keeps the plan’s scale when it fits and one scale in both directions always', () => {
  const along = alongWire(PLAN, PLACEMENT);
  const same = sideScale(along, { width: 640, height: 190, ppm: 12 });
  assert(same.same && same.scale === 12);
  const tall = sideScale(along, { width: 640, height: 190, ppm: 60 });
  assert(!tall.same);
  near((tall.x(10) - tall.x(0)) / 10, tall.scale, 1e-9);
  near((tall.y(0) - tall.y(10)) / 10, tall.scale, 1e-9);
  assert(tall.y(8) > 0);
});

test('the side view is drawn with no figure that is not a number', () => {
  const drawn = sideView(alongWire(PLAN, PLACEMENT), {
    width: 640,
    height: 190,
    ppm: 12,
    length: (metres) => metres.toFixed(1),
    title: 'Along the wire',
    notes: [],
    unit: 1,
    stateOf: () => 'tight',
  });
  const markup = new XMLSerializer().serializeToString(drawn);
  assert(!markup.includes('NaN') && !markup.includes('undefined'));
  assert(markup.includes('Oak') && markup.includes('Pole'));
});

test('scallops close on themselves', () => {
  const d = scallops(0, 0, 100, 60);
  assert(d.startsWith('M') && d.endsWith('Z'));
});
