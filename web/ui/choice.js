// How is one answer, or several, picked from a few? Native radio and check boxes under large labels; the mark is a shape, not a colour.
import { html } from './html.js';

/** @typedef {import('../types.js').Option} Option */

/** @param {{name:string, legend:string, options:Option[], value:string|null, locked?:boolean, small?:boolean, help?:string, onChoose:(id:string)=>void}} props */
export function Choices({ name, legend, options, value, locked, small, help, onChoose }) {
  const group = name.replace(/[^a-zA-Z0-9]/g, '-');
  return html`<fieldset class=${small ? 'choices choices-small' : 'choices'} aria-label=${name}>
    <legend>${legend}</legend>${help && html`<p class="help">${help}</p>`}
    <div class="choice-list">${options.map((option) => html`<label key=${option.id} class=${value === option.id ? 'choice is-chosen' : 'choice'}>
      <input type="radio" name=${group} aria-label=${`${name}: ${option.label}`} checked=${value === option.id} disabled=${locked} onChange=${() => onChoose(option.id)} />
      <span class="choice-mark" aria-hidden="true"></span><span class="choice-words">${option.label}${option.help && html`<small>${option.help}</small>`}</span></label>`)}</div>
  </fieldset>`;
}

/** @param {{name:string, legend:string, options:Option[], value:string[], locked?:boolean, onMark:(id:string, on:boolean)=>void}} props */
export function Marks({ name, legend, options, value, locked, onMark }) {
  return html`<fieldset class="choices" aria-label=${name}><legend>${legend}</legend>
    <div class="choice-list">${options.map((option) => html`<label key=${option.id} class=${value.includes(option.id) ? 'choice choice-square is-chosen' : 'choice choice-square'}>
      <input type="checkbox" aria-label=${`${name}: ${option.label}`} checked=${value.includes(option.id)} disabled=${locked} onChange=${(/** @type {any} */ event) => onMark(option.id, event.currentTarget.checked)} />
      <span class="choice-mark" aria-hidden="true"></span><span class="choice-words">${option.label}${option.help && html`<small>${option.help}</small>`}</span></label>`)}</div>
  </fieldset>`;
}
