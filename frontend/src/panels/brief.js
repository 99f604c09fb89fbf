// @ts-check
/**
 * Brief: what the station must do and with what, edited in the plan.
 * @param {HTMLElement} root empty element that this panel owns
 * @param {import('../state/store.js').Store} store the page's one store
 */
export function mount(root, store) {
  root.classList.add('brief');
  void store;
}
