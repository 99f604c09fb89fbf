// @ts-check
/**
 * Placements, left: starting a search, its progress, the ranked list, the refusals.
 * @param {HTMLElement} root empty element that this panel owns
 * @param {import('../state/store.js').Store} store the page's one store
 */
export function mount(root, store) {
  root.classList.add('placements');
  void store;
}
