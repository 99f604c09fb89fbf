// @ts-check
/**
 * Sheet: the rigging list and the drawing as they print, and the downloads.
 * @param {HTMLElement} root empty element that this panel owns
 * @param {import('../state/store.js').Store} store the page's one store
 */
export function mount(root, store) {
  root.classList.add('sheet');
  void store;
}
