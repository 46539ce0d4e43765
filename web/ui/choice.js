// How is one answer, or several, picked from a few? Native radio and check boxes under large labels; the mark is a shape, not a colour.
import { useState } from '../vendor/preact-hooks.js';
import { html } from './html.js';

/** @typedef {import('../types.js').Option} Option */

/** Many short answers stand side by side, so that a glove reaches all of them without turning pages. @param {Option[]} options */
const inTwo = (options) => (options.length >= MANY && options.every((option) => option.label.length <= SHORT) ? 'choices-two' : '');
const MANY = 5;
const SHORT = 26;

/**
 * Every choice explains itself once it is picked; before that only on demand, so that a question stays on one screen.
 * @param {string} legend @param {Option[]} options @returns {[string, any]} the class that shows every help, and the key for it
 */
function useHelp(legend, options) {
  const [open, setOpen] = useState(false);
  if (!options.some((option) => option.help)) return ['', null];
  return [`explains ${open ? 'explains-all' : ''}`, html`<button type="button" class="key-explain" aria-expanded=${open} onClick=${() => setOpen(!open)}>what is this?<span class="unseen"> ${legend}</span></button>`];
}

/** @param {{name:string, legend:string, options:Option[], value:string|null, locked?:boolean, small?:boolean, help?:string, onChoose:(id:string)=>void}} props */
export function Choices({ name, legend, options, value, locked, small, help, onChoose }) {
  const group = name.replace(/[^a-zA-Z0-9]/g, '-');
  const [told, tell] = useHelp(legend, small ? [] : options);
  const chosen = options.find((option) => option.id === value);
  return html`<fieldset class=${small ? 'choices choices-small' : `choices ${told} ${inTwo(options)}`} aria-label=${name}>
    <legend>${legend}</legend>${tell}${help && html`<p class="help">${help}</p>`}
    <div class="choice-list">${options.map((option) => html`<label key=${option.id} class=${value === option.id ? 'choice is-chosen' : 'choice'}>
      <input type="radio" name=${group} aria-label=${`${name}: ${option.label}`} checked=${value === option.id} disabled=${locked} onChange=${() => onChoose(option.id)} />
      <span class="choice-mark" aria-hidden="true"></span><span class="choice-words">${option.label}${option.help && html`<small>${option.help}</small>`}</span></label>`)}</div>${!small && inTwo(options) && chosen?.help && html`<p class="help picked-help">${chosen.help}</p>`}
  </fieldset>`;
}

/** @param {{name:string, legend:string, options:Option[], value:string[], locked?:boolean, onMark:(id:string, on:boolean)=>void}} props */
export function Marks({ name, legend, options, value, locked, onMark }) {
  const [told, tell] = useHelp(legend, options);
  return html`<fieldset class=${`choices ${told}`} aria-label=${name}><legend>${legend}</legend>${tell}
    <div class="choice-list">${options.map((option) => html`<label key=${option.id} class=${value.includes(option.id) ? 'choice choice-square is-chosen' : 'choice choice-square'}>
      <input type="checkbox" aria-label=${`${name}: ${option.label}`} checked=${value.includes(option.id)} disabled=${locked} onChange=${(/** @type {any} */ event) => onMark(option.id, event.currentTarget.checked)} />
      <span class="choice-mark" aria-hidden="true"></span><span class="choice-words">${option.label}${option.help && html`<small>${option.help}</small>`}</span></label>`)}</div>
  </fieldset>`;
}
