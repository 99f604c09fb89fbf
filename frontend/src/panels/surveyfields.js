// @ts-check
/** The figures of each kind of thing, in the order they are asked. Only a table. */
import { svg } from '../draw/svg.js';

/**
 * @typedef {object} FieldRow
 * @property {string} path in the thing; `canopy.radius` reaches inside
 * @property {string} label
 * @property {'text'|'length'|'force'|'millimetres'|'date'|'pick'|'choice'|'flag'|'number'} type
 * @property {boolean} [optional]
 * @property {number} [least]
 * @property {string} [hint]
 * @property {boolean} [half] shares its line with the next
 * @property {{value: string, label: string, picture?: () => Node}[]} [options]
 * @property {(thing: any) => boolean} [when]
 */

/** @param {string} d */
const roofPicture = (d) => () =>
  svg('svg', { class: 'roof-picture', viewBox: '0 0 40 20', width: 40, height: 20, 'aria-hidden': 'true' }, [svg('path', { d })]);

/** @param {string} path @param {string} label @param {Partial<FieldRow>} [more] @returns {FieldRow} */
const length = (path, label, more = {}) => ({ path, label, type: 'length', least: 0, half: true, ...more });

/** @type {FieldRow} */
const NAME = { path: 'name', label: 'Name', type: 'text', optional: true };
/** @type {FieldRow} */
const PULL = { path: 'pullLimit', label: 'Most pull', type: 'force', optional: true, least: 0, hint: 'Calm and in the gust. Empty: not known, not checked. 0: never use it.' };

/** @param {(thing: any) => boolean} [when] @returns {FieldRow[]} */
const crown = (when) => [
  length('canopy.radius', 'Crown radius', { when }),
  length('canopy.from', 'Crown from', { when }),
  length('canopy.to', 'Crown to', { when }),
];

/** @type {Record<string, FieldRow[]>} */
export const FIELDS = {
  boundary: [],
  buildings: [
    NAME,
    {
      path: 'roof', label: 'Roof', type: 'pick',
      options: [
        { value: 'flat', label: 'flat', picture: roofPicture('M4 18V6H36V18Z') },
        { value: 'gable', label: 'gable', picture: roofPicture('M4 18V10L20 3 36 10V18Z') },
        { value: 'hip', label: 'hip', picture: roofPicture('M4 18V11L12 4H28L36 11V18Z') },
        { value: 'lean-to', label: 'lean-to', picture: roofPicture('M4 18V4L36 10V18Z') },
      ],
    },
    length('eaves', 'Eaves'),
    length('ridge', 'Ridge or high side', { when: (b) => b.roof !== 'flat' }),
    { path: 'metalRoof', label: 'Metal roof', type: 'flag' },
  ],
  supports: [
    NAME,
    {
      path: 'kind', label: 'Kind', type: 'pick',
      options: ['tree', 'mast', 'pole', 'chimney', 'wall', 'other'].map((value) => ({ value, label: value })),
    },
    length('lowest', 'Lowest fixing'),
    length('highest', 'Highest fixing'),
    length('accuracy', 'Heights may be off by', { optional: true }),
    length('sway', 'Sways in the gust', { optional: true }),
    PULL,
    { path: 'canopy', label: 'It has a crown', type: 'flag' },
    ...crown((s) => Boolean(s.canopy)),
    { path: 'ropeOnly', label: 'Rope only, no wire', type: 'flag' },
    { path: 'agreedBy', label: 'Agreed by', type: 'text', optional: true, hint: 'Who allows its use, where it is not yours.' },
  ],
  trees: [NAME, ...crown()],
  bracketLines: [NAME, length('lowest', 'Lowest fixing'), length('highest', 'Highest fixing'), PULL],
  mastZones: [
    NAME,
    length('highest', 'Highest mast top'),
    length('guyRadius', 'Guys reach out', { optional: true }),
    length('base', 'Stands on a roof of', { optional: true, hint: '0: on the ground.' }),
    PULL,
  ],
  overheadLines: [
    NAME,
    {
      path: 'kind', label: 'Kind', type: 'choice',
      options: ['unknown', 'low-voltage', 'medium-voltage', 'high-voltage', 'telephone'].map((value) => ({
        value, label: value === 'unknown' ? 'not known' : value,
      })),
    },
    length('clearance', 'Kept distance', { half: false, hint: 'A smaller figure than the default counts only with the two lines below.' }),
    { path: 'authorisedBy', label: 'Allowed by', type: 'text', optional: true, half: true },
    { path: 'authorisedOn', label: 'On', type: 'date', optional: true, half: true },
  ],
  zones: [
    NAME,
    {
      path: 'rule', label: 'Rule', type: 'pick',
      options: [{ value: 'no-mast', label: 'no mast' }, { value: 'no-wire', label: 'no wire' }, { value: 'headroom', label: 'headroom' }],
    },
    length('height', 'Headroom', { when: (z) => z.rule === 'headroom' }),
  ],
  people: [NAME, length('from', 'From'), length('to', 'To')],
  noise: [NAME, { path: 'note', label: 'Note', type: 'text', optional: true }],
  metalwork: [NAME, { path: 'radius', label: 'Radius', type: 'millimetres', least: 0.1, hint: 'Half its thickness; for a strip, a quarter of its width.' }],
  entry: [length('height', 'Height', { half: false })],
  datums: [{ path: 'name', label: 'Name', type: 'text' }],
  spots: [],
};
