// @ts-check
/**
 * Refusals: why layouts are not allowed, and what would cure each.
 * @param {HTMLElement} root empty element that this panel owns
 * @param {import('../state/store.js').Store} store the page's one store
 */
export function mount(root, store) {
  root.classList.add('refusals');
  void store;
}
