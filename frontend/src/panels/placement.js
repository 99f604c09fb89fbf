// @ts-check
/**
 * Placements, right: the figures of the chosen placement.
 * @param {HTMLElement} root empty element that this panel owns
 * @param {import('../state/store.js').Store} store the page's one store
 */
export function mount(root, store) {
  root.classList.add('placement');
  void store;
}
