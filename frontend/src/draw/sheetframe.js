// @ts-check
/**
 * What stands round the drawing, in screen pixels over the plan: the frame with its coordinates,
 * the metre grid, north point, scale bar and the cursor's two hairlines.
 */
import { roundStep } from '../geometry/view.js';
import { FOOT, formatLength } from '../units/length.js';
import { formatVariation } from '../units/angle.js';
import { MINUS } from '../units/figures.js';
import { pathOf, svg } from './svg.js';

/** @typedef {import('./planview.js').Sight} Sight */

/**
 * @param {import('./planview.js').PlanView} view
 * @param {import('../state/store.js').Store} store
 */
export function mountFrame(view, store) {
  const over = svg('svg', { class: 'plan-frame', 'aria-hidden': 'true' });
  const still = svg('g');
  const hairs = svg('g', { class: 'hairs' });
  over.append(still, hairs);
  view.box.append(over);
  const grid = view.layer('grid');
  let pending = 0;

  function draw() {
    pending = 0;
    const sight = view.sight();
    const frame = view.frame();
    const { units, plan } = store.get();
    const unit = units === 'ft' ? FOOT : 1;
    grid.replaceChildren(...gridLines(sight, unit));
    still.replaceChildren(
      ...(frame.left > 0 ? [coordinates(sight, frame, unit)] : []),
      svg('rect', { x: frame.left + 0.5, y: frame.top + 0.5, width: frame.width - 1, height: frame.height - 1, class: 'frame' }),
      northPoint(frame, plan.site ?? {}),
      scaleBar(sight, frame, units, unit),
    );
    cursor();
  }

  function cursor() {
    const { cursor: at, units } = store.get();
    const frame = view.frame();
    if (!at || frame.left === 0) {
      hairs.replaceChildren();
      return;
    }
    const [x, y] = view.toScreen(at.point);
    const inside = x >= frame.left && x <= frame.left + frame.width && y >= frame.top && y <= frame.top + frame.height;
    if (!inside) {
      hairs.replaceChildren();
      return;
    }
    const digits = view.sight().ppm > 60 ? 2 : 1;
    hairs.replaceChildren(
      svg('path', { d: pathOf([[frame.left, y], [frame.left + frame.width, y]]), class: 'hair' }),
      svg('path', { d: pathOf([[x, frame.top], [x, frame.top + frame.height]]), class: 'hair' }),
      badge(frame.left - 30, y - 7.5, 30, formatLength(at.point[1], units, digits)),
      badge(x - 17, frame.top + frame.height, 34, formatLength(at.point[0], units, digits)),
    );
  }

  const soon = () => {
    if (!pending) pending = requestAnimationFrame(draw);
  };
  view.onView(soon);
  store.subscribe((s) => [s.units, s.plan.site], soon);
  store.subscribe((s) => s.cursor, cursor);
}

/** @param {number} x @param {number} y @param {number} width @param {string} text */
const badge = (x, y, width, text) =>
  svg('g', {}, [
    svg('rect', { x, y, width, height: 15, class: 'hair-badge' }),
    svg('text', { x: x + width / 2, y: y + 11, class: 'hair-figure', 'text-anchor': 'middle' }, [text]),
  ]);

/** @param {Sight} sight @param {number} unit metres */
function gridLines(sight, unit) {
  const fine = unit === 1 ? 1 : FOOT;
  const coarse = roundStep(sight.ppm * unit, 60) * unit;
  const step5 = Math.max(5 * unit, coarse);
  const lines = [];
  if (fine * sight.ppm >= 7) lines.push(svg('path', { d: raster(sight, fine), class: 'grid-1' }));
  lines.push(svg('path', { d: raster(sight, step5), class: 'grid-5' }));
  return lines;
}

/** @param {Sight} sight @param {number} step metres */
function raster(sight, step) {
  let d = '';
  for (let x = Math.ceil(sight.x / step) * step; x <= sight.x + sight.width; x += step) {
    d += `M${x.toFixed(4)} ${sight.y.toFixed(3)}v${sight.height.toFixed(3)}`;
  }
  for (let y = Math.ceil(sight.y / step) * step; y <= sight.y + sight.height; y += step) {
    d += `M${sight.x.toFixed(3)} ${y.toFixed(4)}h${sight.width.toFixed(3)}`;
  }
  return d;
}

/** @param {Sight} sight @param {{left: number, top: number, width: number, height: number}} frame @param {number} unit */
function coordinates(sight, frame, unit) {
  const k = sight.ppm * unit;
  const figures = Math.max(5, roundStep(k, 46));
  const ticks = figures === 5 && k >= 5 ? 1 : figures / 5;
  /** @type {SVGElement[]} */
  const nodes = [];
  let d = '';
  const bottom = frame.top + frame.height;
  const walk = (/** @type {number} */ start, /** @type {number} */ length, /** @type {(v: number, px: number, big: boolean) => void} */ each) => {
    for (let v = Math.ceil(start / unit / ticks) * ticks; v * unit <= start + length; v += ticks) {
      each(v, (v * unit - start) * sight.ppm, Math.abs(v / figures - Math.round(v / figures)) < 1e-6);
    }
  };
  const text = (/** @type {number} */ v) => String(Math.round(v)).replace('-', MINUS);
  walk(sight.x, sight.width, (v, px, big) => {
    const x = frame.left + px;
    d += `M${x.toFixed(1)} ${bottom}v${big ? 6 : 3}`;
    if (big && px > 12 && px < frame.width - 10) {
      nodes.push(svg('text', { x: x + 3, y: bottom + 14, class: 'frame-figure' }, [text(v)]));
    }
  });
  walk(sight.y, sight.height, (v, px, big) => {
    const y = bottom - px;
    d += `M${frame.left} ${y.toFixed(1)}h${big ? -6 : -3}`;
    if (big && px > 8 && px < frame.height - 8) {
      nodes.push(svg('text', { x: frame.left - 5, y: y - 3, class: 'frame-figure', 'text-anchor': 'end' }, [text(v)]));
    }
  });
  return svg('g', {}, [svg('path', { d, class: 'frame-tick' }), ...nodes]);
}

/** @param {{left: number, top: number, width: number}} frame @param {any} site */
function northPoint(frame, site) {
  const small = frame.left === 0;
  const x = frame.left + frame.width - (small ? 30 : 40);
  const y = frame.top + (small ? 36 : 58);
  const north = -(site.planNorth ?? 0);
  const variation = site.magneticVariation ?? 0;
  const magnetic = variation !== 0;
  const length = small ? 20 : 30;
  const a = (north * Math.PI) / 180;
  const nx = Math.sin(a) * (length + 9);
  const ny = -Math.cos(a) * (length + 9);
  return svg('g', { transform: `translate(${x} ${y})`, class: 'north' }, [
    svg('g', { transform: `rotate(${north})` }, [
      svg('path', { d: `M0 ${length * 0.85}V${-length}`, class: 'north-line' }),
      svg('path', { d: `M-5 ${-length * 0.28} 0 ${-length} 5 ${-length * 0.28} 0 ${-length * 0.5}Z`, class: 'north-head' }),
      svg('path', { d: `M0 ${-length} 5 ${-length * 0.28} 0 ${-length * 0.5}Z`, class: 'north-half' }),
      svg('path', { d: `M-6 ${length * 0.85}H6`, class: 'north-line' }),
    ]),
    magnetic
      ? svg('path', { d: `M0 ${length * 0.5}V${-length + 2}`, transform: `rotate(${north + variation})`, class: 'north-magnetic' })
      : null,
    svg('text', { x: nx, y: ny + 4, 'text-anchor': 'middle', class: 'north-letter' }, ['N']),
    small ? null : svg('text', { y: length + 14, 'text-anchor': 'middle', class: 'frame-figure' }, [
      (site.planNorth ?? 0) === 0 ? 'true north up' : `up points to ${Math.round((site.planNorth ?? 0) * 10) / 10}°`.replace('-', MINUS),
    ]),
    small || !magnetic ? null : svg('text', { y: length + 27, 'text-anchor': 'middle', class: 'frame-figure' }, [`magnetic ${formatVariation(variation)}`]),
  ]);
}

/** @param {Sight} sight @param {{left: number, top: number, width: number, height: number}} frame @param {'m'|'ft'} units @param {number} unit */
function scaleBar(sight, frame, units, unit) {
  const k = sight.ppm * unit;
  const step = roundStep(k, frame.left === 0 ? 70 : 110);
  const px = step * k;
  const x = frame.left + frame.width - px - 26;
  const y = frame.top + frame.height - 16;
  const cut = [0, 0.1, 0.2, 0.5, 1];
  const word = units === 'm' ? 'm' : 'ft';
  return svg('g', { class: 'scale' }, [
    svg('rect', { x, y, width: px, height: 5, class: 'scale-ground' }),
    ...[0, 2].map((i) =>
      svg('rect', { x: x + cut[i] * px, y, width: (cut[i + 1] - cut[i]) * px, height: 5, class: 'scale-ink' }),
    ),
    ...[0, 3, 4].map((i) =>
      svg('text', { x: x + cut[i] * px, y: y - 4, 'text-anchor': 'middle', class: 'frame-figure scale-figure' }, [
        `${Math.round(cut[i] * step * 100) / 100}${i === 4 ? ` ${word}` : ''}`,
      ]),
    ),
  ]);
}
