// @ts-check
/**
 * Shapes of the state, for the checker and the reader. There is no code here.
 *
 * @typedef {number[]} Point [x, y] or [x, y, z], metres: x east, y north on the plan, z up
 * @typedef {Record<string, any>} Plan a plan document, `spanwright-plan/1`
 * @typedef {{path: string, message: string}} Fault
 * @typedef {{ref: string, vertex: number|null}} Selection
 *   `ref` is kind and id: `supports/oak`, `boundary/`, `entry/`, `datums/0`, `spots/2`
 * @typedef {{x: number, y: number, width: number, height: number}} View
 *   the part of the plan in sight, metres; x, y its south-west corner
 *
 * @typedef {object} Saved
 * @property {'saved'|'saving'|'unsaved'|'offline'|'conflict'} state
 * @property {string|null} at ISO time of the last save that worked
 *
 * @typedef {object} Search
 * @property {string|null} id
 * @property {'none'|'running'|'done'|'failed'|'cancelled'} state
 * @property {number} progress 0 to 1
 * @property {string} what is being tried
 * @property {any[]} found placements as they come
 * @property {any|null} result the result document
 * @property {string|null} error a sentence
 * @property {Plan|null} planAtSearch the plan that was searched
 * @property {any[]} [own] placements moved by hand or cured, the newest first
 * @property {any[]} [faults] of the plan, when the search could not start for them
 * @property {string} [effort]
 * @property {number} [considered] layouts so far
 * @property {number} [refused] of them
 * @property {boolean} [broken] the stream of news is broken and listened to again
 * @property {boolean} [ghosts] whether every refusal is drawn on the plan
 *
 * @typedef {object} State
 * @property {Plan} plan
 * @property {string|null} planId
 * @property {string} etag
 * @property {Saved} saved
 * @property {string|null} notice one sentence about the plot as a whole, or null
 * @property {string|null} [clash] id of the plot another window saved first
 * @property {'survey'|'brief'|'placements'|'sheet'} place
 * @property {Selection|null} selection
 * @property {string} tool name of the tool in hand; `select` when none is
 * @property {any} draft what the tool in hand has so far, or null (see tools/)
 * @property {{point: Point, reason: string}|null} cursor where the pointer stands after snapping
 * @property {string|null} hovered ref of the thing under the pointer
 * @property {'m'|'ft'} units
 * @property {Fault[]} faults
 * @property {any|null} catalogue
 * @property {{name: string, title: string}[]} demos
 * @property {{id: string, title: string, savedAt?: string}[]} plots saved on the server
 * @property {Search} search
 * @property {string|null} chosen id of the chosen placement
 * @property {string|null} chosenBand
 * @property {string|null} pinned id of the pinned placement
 * @property {any|null} shownRefusal
 * @property {View|null} view null: fit the plot
 * @property {any|null} trace the picture that is traced over: where it lies, its bitmap
 * @property {number} opened counts the plans taken by `load`
 * @property {number} hint which of the three hints is shown; 0 none
 * @property {string|null} undoLabel
 * @property {string|null} redoLabel
 */
export {};
