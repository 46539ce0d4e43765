// How are figures and units typed with a wet glove? Keys of 56 by 52 pixels or more; the unit is a key.
import { useRef } from '../vendor/preact-hooks.js';
import { typed, withUnit } from '../drafts.js';
import { html } from './html.js';
import { idOf, Means, NumberField } from './number-field.js';

/** @typedef {import('../controller.js').Controller} Controller */
/** @typedef {import('../types.js').Field} Field */

const ROWS = [['7', '8', '9', '/'], ['4', '5', '6', '\''], ['1', '2', '3', '"'], ['0', '.', ' ', '-']];
/** @type {Record<string, string>} */
const NAMES = { '.': 'Point', '/': 'Slash', '\'': 'Feet mark', '"': 'Inches mark', ' ': 'Space', '-': 'Dash' };

/** The one field with the pad under it, or the question that follows it. @param {{controller: Controller, field: Field}} props */
export function PadPanel({ controller, field }) {
  const { state } = controller;
  const asking = state.meansFor.value === field.path;
  return html`<section class="pad-panel" aria-label="Number pad">
    <${NumberField} controller=${controller} field=${field} alone />
    ${asking ? html`<div class="pad pad-means"><${Means} controller=${controller} field=${field} big />
        <button class="key pad-next" onClick=${() => { void controller.next(field); }}>Next</button></div>`
      : html`<${Pad} controller=${controller} field=${field} />`}
  </section>`;
}

/** @param {{controller: Controller, field: Field}} props */
function Pad({ controller, field }) {
  const { state, editing } = controller;
  const written = useRef({ here: '', text: '', caret: 0 });
  const display = state.record.value?.settings.display === 'us' ? 'us' : 'metric';
  const units = state.words.value.units[display]?.[field.dimension ?? '']?.keys ?? [];
  const part = state.padPart.value;
  const input = () => /** @type {HTMLInputElement|null} */ (document.getElementById(part === 'text' ? idOf(field) : `${idOf(field)}-${part}`));
  const present = () => editing.draftNow(field)[part] ?? '';
  const here = `${field.path} ${part}`;
  const write = (/** @type {string} */ text, /** @type {number} */ caret) => {
    editing.type(field, { [part]: text });
    written.current = { here, text, caret };
    requestAnimationFrame(() => input()?.setSelectionRange(caret, caret));
  };
  const press = (/** @type {string} */ key) => {
    const text = present();
    // Keys may come faster than the page is drawn: then the caret is where the last key left it, not where the input shows it.
    const last = written.current;
    const ahead = last.here === here && last.text === text && input()?.value !== text ? last.caret : null;
    const next = typed(text, ahead ?? input()?.selectionStart ?? text.length, ahead ?? input()?.selectionEnd ?? text.length, key);
    write(next.text, next.caret);
  };
  const steps = part === 'text' && /\/position\/distance$/.test(field.path) && state.solver.value.state === 'ready' ? state.words.value.steps[display] ?? [] : [];
  const unit = (/** @type {string} */ name) => { const text = withUnit(present(), name, units); write(text, text.length); };
  // The field keeps the focus while keys are pressed.
  const hold = (/** @type {Event} */ event) => event.preventDefault();
  const done = () => { state.padUp.value = false; input()?.blur(); state.focus.value = null; };
  return html`<div class="pad" onMouseDown=${hold}>
    <div class="pad-units" role="group" aria-label="Units">${units.map((name) => html`<button key=${name} class="pad-key pad-unit" aria-label=${`Unit ${name}`} onClick=${() => unit(name)}>${name}</button>`)}</div>
    ${steps.length > 0 && html`<div class="pad-units pad-steps" role="group" aria-label="Move it">${steps.map((by) => html`<button key=${by} class="pad-key" aria-label=${`Move by ${by}`} onClick=${() => { void editing.step(field, by); }}>${by.startsWith('-') ? by.replace('-', '−') : `+${by}`}</button>`)}</div>`}
    <div class="pad-grid"><div class="pad-figures">${ROWS.flat().map((key) => html`<button key=${key} class=${/\d/.test(key) ? 'pad-key' : 'pad-key pad-sign'} aria-label=${NAMES[key] ?? key} onClick=${() => press(key)}>${key === ' ' ? '␣' : key}</button>`)}</div>
      <div class="pad-side"><button class="pad-key pad-sign" aria-label="Backspace" onClick=${() => press('Backspace')}>⌫</button>
        <button class="pad-key pad-sign pad-close" aria-label="Close the pad" onClick=${done}>Close</button>
        <button class="pad-key pad-next" onClick=${() => { void controller.next(field); }}>Next</button></div></div>
  </div>`;
}
