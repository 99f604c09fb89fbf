// @ts-check
/**
 * Placing lettering so that none covers another: the weightier goes first and takes the best free
 * one of its places; a lesser that finds none is left out. Pixels, y down.
 */

/** @typedef {{left: number, top: number, width: number, height: number}} Box */
/**
 * @typedef {object} Wanted
 * @property {string} id
 * @property {number} weight the greater goes first; Infinity must be shown wherever it falls
 * @property {string} [insteadOf] id of a weightier one that this stands in for when it found no room
 * @property {Box[][]} places in order of liking, each as the boxes it fills
 */

/** Side of a cell of the index; about the length of a word. */
const CELL = 48;

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
  const held = index(taken);
  const lines = index(soft);
  const placed = new Map();
  const order = [...wanted].sort((a, b) => b.weight - a.weight);
  for (const label of order) {
    if (label.insteadOf !== undefined && placed.has(label.insteadOf)) continue;
    let best = -1;
    let least = Infinity;
    for (let i = 0; i < label.places.length && i * 4 < least; i++) {
      const boxes = label.places[i];
      if (!boxes.every((box) => inside(box, frame) && held.covered(box) === 0)) continue;
      // Each place further down the list must spare a little more to be worth it.
      const cost = boxes.reduce((sum, box) => sum + lines.covered(box), 0) + i * 4;
      if (cost < least) {
        least = cost;
        best = i;
      }
    }
    if (best < 0 && label.weight === Infinity && label.places.length) best = 0;
    if (best < 0) continue;
    placed.set(label.id, best);
    label.places[best].forEach(held.add);
  }
  return placed;
}

/** @param {Box} box @param {Box} frame */
const inside = (box, frame) =>
  box.left >= frame.left &&
  box.top >= frame.top &&
  box.left + box.width <= frame.left + frame.width &&
  box.top + box.height <= frame.top + frame.height;

/**
 * Boxes by the cells of a raster they touch. A box in several cells may be counted more than once:
 * good enough for "none" and for comparing.
 * @param {Box[]} boxes
 */
function index(boxes) {
  /** @type {Map<number, Box[]>} */
  const cells = new Map();
  /** @param {Box} box @param {(key: number) => void} each */
  function touch(box, each) {
    for (let x = Math.floor(box.left / CELL); x <= Math.floor((box.left + box.width) / CELL); x++) {
      for (let y = Math.floor(box.top / CELL); y <= Math.floor((box.top + box.height) / CELL); y++) {
        each(x * 4096 + y);
      }
    }
  }
  /** @param {Box} box */
  function add(box) {
    touch(box, (key) => {
      const cell = cells.get(key);
      if (cell) cell.push(box);
      else cells.set(key, [box]);
    });
  }
  boxes.forEach(add);
  return {
    add,
    /** @param {Box} box @returns {number} */
    covered(box) {
      let sum = 0;
      touch(box, (key) => {
        for (const other of cells.get(key) ?? []) sum += overlap(box, other);
      });
      return sum;
    },
  };
}
