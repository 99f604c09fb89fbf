// @ts-check
/** Height of a building's roof over a place in its footprint. Pure. Metres above the local ground. */

/**
 * @param {{footprint: number[][], eaves: number, ridge?: number, roof?: string, ridgeLine?: number[][]}} building
 * @param {number} x
 * @param {number} y
 * @returns {number}
 */
export function roofHeight(building, x, y) {
  const { footprint, eaves } = building;
  const ridge = building.ridge ?? eaves;
  const line = building.ridgeLine ?? [];
  const form = building.roof ?? 'flat';
  if (form === 'flat' || line.length < 2 || ridge <= eaves) return Math.max(eaves, form === 'flat' ? eaves : ridge);
  const [a, b] = line;
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]) || 1;
  const across = (/** @type {number} */ px, /** @type {number} */ py) =>
    ((b[0] - a[0]) * (py - a[1]) - (b[1] - a[1]) * (px - a[0])) / length;
  const beyond = (/** @type {number} */ px, /** @type {number} */ py) => {
    const along = ((b[0] - a[0]) * (px - a[0]) + (b[1] - a[1]) * (py - a[1])) / length;
    return Math.max(0, -along, along - length);
  };
  const here = across(x, y);
  const sides = footprint.map(([px, py]) => across(px, py));
  const reach =
    form === 'lean-to'
      ? Math.max(...sides.map(Math.abs))
      : Math.max(...sides.filter((side) => side * here >= 0).map(Math.abs), 0);
  const fall = reach > 0 ? Math.abs(here) / reach : 0;
  const ends = Math.max(...footprint.map(([px, py]) => beyond(px, py)));
  const hip = form === 'hip' && ends > 0 ? beyond(x, y) / ends : 0;
  return ridge - (ridge - eaves) * Math.min(1, Math.max(fall, hip));
}
