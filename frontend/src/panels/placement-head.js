// @ts-check
/**
 * Placements on a narrow screen: the headline with previous and next.
 * @param {HTMLElement} root empty element that this panel owns
 * @param {import('../state/store.js').Store} store the page's one store
 */
export function mount(root, store) {
  root.classList.add('placement-head');
  void store;
}
