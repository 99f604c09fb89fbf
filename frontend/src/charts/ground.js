// @ts-check
/**
 * Height of the ground above the plan's zero, from the survey's spot heights joined by Delaunay triangles; outside them
 * the height of the nearest point of the triangulated area. Pure. Metres.
 */

/** @typedef {[number, number, number]} Spot */

/**
 * @param {number[][]} spots x, y, z
 * @returns {(x: number, y: number) => number}
 */
export function groundOf(spots) {
  if (spots.length === 0) return () => 0;
  const triangles = delaunay(spots);
  if (triangles.length === 0) return (x, y) => alongLine(spots, x, y);
  return (x, y) => {
    let nearest = { distance: Infinity, z: 0 };
    for (const triangle of triangles) {
      const corners = triangle.map((index) => spots[index]);
      const inside = heightInside(corners, x, y);
      if (inside !== null) return inside;
      for (let edge = 0; edge < 3; edge++) {
        const near = nearestOn(corners[edge], corners[(edge + 1) % 3], x, y);
        if (near.distance < nearest.distance) nearest = near;
      }
    }
    return nearest.z;
  };
}

/**
 * Spots in a line, or one alone, make no triangle: the nearest place on the line through them in order.
 * @param {number[][]} spots
 * @param {number} x
 * @param {number} y
 */
function alongLine(spots, x, y) {
  if (spots.length === 1) return spots[0][2];
  const sorted = [...spots].sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  const near = sorted.slice(1).map((spot, index) => nearestOn(sorted[index], spot, x, y));
  return near.reduce((best, one) => (one.distance < best.distance ? one : best)).z;
}

/**
 * @param {number[][]} corners
 * @param {number} x
 * @param {number} y
 * @returns {number|null} null outside
 */
function heightInside([a, b, c], x, y) {
  const area = (b[0] - a[0]) * (c[1] - a[1]) - (c[0] - a[0]) * (b[1] - a[1]);
  const u = ((x - a[0]) * (c[1] - a[1]) - (c[0] - a[0]) * (y - a[1])) / area;
  const v = ((b[0] - a[0]) * (y - a[1]) - (x - a[0]) * (b[1] - a[1])) / area;
  const slack = -1e-9;
  if (u < slack || v < slack || u + v > 1 - slack) return null;
  return a[2] + u * (b[2] - a[2]) + v * (c[2] - a[2]);
}

/**
 * @param {number[]} a
 * @param {number[]} b
 * @param {number} x
 * @param {number} y
 */
function nearestOn(a, b, x, y) {
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
  const square = dx * dx + dy * dy;
  const share = square === 0 ? 0 : Math.min(1, Math.max(0, ((x - a[0]) * dx + (y - a[1]) * dy) / square));
  return {
    distance: Math.hypot(a[0] + share * dx - x, a[1] + share * dy - y),
    z: a[2] + share * (b[2] - a[2]),
  };
}

/**
 * Bowyer and Watson's insertion, for the few dozen spots a survey holds.
 * @param {number[][]} spots
 * @returns {number[][]} triples of indices
 */
export function delaunay(spots) {
  const xs = spots.map((spot) => spot[0]);
  const ys = spots.map((spot) => spot[1]);
  const size = Math.max(Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys), 1) * 1000;
  const [cx, cy] = [(Math.max(...xs) + Math.min(...xs)) / 2, (Math.max(...ys) + Math.min(...ys)) / 2];
  const points = [...spots, [cx - 2 * size, cy - size], [cx + 2 * size, cy - size], [cx, cy + 2 * size]];
  const count = spots.length;
  let triangles = [[count, count + 1, count + 2]];
  for (let index = 0; index < count; index++) {
    const bad = triangles.filter((triangle) =>
      inCircle(
        triangle.map((corner) => points[corner]),
        points[index],
      ),
    );
    const edges = bad.flatMap(([a, b, c]) => [
      [a, b],
      [b, c],
      [c, a],
    ]);
    const rim = edges.filter(([a, b]) => !edges.some(([c, d]) => a === d && b === c));
    triangles = triangles.filter((triangle) => !bad.includes(triangle));
    triangles.push(...rim.map(([a, b]) => [a, b, index]));
  }
  return triangles.filter(
    (triangle) => triangle.every((corner) => corner < count) && !flat(triangle.map((corner) => points[corner])),
  );
}

/** @param {number[][]} corners */
function flat([a, b, c]) {
  return Math.abs((b[0] - a[0]) * (c[1] - a[1]) - (c[0] - a[0]) * (b[1] - a[1])) < 1e-9;
}

/**
 * @param {number[][]} corners anticlockwise
 * @param {number[]} point
 */
function inCircle([a, b, c], point) {
  const rows = [a, b, c].map((corner) => {
    const [dx, dy] = [corner[0] - point[0], corner[1] - point[1]];
    return [dx, dy, dx * dx + dy * dy];
  });
  const [[ax, ay, aw], [bx, by, bw], [cx, cy, cw]] = rows;
  return ax * (by * cw - bw * cy) - ay * (bx * cw - bw * cx) + aw * (bx * cy - by * cx) > 0;
}
