// @ts-check
/**
 * The desk: knows all tools, hands pointer and keys to the one in hand, and holds the keys that
 * mean the same whatever is in hand. It emits edits and never touches the page.
 */
import { boundary } from './boundary.js';
import { bracketLine } from './bracketline.js';
import { building } from './building.js';
import { datum } from './datum.js';
import { entry } from './entry.js';
import { mastZone } from './mastzone.js';
import { metalwork } from './metalwork.js';
import { noise } from './noise.js';
import { overheadLine } from './overheadline.js';
import { people } from './people.js';
import { scale } from './scale.js';
import { deleteSelected, duplicateSelected, select } from './select.js';
import { spot } from './spot.js';
import { support } from './support.js';
import { tape } from './tape.js';
import { tree } from './tree.js';
import { twotapes } from './twotapes.js';
import { zone } from './zone.js';

/** @type {import('./types.js').Tool[]} */
const TOOLS = [
  select, boundary, building, support, tree, bracketLine, mastZone, overheadLine, zone, people,
  metalwork, noise, entry, datum, spot, tape, twotapes, scale,
];

/** The strip, in order: the drawing's key. */
export const STRIP = [
  { name: 'select', label: 'Select', key: 'V' },
  { name: 'boundary', label: 'Boundary', key: 'B' },
  { name: 'buildings', label: 'Building', key: 'H' },
  { name: 'supports', label: 'Support', key: 'S' },
  { name: 'trees', label: 'Tree', key: 'R' },
  { name: 'bracketLines', label: 'Bracket line', key: 'K' },
  { name: 'mastZones', label: 'Mast zone', key: 'M' },
  { name: 'overheadLines', label: 'Overhead line', key: 'O' },
  { name: 'zones', label: 'Zone', key: 'Z' },
  { name: 'people', label: 'People', key: 'P' },
  { name: 'metalwork', label: 'Metalwork', key: 'W' },
  { name: 'noise', label: 'Noise', key: 'N' },
  { name: 'entry', label: 'Station entry', key: 'E' },
  { name: 'datums', label: 'Datum', key: 'D' },
  { name: 'spots', label: 'Spot height', key: 'L' },
  { name: 'tape', label: 'Tape', key: 'T' },
  { name: 'twotapes', label: 'Two tapes', key: 'X' },
];

/**
 * @param {Omit<import('./types.js').Bench, 'take'>} means
 */
export function createDesk(means) {
  const { store } = means;
  /** @type {import('./types.js').Bench} */
  const bench = { ...means, take };
  const inHand = () => TOOLS.find((tool) => tool.name === store.get().tool) ?? select;

  /** @param {string} name */
  function take(name) {
    const tool = TOOLS.find((one) => one.name === name) ?? select;
    store.endGroup();
    store.set({ tool: tool.name, hovered: null });
    tool.start(bench);
  }

  return {
    take,
    /** @param {import('./types.js').PointerTold} event @returns {boolean} the plan must not pan */
    pointer: (event) => inHand().pointer(bench, event),
    /** @param {string} field @param {string} text */
    type: (field, text) => inHand().type?.(bench, field, text),
    deleteSelected: () => deleteSelected(bench),
    duplicateSelected: () => duplicateSelected(bench),
    /** @param {import('./types.js').KeyTold} event @returns {boolean} it was used */
    key(event) {
      const { place, draft } = store.get();
      const letter = event.key.toLowerCase();
      if (event.ctrl && letter === 'z') {
        if (event.shift) store.redo();
        else store.undo();
        return true;
      }
      if (event.ctrl && letter === 'y') {
        store.redo();
        return true;
      }
      if (place !== 'survey') return false;
      if (inHand().key(bench, event)) return true;
      if (event.key === 'Escape' && (draft || inHand() !== select)) {
        if (draft?.points?.length) take(inHand().name);
        else take('select');
        return true;
      }
      if (event.ctrl || event.alt) return false;
      const found = STRIP.find((one) => one.key.toLowerCase() === letter);
      if (!found) return false;
      take(found.name);
      return true;
    },
    /** Gives up a half-drawn thing when another place is gone to. */
    rest() {
      if (store.get().tool !== 'select' || store.get().draft) take('select');
    },
  };
}
