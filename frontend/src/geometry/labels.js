// @ts-check
/**
 * Placing lettering so that none covers another: the weightier goes first and takes the first free
 * one of its places; a lesser that finds none is left out. Pixels, y down.
 */

/** @typedef {{left: number, top: number, width: number, height: number}} Box */
/**
 * @typedef {object} Wanted
 * @property {string} id
 * @property {number} weight the greater goes first; Infinity must be shown wherever it falls
 * @property {Box[][]} places in order of liking, each as the boxes it fills
 */

/** @param {Box} a @param {Box} b @returns {number} area of their overlap, square pixels */
export function overlap(a, b) {
  const w = Math.min(a.left + a.width, b.left + b.width) - Math.max(a.left, b.left);
  const h = Math.min(a.top + a.height, b.top + b.height) - Math.max(a.top, b.top);
  return w > 0 && h > 0 ? w * h : 0;
}

/**
 * @param {Wanted[]} wanted
 * @param {Box[]} taken what lettering must not cover (symbols, the north point)
 * @param {Box} frame labels lie wholly inside it
 * @param {Box[]} [soft] what lettering had better not cover (lines), where it has the choice
 * @returns {Map<string, number>} id to the index of its place; no entry: left out
 */
export function placeLabels(wanted, taken, frame, soft = []) {
  const held = [...taken];
  const placed = new Map();
  const order = [...wanted].sort((a, b) => b.weight - a.weight);
  for (const label of order) {
    let best = -1;
    let least = Infinity;
    for (let i = 0; i < label.places.length ; i++) {
      const boxes = label.places[i];
      if (!boxes.every((box) => inside(box, frame) && held.every((other) => overlap(box, other) === 0))) continue;
      // Each place further down the list must spare a little more to be worth it.
      const cost = boxes.reduce((sum, box) => sum + covered(box, soft), 0) + i * 4;
      if (cost < least) {
        least = cost;
        best = i;
      }
    }
    if (best < 0 && label.weight === Infinity && label.places.length) best = 0;
    if (best < 0) continue;
    placed.set(label.id, best);
    held.push(...label.places[best]);
  }
  return placed;
}

/** @param {Box} box @param {Box[]} others */
const covered = (box, others) => others.reduce((sum, other) => sum + overlap(box, other), 0);

/** @param {Box} box @param {Box} frame */
const inside = (box, frame) =>
  box.left >= frame.left &&
  box.top >= frame.top &&
  box.left + box.width <= frame.left + frame.width &&
  box.top + box.height <= frame.top + frame.height;
