// @ts-check
/** Places a support; on a wall it starts as a wall, else as what was chosen last (a mast at first). */
import { placing } from './placing.js';

export const support = placing({
  name: 'supports',
  kind: 'supports',
  label: 'support',
  variant: (draft) => draft.variant ?? (/^(on|corner,) .*(house|wall|building|garage|shed|extension)/i.test(draft.reason) ? 'wall' : 'mast'),
});
