// Which screen stands on the page, and what lies over it?
import { render } from '../vendor/preact.js';
import { useEffect, useErrorBoundary } from '../vendor/preact-hooks.js';
import '../vendor/signals.js';
import { About } from './about.js';
import { CheckScreen } from './check.js';
import { ClearArea } from './clear-area.js';
import { html } from './html.js';
import { ListScreen } from './list.js';
import { Notices } from './notices.js';
import { OpenedScreen } from './opened.js';
import { SettingsScreen } from './settings.js';
import { ShareScreen } from './share.js';

/** @typedef {import('../controller.js').Controller} Controller */

/** @type {Record<string, any>} */
const SCREENS = { list: ListScreen, check: CheckScreen, settings: SettingsScreen, share: ShareScreen, opened: OpenedScreen, about: About };

/** @param {HTMLElement} root @param {Controller} controller */
export function mountApp(root, controller) {
  root.textContent = '';
  render(html`<${App} controller=${controller} />`, root);
}

/** @param {{controller: Controller}} props */
function App({ controller }) {
  const { screen, preferences, current } = controller.state;
  const { light, large } = preferences.value;
  const [broken, mend] = useErrorBoundary((/** @type {unknown} */ error) => console.error(error));
  useEffect(() => { document.documentElement.className = [`light-${light}`, large ? 'large-type' : ''].join(' ').trim(); }, [light, large]);
  if (broken) {
    return html`<main class="page"><h1>This screen broke</h1><p role="alert">${String(broken)}. That is our fault, not yours. Everything entered is stored.</p>
      <button class="key key-main" onClick=${() => { controller.back(); mend(); }}>Back to the list</button></main>`;
  }
  if (controller.state.clearing.value) return html`<${ClearArea} controller=${controller} lines=${current.value.clear_area.lines} />`;
  const Screen = SCREENS[screen.value.name] ?? ListScreen;
  return html`<${Screen} controller=${controller} /><${Notices} controller=${controller} />`;
}
