// @ts-check
import { overBar, pullBar, rowBarsGeometry } from '/src/charts/bars.js';
import { bearingOf, compass, greatCircle, radiusOf, spotOf } from '/src/charts/compass.js';
import { bearing, impedance, megahertz, range } from '/src/charts/figures.js';
import { gatherWindows, launchProfile, profileGeometry } from '/src/charts/launch-profile.js';
import { stateMark, worst } from '/src/charts/marks.js';
import { PIXELS_PER_DECIBEL, ringRadius, roseGeometry, screenDirection } from '/src/charts/reach-rose.js';
import { linear, sample, ticks } from '/src/charts/scale.js';
import { fitInto } from '/src/charts/thumbnail.js';
import { assert, equal, near, test } from './harness.js';

test('a scale is straight and may run downward', () => {
  const y = linear([-10, 10], [200, 0]);
  near(y(0), 100, 1e-9);
  near(y(10), 0, 1e-9);
});

test('ticks are round and inside the range', () => {
  equal(ticks(-12, 11, 5), [-10, -5, 0, 5, 10]);
  equal(ticks(0, 1, 5), [0, 0.2, 0.4, 0.6, 0.8, 1]);
});

test('a table is read straight between its values and held at its ends', () => {
  near(sample([0, 10, 20], 2, 3), 15, 1e-9);
  near(sample([0, 10, 20], 2, 99), 20, 1e-9);
});

test('bearings are spoken with three figures and wrap', () => {
  equal([bearing(7), bearing(359.6), bearing(-10)], ['007°', '000°', '350°']);
  equal(range(3, 14.4), '3–14°');
});

test('impedances have a true minus and megahertz no idle digits', () => {
  equal(impedance([51.7, -410.2]), '52 − j410');
  equal(impedance([1234, 5]), '1\u2009230 + j5');
  equal([megahertz(14.1750001), megahertz(7.1)], ['14.175', '7.1']);
});

test('the worst of several states is found, and none is clear', () => {
  equal([worst(['clear', 'foul', 'tight']), worst(['clear', 'tight']), worst([])], ['foul', 'tight', 'clear']);
});

test('a state not known is never drawn as clear', () => {
  assert(stateMark('odd').querySelector('.mark-tight'));
});

test('a rose stroke is seven pixels a decibel outward where better, inward where worse', () => {
  const dbi = Array.from({ length: 180 }, (_, index) => (index === 45 ? 3 : 0));
  const { outline, better, worse } = roseGeometry(
    { elevation: 10, step: 2, dbi, referenceDbi: 1, betterShare: 0 },
    200,
    0,
  );
  near(outline[45][0], 200 + 2 * PIXELS_PER_DECIBEL, 1e-9);
  near(Math.hypot(...outline[0]), 200 - PIXELS_PER_DECIBEL, 1e-9);
  equal([better.length, worse.length], [1, 179]);
});

test('a null of the rose stays outside the wire’s middle', () => {
  const { outline } = roseGeometry(
    { elevation: 10, step: 2, dbi: new Array(180).fill(-40), referenceDbi: 0, betterShare: 0 },
    100,
    0,
  );
  near(Math.hypot(...outline[10]), 12, 1e-9);
});

test('true east points right on a plan turned to north and up on one turned to east', () => {
  const [x, y] = screenDirection(90, 0);
  near(x, 1, 1e-12);
  near(y, 0, 1e-12);
  const turned = screenDirection(90, 90);
  near(turned[1], -1, 1e-12);
});

test('the ring goes round the wire but leaves room to the frame', () => {
  near(ringRadius(100, 400), 112, 1e-9);
  near(ringRadius(300, 200), 150, 1e-9);
  assert(ringRadius(2, 20) >= 56);
});

test('windows of the same range are one bracket', () => {
  equal(
    gatherWindows([
      { name: 'B', from: 5, to: 20 },
      { name: 'A', from: 3, to: 13 },
      { name: 'C', from: 5, to: 20 },
    ]),
    [
      { names: ['A'], from: 3, to: 13 },
      { names: ['B', 'C'], from: 5, to: 20 },
    ],
  );
});

const PROFILE = {
  profiles: [
    { name: 'West', azimuth: 274, step: 1, dbi: Array.from({ length: 91 }, (_, e) => 6 - ((e - 30) / 20) ** 2) },
  ],
  windows: [{ name: 'West', from: 5, to: 20 }],
  reference: Array.from({ length: 46 }, (_, index) => ({ elevation: index * 2, dbi: -index / 2 })),
  lead: 'West',
};

test('the launch profile runs from horizon to zenith along a straight axis', () => {
  const plot = profileGeometry(PROFILE, { width: 366, height: 220 });
  const [curve] = plot.curves;
  near(curve.points[0][0], plot.left, 1e-9);
  near(curve.points[90][0], plot.right, 1e-9);
  assert(curve.points[30][1] < curve.points[0][1], 'a greater gain stands higher');
  near((plot.brackets[0].x1 - plot.brackets[0].x0) / (plot.right - plot.left), 15 / 90, 1e-9);
});

test('names on the launch profile stay inside it', () => {
  const plot = profileGeometry(PROFILE, { width: 366, height: 220 });
  for (const { label } of plot.curves) {
    assert(label && label.x > plot.left && label.x < plot.right && label.y > plot.top && label.y < plot.bottom);
  }
});

test('the launch profile is drawn with no figure that is not a number', () => {
  const markup = new XMLSerializer().serializeToString(launchProfile(PROFILE, { width: 366, height: 220 }));
  assert(!markup.includes('NaN') && !markup.includes('undefined'));
});

test('bars stand up from the base above the reference and hang below it', () => {
  const { base, bars } = rowBarsGeometry(
    [
      { name: '20 m', over: 4 },
      { name: '15 m', over: -2 },
    ],
    { width: 98, height: 30 },
  );
  near(bars[0].y + bars[0].height, base, 1e-9);
  near(bars[1].y, base, 1e-9);
  assert(bars[0].height > bars[1].height && bars[1].below && !bars[0].below);
});

test('a bar beyond fifteen decibels stays in its box', () => {
  const { bars } = rowBarsGeometry([{ name: '80 m', over: 60 }], { width: 98, height: 30 });
  assert(bars[0].y >= -1e-9 && bars[0].height <= 30);
});

test('table bars share one base line', () => {
  const base = (/** @type {number} */ over) =>
    overBar(over, { low: -5, high: 10 }, { width: 62, height: 16 }).querySelector('.bar-base')?.getAttribute('d');
  equal(base(3), base(-4));
});

test('a pull with no known limit has no tick', () => {
  const drawn = pullBar({ calm: 60, gust: 150, limit: null }, 350, { width: 120, height: 16 });
  assert(!drawn.querySelector('.pull-limit') && drawn.querySelector('.pull-gust'));
});

test('a thumbnail keeps the plot’s shape and has north up', () => {
  const fit = fitInto(
    [
      [0, 0],
      [10, 20],
    ],
    { width: 54, height: 68 },
  );
  const [a, b] = [fit([0, 0]), fit([10, 20])];
  near((a[1] - b[1]) / (b[0] - a[0]), 2, 1e-9);
  assert(b[1] < a[1]);
});

test('the compass has north up, east right, and a root scale of distance', () => {
  equal([bearingOf(0, -10), bearingOf(10, 0), bearingOf(0, 10), bearingOf(-10, 0)], [0, 90, 180, 270]);
  near(radiusOf(5000, 100), 50, 1e-9);
  near(radiusOf(30000, 100), 100, 1e-9);
  const [x, y] = spotOf(90, 40);
  near(x, 40, 1e-9);
  near(y, 0, 1e-9);
});

test('great circles: a quarter of the way round along the equator and due north', () => {
  const east = greatCircle([0, 0], [0, 90]);
  near(east.bearing, 90, 1e-9);
  near(east.distanceKm, (6371 * Math.PI) / 2, 1e-6);
  near(greatCircle([10, 20], [50, 20]).bearing, 0, 1e-9);
});

test('each far target has a handle that says its bearing; near cover is a ring', () => {
  const drawn = compass(
    [
      { name: 'Far', bearing: 45, distanceKm: 5000, nearVerticalKm: null },
      { name: 'Near', bearing: null, distanceKm: null, nearVerticalKm: 300 },
    ],
    280,
  );
  const sliders = drawn.querySelectorAll('[role=slider]');
  equal([sliders.length, sliders[0].getAttribute('aria-valuetext')], [1, '045°']);
  assert(drawn.querySelector('.compass-near-ring'));
});
