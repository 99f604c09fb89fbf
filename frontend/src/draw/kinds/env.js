// @ts-check
/**
 * What a drawer is given and what it answers with. There is no code here.
 *
 * @typedef {object} Env
 * @property {number} px metres that one screen pixel spans now
 * @property {'m'|'ft'} units
 * @property {any} plan
 * @property {boolean} selected
 *
 * @typedef {object} Drawn
 * @property {string} layer where it is drawn and can be pointed at
 * @property {(Node|null)[]} nodes
 * @property {{layer: string, nodes: (Node|null)[]}[]} [under] parts in lower layers, only seen
 *
 * @typedef {object} Label
 * @property {string} id
 * @property {number} weight the weightier is placed first; the lesser gives way
 * @property {number[]} at place on the plan it belongs to
 * @property {{text: string, bold?: boolean}[]} lines
 * @property {string} [look] class: what it is, for its colour
 * @property {'middle'|'around'|'right'|'above'|'below'} sit middle: over the place; around: beside a symbol
 * @property {number} [gap] pixels from the place, for all but middle
 * @property {number} [turn] degrees clockwise on the screen, for lettering along a line
 * @property {number[][]} [also] further places to try
 * @property {'clear'|'tight'|'foul'} [mark] drawn before its first line
 * @property {string} [insteadOf] id of the label it stands in for when that finds no room
 *
 * @typedef {object} Letters lettering of another drawing over the plot, placed together with the plot's own
 * @property {Label[]} labels
 * @property {number[][]} symbols places on the plan that no lettering may cover
 * @property {string[]} hide ids of the plot's labels that these stand in for
 */
export {};
