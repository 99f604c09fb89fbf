// @ts-check
/** Survey, left: the strip of tools, which is the drawing's key. */
import { sample } from '../draw/key.js';
import { el } from './el.js';

/**
 * @param {HTMLElement} root
 * @param {import('../state/store.js').Store} store
 * @param {any} shell `desk` takes tools; `strip` lists them
 */
export function mount(root, store, shell) {
  root.classList.add('tools');
  const buttons = shell.strip.map((/** @type {any} */ tool) =>
    el('button', {
      type: 'button', class: 'tool', 'data-tool': tool.name, title: `${tool.label} (${tool.key})`,
      'aria-keyshortcuts': tool.key, 'aria-pressed': 'false',
      onclick: () => shell.desk.take(store.get().tool === tool.name ? 'select' : tool.name),
    }, [
      sample(tool.name),
      el('span', { class: 'tool-name', text: tool.label }),
      el('kbd', { class: 'tool-key', text: tool.key, 'aria-hidden': 'true' }),
    ]),
  );
  root.append(
    el('h2', { class: 'tools-head', text: 'Draw' }),
    el('div', { class: 'tools-list', role: 'toolbar', 'aria-label': 'Tools', 'aria-orientation': 'vertical' }, buttons),
  );
  store.subscribe((s) => s.tool, (tool) => {
    for (const button of buttons) {
      button.setAttribute('aria-pressed', String(button.dataset.tool === tool));
      if (button.dataset.tool === tool && tool !== 'select') button.scrollIntoView({ block: 'nearest', inline: 'nearest' });
    }
  });
}
