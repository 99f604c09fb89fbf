// @ts-check
import { dimension, toDimension } from '/src/draw/placement/dimensions.js';
import { carried, holdings, laidAlong, movedLayout, shareAlong } from '/src/draw/placement/holding.js';
import { toMetres, toPixels } from '/src/draw/placement/labels.js';
import { toFrame } from '/src/draw/placement/rose.js';
import { windEnvelope } from '/src/draw/placement/wire.js';
import { parseFrequencies, regionOf, spread } from '/src/panels/brief-bands.js';
import { faultsAt } from '/src/panels/brief-fields.js';
import { parsePlace } from '/src/panels/brief-targets.js';
import { bandSummaries, clearanceConcern, concerns, nameOf, toBuild } from '/src/panels/placement-facts.js';
import { cureRank, freeId } from '/src/panels/refusals.js';
import { fileName } from '/src/panels/sheet.js';
import { changeWords, issuePart, revisionWords } from '/src/panels/sheet-issue.js';
import { assert, equal, near, test } from './harness.js';

const VIEW = { x: -5, y: -10, width: 40, height: 30, ppm: 15 };

test('pixels and metres of a view are each other’s inverse, y turned', () => {
  equal(toPixels(VIEW, [-5, 20]), [0, 0]);
  equal(toMetres(VIEW, toPixels(VIEW, [3, 4])), [3, 4]);
});

test('a bearing meets the frame where it should', () => {
  equal(toFrame([100, 100], [1, 0], 400, 300, 4), [396, 100]);
  equal(toFrame([100, 100], [0, -1], 400, 300, 4), [100, 4]);
});

test('the wind-blown envelope is widest in the middle and closed at the ends', () => {
  const outline = windEnvelope({
    points: [
      [0, 0, 5],
      [5, 0, 4],
      [10, 0, 5],
    ],
    blowOut: 0.5,
  });
  near(outline[1][1], 0.5, 1e-9);
  near(outline[4][1], -0.5, 1e-9);
  near(outline[0][1], 0, 1e-9);
});

test('what is tight or foul is dimensioned; when all is clear the nearest is', () => {
  const one = (/** @type {string} */ state) => ({ state, at: [0, 0, 5], toAt: [3, 0, 5] });
  equal(toDimension([one('foul'), one('tight'), one('clear')]).length, 2);
  equal(toDimension([one('clear'), one('clear')]).length, 1);
});

test('a long dimension has ticks, a short one comes from outside, an upright one is a ring', () => {
  const at = (/** @type {number} */ x) => dimension({ state: 'tight', at: [0, 0, 5], toAt: [x, 0, 5] }, VIEW);
  equal(
    at(4).map((node) => node.getAttribute('class')),
    ['dimension tight', 'dimension-tick tight'],
  );
  equal(at(0.9).length, 1);
  equal(at(0)[0].nodeName, 'circle');
});

const PLOT = {
  supports: [
    { id: 'oak', name: 'Oak', at: [0, 0], lowest: 3, highest: 8 },
    { id: 'chimney', at: [1, 0], lowest: 5, highest: 7, pullLimit: 0 },
  ],
  mastZones: [
    {
      id: 'bed',
      name: 'Bed',
      area: [
        [10, 0],
        [20, 0],
        [20, 5],
        [10, 5],
      ],
      highest: 9,
    },
  ],
  bracketLines: [
    {
      id: 'eaves',
      path: [
        [0, 10],
        [10, 10],
      ],
      lowest: 4,
      highest: 5,
    },
  ],
  overheadLines: [{ id: 'service-drop', path: [] }],
};

test('a dragged end goes to the nearest place that may hold it', () => {
  equal([holdings(PLOT, [12, 3])[0].on, holdings(PLOT, [12, 3])[0].at], ['bed', [12, 3]]);
  equal(holdings(PLOT, [15, 7])[0].at, [15, 5]);
  equal(holdings(PLOT, [4, 9])[0].on, 'eaves');
  equal(holdings(PLOT, [1, 0])[0].on, 'oak');
});

test('the wire is carried along with its end', () => {
  const before = [{ at: [0, 0, 8] }, { at: [10, 0, 8] }];
  const after = [{ at: [0, 0, 8] }, { at: [10, 4, 6] }];
  const [start, end] = carried(
    [
      [0, 0, 8],
      [5, 0, 7.5],
    ],
    before,
    after,
  );
  equal(start, [0, 0, 8]);
  near(end[1], 2, 1e-9);
  near(end[2], 6.5, 1e-9);
});

test('a moved layout holds what assess reads and nothing that is stale', () => {
  const placement = {
    shape: 'level',
    attachments: [
      { on: 'oak', at: [0, 0, 8], pull: 5 },
      { on: 'bed', at: [12, 2, 7], pull: 5 },
    ],
    conductors: [
      {
        points: [
          [1, 0, 8],
          [11, 2, 7],
        ],
        wire: 'w',
        length: 10,
      },
    ],
    feed: { at: [6, 1, 7], line: 'l', lineLength: 9, conductor: 0, fraction: 0.5 },
  };
  const layout = movedLayout(placement, 1, { on: 'bed', at: [15, 2], z: 6 });
  equal(Object.keys(layout), ['shape', 'attachments', 'conductors', 'feed']);
  equal(layout.attachments[1], { on: 'bed', at: [15, 2, 6] });
  equal([layout.feed.conductor, layout.feed.line], [0, 'l']);
  near(layout.feed.fraction, 0.5, 1e-9);
});

test('a feed at a held corner stays at the corner when one leg grows', () => {
  near(
    shareAlong(
      [
        [0, 0, 0],
        [3, 0, 0],
        [3, 9, 0],
      ],
      [3, 0, 0],
    ),
    0.25,
    1e-9,
  );
});

test('a wire laid along its holding points keeps its length, its corner, and rope at both ends', () => {
  const { points, fraction } = laidAlong(
    [
      [0, 0, 8],
      [10, 0, 8],
      [10, 10, 8],
    ],
    16,
  );
  equal(points, [
    [2, 0, 8],
    [10, 0, 8],
    [10, 8, 8],
  ]);
  near(fraction, 0.5, 1e-9);
  const tight = laidAlong(
    [
      [0, 0, 8],
      [10, 0, 8],
    ],
    30,
  ).points;
  equal(tight, [
    [0.5, 0, 8],
    [9.5, 0, 8],
  ]);
});

test('names are those the user gave, else the id in plain words', () => {
  equal(
    [nameOf(PLOT, 'oak'), nameOf(PLOT, 'service-drop'), nameOf(PLOT, 'ground')],
    ['Oak', 'service drop', 'the ground'],
  );
});

const ASSESSED = {
  attachments: [{ on: 'oak', state: 'tight', pullInWind: 290, pullLimit: 300 }],
  masts: [{}],
  ropes: [{ what: 'tail' }, { what: 'guy' }],
  clearances: [
    { rule: 'canopy-wire', to: 'oak', what: 'wire', distance: 0.7, required: 0.5, state: 'tight' },
    { rule: 'headroom', to: 'ground', what: 'wire', distance: 7, required: 2.5, state: 'clear' },
  ],
  bands: [
    {
      name: '20 m',
      frequency: 14.1,
      matching: { state: 'foul', why: 'its capacitor runs out' },
      targets: [
        { name: 'A', deliveredDbi: 3, referenceDbi: 1 },
        { name: 'B', deliveredDbi: 1, referenceDbi: 3 },
      ],
    },
  ],
};

test('concerns come worst first and leave out what is clear', () => {
  const list = concerns(PLOT, ASSESSED, (metres) => metres.toFixed(2));
  equal(
    list.map((one) => one.state),
    ['foul', 'tight', 'tight'],
  );
  assert(list.some((one) => one.words === '0.70 to Oak; must keep 0.50'));
});

test('a band’s bar is the weighted mean over its targets', () => {
  const [band] = bandSummaries(
    {
      brief: {
        targets: [
          { name: 'A', weight: 3 },
          { name: 'B', weight: 1 },
        ],
      },
    },
    ASSESSED,
  );
  near(band.over, 1, 1e-9);
  equal(band.state, 'foul');
});

test('a distance below nought is told as inside', () => {
  const one = { rule: 'building-wire', to: 'oak', what: 'wire', distance: -0.4, required: 0.3, state: 'foul' };
  equal(clearanceConcern(PLOT, one, (metres) => metres.toFixed(2)).words, '0.40 inside Oak; must keep 0.30');
});

test('refusals that a cure mends wholly come first', () => {
  equal(
    [
      cureRank({ cured: [{}], cure: 'Raise it.' }),
      cureRank({ cured: [{}], cure: 'Move it. 5 other refusals remain.' }),
      cureRank({ cured: [], cure: 'Nothing cures it.' }),
    ],
    [0, 1, 2],
  );
});

test('what must be built is counted, guys with their mast', () => {
  equal(toBuild(ASSESSED), 'new: 1 mast, 1 rope');
});

test('frequencies are read with commas or spaces, and refused with a sentence', () => {
  equal(parseFrequencies('14.3, 14.05 14.175'), [14.05, 14.175, 14.3]);
  equal(parseFrequencies('7.1'), [7.1]);
  assert(String(parseFrequencies('14175')).includes('not kHz'));
  assert(String(parseFrequencies('x')).includes('not a frequency'));
});

test('a band taken from the catalogue gets frequencies inside its edges', () => {
  equal(spread([14, 14.35]), [14.02, 14.175, 14.33]);
  const [low, , high] = spread([5.3515, 5.3665]);
  assert(low > 5.3515 && high < 5.3665);
});

test('the region is guessed from the site', () => {
  equal(
    [
      regionOf({ latitude: 41, longitude: -84 }),
      regionOf({ latitude: 51, longitude: 7 }),
      regionOf({ latitude: -34, longitude: 151 }),
      regionOf({}),
    ],
    ['2', '1', '3', '1'],
  );
});

test('a place is read with signs or letters', () => {
  equal(parsePlace('48.2, 16.4'), [48.2, 16.4]);
  equal(parsePlace('33.9 S 151.2 E'), [-33.9, 151.2]);
  assert(typeof parsePlace('here') === 'string' && typeof parsePlace('95, 10') === 'string');
});

test('faults are told at the part they belong to', () => {
  const faults = [
    { path: 'brief.bands[1].frequencies[0]', message: 'a' },
    { path: 'brief.bands[10]', message: 'b' },
  ];
  equal(faultsAt(faults, 'brief.bands[1]'), ['a']);
});

test('a download is named after its plot and placement', () => {
  equal(fileName({ title: 'Côte lot, 7 × 22 m!' }, { id: 'p01' }, 'pdf'), 'cote-lot-7-22-m-p01.pdf');
  equal(fileName({ title: 'Lot' }, { id: 'p01' }, 'csv', 'B'), 'lot-p01-B.csv');
});

test('a sheet says its revision, what it changes, and is issued once', () => {
  const first = { revision: 'A', changes: [] };
  equal([revisionWords(first), changeWords(first)], ['Revision A, not yet issued', '']);
  const changes = ['One.', 'Two.', 'Three.', 'Four.', 'Five.', 'Six.'];
  const next = { revision: 'B', since: 'A', changes };
  equal(changeWords(next), '6 changes since revision A');
  equal(changeWords({ revision: 'B', since: 'A', changes: ['One.'] }), '1 change since revision A');
  let issued = 0;
  const act = { busy: false, trouble: null, issue: () => (issued += 1) };
  const list = [{ revision: 'A', date: '2026-05-14', placement: 'p01', what: 'level, 14.00 m' }];
  const part = issuePart(next, list, act);
  part.querySelector('button')?.click();
  issuePart(next, list, { ...act, busy: true }).querySelector('button')?.click();
  equal(issued, 1);
  assert.same(part.querySelectorAll('details li').length, 6);
  assert(part.textContent?.includes('A 2026-05-14'), part.textContent ?? '');
  const done = issuePart({ ...next, date: '2026-06-01' }, list, act);
  assert.same(done.querySelector('button'), null);
  assert.same(done.querySelector('h2')?.textContent, 'Revision B, issued 2026-06-01');
});

test('a cured placement never takes the id of one that is still there', () => {
  assert.same(freeId('cured', []), 'cured-1');
  assert.same(freeId('cured', [{ id: 'cured-2' }]), 'cured-3');
  assert.same(freeId('cured', [{ id: 'cured-1' }, { id: 'moved-1' }]), 'cured-3');
});
