// @ts-check
/**
 * Placements, at the foot of the plan: the side view along the wire.
 * @param {HTMLElement} root empty element that this panel owns
 * @param {import('../state/store.js').Store} store the page's one store
 */
export function mount(root, store) {
  root.classList.add('placement-side');
  void store;
}
