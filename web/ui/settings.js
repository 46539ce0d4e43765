// Which things are set once and hold for every check?
import { Choices } from './choice.js';
import { options } from '../field-kinds.js';
import { html } from './html.js';

/** @param {{controller: import('../controller.js').Controller}} props */
export function SettingsScreen({ controller }) {
  const preferences = controller.state.preferences.value;
  const save = (/** @type {any} */ patch) => { void controller.savePreferences(patch).catch(controller.fail); };
  /** @param {string} id @param {string} label @param {'name'|'phone'} key */
  const text = (id, label, key) => html`<div class="field"><label for=${id}>${label}</label><input id=${id} type=${key === 'phone' ? 'tel' : 'text'} maxlength=${key === 'phone' ? 40 : 120} value=${preferences[key]} onChange=${(/** @type {any} */ event) => save({ [key]: event.currentTarget.value })} /></div>`;
  return html`<main class="page"><header class="title-block"><h1>Settings</h1><button class="key" onClick=${controller.back}>‹ List</button></header>
    <p>These hold for new checks. No number and no answer of a check is ever preset.</p>
    ${text('own-name', 'Your name', 'name')}${text('ring', 'Phone to ring', 'phone')}
    <${Choices} name="Units" legend="Units shown" options=${options('metric=Metric: m, kN, kN m|us=US: ft, lb, kip ft')} value=${preferences.display} onChoose=${(/** @type {string} */ display) => save({ display })} />
    <${Choices} name="Light" legend="Light" options=${options('auto=As the device is set|paper=Paper|sun=Bright sun: black on white|dark=Dark')} value=${preferences.light} onChoose=${(/** @type {string} */ light) => save({ light })} />
    <${Choices} name="Type" legend="Type" options=${options('false=As the device is set|true=Large type')} value=${String(preferences.large)} onChoose=${(/** @type {string} */ id) => save({ large: id === 'true' })} />
    <${Choices} name="Number pad" legend="Number pad of the page" options=${options('touch=On touch screens|always=Always|never=Never: use the device’s own keyboard')} value=${preferences.pad} onChoose=${(/** @type {string} */ pad) => save({ pad })} />
  </main>`;
}
