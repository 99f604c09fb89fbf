// @ts-check
/**
 * What tools are given and what they are. There is no code here.
 *
 * @typedef {object} PointerTold
 * @property {'down'|'move'|'drag'|'up'|'tap'|'cancel'|'leave'} type
 * @property {number[]} at plan metres
 * @property {number} ppm pixels per metre
 * @property {string|null} ref the thing under the pointer
 * @property {number|null} vertex its corner handle under the pointer
 * @property {number|null} edge its edge handle under the pointer
 * @property {boolean} shift
 * @property {boolean} free snapping is held off
 * @property {boolean} touch
 * @property {boolean} again a second tap at once at the same place
 *
 * @typedef {{key: string, shift: boolean, ctrl: boolean, alt: boolean}} KeyTold
 *
 * @typedef {object} Bench what a tool works with
 * @property {import('../state/store.js').Store} store
 * @property {(text: string) => number|null} length text to metres
 * @property {(text: string, before: number|null) => number|null} direction text to degrees
 * @property {() => {at: number[], ppm: number}} middle of what is in sight
 * @property {(name: string) => void} take another tool
 * @property {(sentence: string) => void} say
 *
 * @typedef {{name: string, label: string, unit: 'length'|'direction'|'height'}} Field a box to type in
 *
 * @typedef {object} Draft
 * @property {string} tool
 * @property {string|null} kind
 * @property {'ring'|'path'|'point'|'tapes'} shape
 * @property {number[][]} points
 * @property {number[]|null} at where the next point would stand
 * @property {string} reason why it stands there
 * @property {any} guide
 * @property {Field[]} fields
 * @property {Record<string, string>} typed
 * @property {string|null} focus field that typing goes to, null: the pointer leads
 * @property {string} [variant]
 * @property {any} [tapes]
 * @property {Draft} [then] a drawing that waits for this point
 *
 * @typedef {object} Tool
 * @property {string} name
 * @property {(bench: Bench) => void} start
 * @property {(bench: Bench, event: PointerTold) => boolean} pointer true: a drag is wanted, the plan must not pan
 * @property {(bench: Bench, event: KeyTold) => boolean} key true: it was used
 * @property {(bench: Bench, field: string, text: string) => void} [type]
 */
export {};
