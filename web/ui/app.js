// Which screen stands on the page, and what lies over it?
import { render } from '../vendor/preact.js';
import { useEffect } from '../vendor/preact-hooks.js';
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
  useEffect(() => { document.documentElement.className = [`light-${light}`, large ? 'large-type' : ''].join(' ').trim(); }, [light, large]);
  const clear = screen.value.name === 'check' && current.value?.clear_area && !controller.state.record.value?.condition.told;
  if (clear) return html`<${ClearArea} controller=${controller} lines=${current.value.clear_area.lines} />`;
  const Screen = SCREENS[screen.value.name] ?? ListScreen;
  return html`<${Screen} controller=${controller} /><${Notices} controller=${controller} />`;
}
