// @ts-check
import { svg, pathOf } from '../draw/svg.js';
import { range } from './figures.js';
import { linear, sample, ticks, within } from './scale.js';

/**
 * Launch profile: gain against elevation along a straight axis from the horizon to overhead, the take-off windows
 * shaded and bracketed by name, the reference dashed. `profileGeometry` is pure; `launchProfile` draws it.
 *
 * @typedef {{name: string, azimuth: number, step: number, dbi: number[]}} Profile
 * @typedef {{name: string, from: number, to: number}} Window
 * @typedef {{elevation: number, dbi: number}} ReferenceGain
 * @typedef {{profiles: Profile[], windows: Window[], reference: ReferenceGain[], lead: string|null}} ProfileData
 *   `lead`: the profile drawn heaviest
 */

const LETTER = 5.4;
const BRACKET_ROW = 15;
const LEAST_GAIN_SPAN = 15;

/**
 * Windows that are the same range are one bracket with their names together.
 * @param {Window[]} windows
 * @returns {{names: string[], from: number, to: number}[]} by rising start
 */
export function gatherWindows(windows) {
  /** @type {Map<string, {names: string[], from: number, to: number}>} */
  const byRange = new Map();
  for (const { name, from, to } of windows) {
    const key = `${from.toFixed(1)} ${to.toFixed(1)}`;
    const same = byRange.get(key);
    if (same) same.names.push(name);
    else byRange.set(key, { names: [name], from, to });
  }
  return [...byRange.values()].sort((a, b) => a.from - b.from || a.to - b.to);
}

/**
 * @param {ProfileData} data
 * @param {{width: number, height: number}} size
 */
export function profileGeometry(data, { width, height }) {
  const windows = gatherWindows(data.windows);
  const top = windows.length * BRACKET_ROW + 10;
  const [left, right, bottom] = [30, width - 6, height - 20];
  const x = linear([0, 90], [left, right]);
  const peaks = [...data.profiles.flatMap((profile) => profile.dbi), ...data.reference.map((gain) => gain.dbi)];
  const highest = peaks.length ? Math.max(...peaks) : 0;
  const high = Math.ceil((highest + 0.5) / 5) * 5;
  const low = high - Math.max(LEAST_GAIN_SPAN, 20);
  const y = linear([low, high], [bottom, top]);
  /** @param {number} gain */
  const level = (gain) => y(within(gain, low, high));
  const curves = data.profiles.map((profile) => ({
    name: profile.name,
    azimuth: profile.azimuth,
    lead: profile.name === data.lead,
    points: profile.dbi.map((gain, index) => [x(index * profile.step), level(gain)]).filter(inSight),
    at: (/** @type {number} */ elevation) => level(sample(profile.dbi, profile.step, elevation)),
  }));
  /** @param {number[]} point @param {number} index @param {number[][]} all */
  function inSight(point, index, all) {
    const floor = (/** @type {number[]|undefined} */ other) => !other || other[1] >= bottom;
    return point[1] < bottom || !floor(all[index - 1]) || !floor(all[index + 1]);
  }
  const reference = data.reference.map(({ elevation, dbi }) => [x(elevation), level(dbi)]).filter(inSight);
  const brackets = windows.map((window, row) => {
    const text = `${window.names.join(', ')} ${range(window.from, window.to)}`;
    const from = x(window.from);
    const wide = text.length * LETTER;
    const start = within(from, left, Math.max(left, right - wide));
    return { ...window, text, x0: from, x1: x(window.to), y: row * BRACKET_ROW + 13, textX: start };
  });
  return {
    left,
    right,
    top,
    bottom,
    low,
    high,
    across: [0, 10, 20, 30, 45, 60, 75, 90].map((elevation) => ({ elevation, x: x(elevation) })),
    up: ticks(low, high, 5).map((gain) => ({ gain, y: y(gain) })),
    curves: placeNames(curves, reference, x, { left, right, top, bottom }),
    reference,
    brackets,
  };
}

/**
 * Names each curve where it runs farthest from the others, above or below its line.
 * @param {{name: string, azimuth: number, lead: boolean, points: number[][], at: (elevation: number) => number}[]} curves
 * @param {number[][]} reference
 * @param {(elevation: number) => number} x
 * @param {{left: number, right: number, top: number, bottom: number}} frame
 */
function placeNames(curves, reference, x, frame) {
  /** @type {{x0: number, x1: number, y: number}[]} */
  const taken = [];
  const referenceAt = (/** @type {number} */ px) => {
    const next = reference.findIndex((point) => point[0] >= px);
    return next < 0 ? frame.bottom : reference[next][1];
  };
  return curves.map((curve) => {
    const wide = curve.name.length * LETTER + 28;
    let best = { score: -Infinity, x: frame.right, y: 0 };
    for (let elevation = 18; elevation <= 84; elevation += 3) {
      for (const lift of [-5, 13]) {
        const [px, py] = [x(elevation), curve.at(elevation) + lift];
        const [x0, x1] = [px - wide / 2, px + wide / 2];
        if (x0 < frame.left || x1 > frame.right || py - 10 < frame.top || py > frame.bottom - 3) continue;
        if (taken.some((box) => x0 < box.x1 && x1 > box.x0 && Math.abs(py - box.y) < 13)) continue;
        const middle = py - 4;
        const gaps = [x0, px, x1].flatMap((sx) => {
          const e = ((sx - frame.left) / (frame.right - frame.left)) * 90;
          const others = curves.filter((other) => other !== curve).map((other) => Math.abs(other.at(e) - middle));
          const own = sx === px ? [] : [Math.abs(curve.at(e) - middle) + 2];
          return [...others, ...own, Math.abs(referenceAt(sx) - middle)];
        });
        const score = Math.min(14, ...gaps) - elevation * 0.01;
        if (score > best.score) best = { score, x: px, y: py };
      }
    }
    if (best.score > 4) taken.push({ x0: best.x - wide / 2, x1: best.x + wide / 2, y: best.y });
    return { ...curve, label: best.score > 4 ? { x: best.x, y: best.y } : null };
  });
}

/**
 * @param {ProfileData} data
 * @param {{width: number, height: number}} size
 * @returns {SVGElement}
 */
export function launchProfile(data, size) {
  const plot = profileGeometry(data, size);
  const shades = plot.brackets.map((bracket) =>
    svg('rect', {
      class: 'profile-window',
      x: bracket.x0,
      y: plot.top,
      width: Math.max(1, bracket.x1 - bracket.x0),
      height: plot.bottom - plot.top,
    }),
  );
  const brackets = plot.brackets.flatMap((bracket) => [
    svg('path', {
      class: 'profile-bracket',
      d: `M${bracket.x0} ${bracket.y + 6}V${bracket.y + 2}H${bracket.x1}V${bracket.y + 6}`,
    }),
    svg('path', {
      class: 'profile-edge',
      d: `M${bracket.x0} ${bracket.y + 6}V${plot.bottom}M${bracket.x1} ${bracket.y + 6}V${plot.bottom}`,
    }),
    svg('text', { class: 'profile-window-name', x: bracket.textX, y: bracket.y - 1 }, [bracket.text]),
  ]);
  const lines = plot.up.map(({ y }) => svg('path', { class: 'profile-line', d: `M${plot.left} ${y}H${plot.right}` }));
  const gains = plot.up.map(({ gain, y }) =>
    svg('text', { class: 'axis end', x: plot.left - 5, y: y + 4 }, [String(gain).replace('-', '−')]),
  );
  const axis = [
    svg('path', {
      class: 'axis-line',
      d: `M${plot.left} ${plot.bottom}H${plot.right}${plot.across.map(({ x }) => `M${x} ${plot.bottom}v4`).join('')}`,
    }),
    ...plot.across.map(({ elevation, x }) =>
      svg('text', { class: 'axis middle', x: Math.min(x, plot.right - 4), y: plot.bottom + 15 }, [
        `${elevation}${elevation % 90 ? '' : '°'}`,
      ]),
    ),
  ];
  const curves = plot.curves.map((curve) =>
    svg('path', { class: curve.lead ? 'profile-curve lead' : 'profile-curve', d: pathOf(curve.points) }),
  );
  const names = plot.curves
    .filter((curve) => curve.label)
    .map((curve) =>
      svg(
        'text',
        {
          class: curve.lead ? 'profile-name lead' : 'profile-name',
          x: curve.label?.x ?? 0,
          y: curve.label?.y ?? 0,
        },
        [curve.name],
      ),
    );
  const reference =
    plot.reference.length > 1
      ? [
          svg('path', { class: 'profile-reference', d: pathOf(plot.reference) }),
          svg('text', { class: 'profile-name reference', ...referenceLabel(plot) }, ['reference']),
        ]
      : [];
  return svg(
    'svg',
    {
      class: 'chart launch-profile',
      viewBox: `0 0 ${size.width} ${size.height}`,
      role: 'img',
      'aria-label': `Launch profile: gain in dBi against elevation for ${plot.curves.map((curve) => curve.name).join(', ') || 'no direction'}`,
    },
    [...shades, ...lines, ...gains, ...axis, ...brackets, ...reference, ...curves, ...names],
  );
}

/**
 * The reference is named low on its right, where it has left the others.
 * @param {ReturnType<typeof profileGeometry>} plot
 */
function referenceLabel(plot) {
  const low = plot.top + (plot.bottom - plot.top) * 0.8;
  const falling = plot.reference.findIndex(([x, y]) => x > (plot.left + plot.right) / 2 && y > low);
  const spot = plot.reference[falling > 0 ? falling : Math.floor(plot.reference.length * 0.7)];
  return { x: Math.max(plot.left + 30, spot[0] - 30), y: spot[1] };
}
