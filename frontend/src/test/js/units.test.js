// @ts-check
import { formatDirection, formatVariation, parseDegrees, parseDirection, parseDirectionFrom } from '../../units/angle.js';
import { number, parseNumber, signed } from '../../units/figures.js';
import { area, distanceFigure, formatLength, lengthInBox, parseLength } from '../../units/length.js';
import { assert, test } from './harness.js';

test('lengths are read however they are written', () => {
  for (const [text, metres] of /** @type {[string, number][]} */ ([
    ['6.86', 6.86], ['6,86 m', 6.86], ['686 cm', 6.86], ['6860mm', 6.86], ['22\' 6"', 6.858],
    ['22 ft 6 in', 6.858], ['22′ 6″', 6.858], ["22'6", 6.858], ['22\' 6 1/2"', 6.8707], ['90"', 2.286],
    ["22'", 6.7056], ['1/2"', 0.0127], ['−1.5', -1.5], ['6.86 metres', 6.86],
  ])) assert.near(parseLength(text, 'm'), metres, 1e-9, text);
  assert.near(parseLength('10', 'ft'), 3.048, 1e-9);
});

test('what is not a length is not read', () => {
  for (const text of ['', 'abc', '6.8.6', '5 apples', "'", '1/0"', '--3']) assert.same(parseLength(text, 'm'), null, text);
});

test('lengths are written in metres or in feet and inches', () => {
  assert.same(formatLength(6.858, 'm', 2), '6.86');
  assert.same(formatLength(6.858, 'ft'), '22′ 6″');
  assert.same(formatLength(6.7056, 'ft'), '22′');
  assert.same(formatLength(-0.1, 'ft'), '−0′ 4″');
  assert.same(formatLength(0.3048 * 12 - 0.0001, 'ft'), '12′');
  assert.same(formatLength(NaN, 'm'), '–');
});

test('a length in a box reads back as it was, to a quarter inch in feet', () => {
  for (const metres of [0, 0.1, 2.45, 13.2, 36.6]) {
    assert.near(parseLength(lengthInBox(metres, 'm'), 'm'), metres, 1e-4);
    assert.near(parseLength(lengthInBox(metres, 'ft'), 'ft'), metres, 0.0254 / 8 + 1e-9);
  }
});

test('figures have a true minus and thin spaces in thousands', () => {
  assert.same(number(-1234.5, 1), '−1\u2009234.5');
  assert.same(number(-0.04, 1), '0.0');
  assert.same(signed(2, 1), '+2.0');
  assert.near(parseNumber('−1\u2009234,5'), -1234.5);
  assert.same(parseNumber('1e3x'), null);
  assert.same(area(12, 'm'), '12.0 m²');
});

test('directions have three figures before the point and are read as degrees or points', () => {
  assert.same(formatDirection(90), '090.0°');
  assert.same(formatDirection(359.99), '000.0°');
  assert.same(formatDirection(-90), '270.0°');
  assert.near(parseDirection('NE'), 45);
  assert.near(parseDirection('-45'), 315);
  assert.same(parseDirection('up'), null);
});

test('a distance found is never shown greater than it is, one required never less', () => {
  assert.same(distanceFigure(3.099, 'm'), '3.09');
  assert.same(distanceFigure(3.05, 'm'), '3.05');
  assert.same(distanceFigure(3.05, 'm', 'required'), '3.05');
  assert.same(distanceFigure(3.051, 'm', 'required'), '3.06');
  assert.same(distanceFigure(0.075, 'm', 'required'), '0.075');
  assert.same(distanceFigure(0.0926, 'm'), '0.092');
  assert.same(distanceFigure(0.3047, 'ft'), '0′ 11¾″');
  assert.same(distanceFigure(0.3049, 'ft', 'required'), '1′ ¼″');
});

test('a direction can be typed from the last wall', () => {
  assert.near(parseDirectionFrom('L', 0), 270);
  assert.near(parseDirectionFrom('r', 350), 80);
  assert.near(parseDirectionFrom('L30', 90), 60);
  assert.near(parseDirectionFrom('A', 123), 123);
  assert.near(parseDirectionFrom('S', 123), 180);
});

test('places on the earth are read with a sign or a letter', () => {
  assert.near(parseDegrees('51.5'), 51.5);
  assert.near(parseDegrees('1° 12\' W'), -1.2);
  assert.near(parseDegrees('−84'), -84);
  assert.same(parseDegrees('here'), null);
  assert.same(formatVariation(-6), '6° W');
});
