// How are the questions of one station laid out?
import { useEffect, useRef } from '../vendor/preact-hooks.js';
import { getAt } from '../pointer.js';
import { Choices, Marks } from './choice.js';
import { html } from './html.js';
import { idOf, NumberField } from './number-field.js';
import { PhotoField } from './photo.js';

/** @typedef {import('../controller.js').Controller} Controller */
/** @typedef {import('../types.js').Field} Field */

/** Words are stored in a run of letters, so that not every letter starts a check. */
const STORE_AFTER_MS = 150;

/** @param {{controller: Controller, station: import('../types.js').Station}} props */
export function StationFields({ controller, station }) {
  const shown = station.fields.filter((field) => !field.extra);
  const extra = station.fields.filter((field) => field.extra);
  const focus = controller.state.focus.value;
  const open = extra.some((field) => field.path === focus || isAnswered(controller, field));
  return html`<div class="fields">
    ${shown.map((field) => html`<${FieldView} key=${`${field.kind}${field.path}${field.label}`} controller=${controller} field=${field} />`)}
    ${extra.length > 0 && html`<details class="extra" open=${open}><summary>More about: ${station.title}</summary>
      ${extra.map((field) => html`<${FieldView} key=${`${field.kind}${field.path}${field.label}`} controller=${controller} field=${field} />`)}</details>`}
  </div>`;
}

/** @param {Controller} controller @param {Field} field */
function isAnswered(controller, field) {
  const value = getAt(controller.state.record.value, field.path);
  if (/^\/supports\/\d+\/name$/.test(field.path)) return false; // every support has one
  return field.kind !== 'action' && field.kind !== 'heading' && field.kind !== 'photo' && value !== null && value !== undefined && value !== '';
}

/** @param {{controller: Controller, field: Field}} props */
export function FieldView({ controller, field }) {
  const { state, editing } = controller;
  const value = getAt(state.record.value, field.path);
  const locked = Boolean(state.readOnly.value);
  switch (field.kind) {
    case 'number': return html`<${NumberField} controller=${controller} field=${field} />`;
    case 'text': case 'long': return html`<${TextField} controller=${controller} field=${field} value=${value ?? ''} locked=${locked} />`;
    case 'choice': return html`<${ChoiceField} controller=${controller} field=${field} value=${value} locked=${locked} />`;
    case 'many': return html`<div class="field"><${Marks} name=${field.name} legend=${field.label} options=${field.options} value=${value ?? []} locked=${locked} onMark=${(/** @type {string} */ id, /** @type {boolean} */ on) => { void editing.mark(field, id, on); }} /></div>`;
    case 'heading': return html`<${Heading} controller=${controller} field=${field} />`;
    case 'note': return html`<p class="note">${field.label}</p>`;
    case 'photo': return html`<${PhotoField} controller=${controller} field=${field} />`;
    default: return html`<button class=${field.removes ? 'key key-remove' : 'key key-add'} aria-label=${field.name} disabled=${locked} onClick=${() => { void controller.act(field); }}>${field.label}${field.help && html`<small>${field.help}</small>`}</button>`;
  }
}

/** @param {{controller: Controller, field: Field}} props */
function Heading({ controller, field }) {
  const own = useRef(/** @type {HTMLHeadingElement|null} */ (null));
  const wanted = controller.state.focus.value === field.path;
  useEffect(() => { if (wanted) { own.current?.focus({ preventScroll: true }); own.current?.scrollIntoView({ block: 'center' }); } }, [wanted]);
  return html`<h3 ref=${own} tabindex="-1">${field.label}</h3>`;
}

/** @param {{controller: Controller, field: Field, value: any, locked: boolean}} props */
function ChoiceField({ controller, field, value, locked }) {
  const { state, editing } = controller;
  const own = useRef(/** @type {HTMLDivElement|null} */ (null));
  useFocus(state.focus.value === field.path, own, 'input');
  const chosen = value === null || value === undefined ? (field.options?.some((one) => one.id === 'null') ? 'null' : null) : String(value);
  const problem = state.current.value?.errors?.find((/** @type {any} */ one) => one.field === field.path);
  return html`<div class="field" ref=${own}><${Choices} name=${field.name} legend=${field.label} options=${field.options} value=${chosen} help=${field.help} locked=${locked} onChoose=${(/** @type {string} */ id) => { void editing.choose(field, id); }} />
    ${problem && html`<p class="read-back is-error">${problem.message}</p>`}</div>`;
}

/** Plain words are kept letter by letter; they change no number. @param {{controller: Controller, field: Field, value: string, locked: boolean}} props */
function TextField({ controller, field, value, locked }) {
  const { state, editing } = controller;
  const own = useRef(/** @type {HTMLDivElement|null} */ (null));
  useFocus(state.focus.value === field.path, own, 'input, textarea');
  const timer = useRef(0);
  const pending = useRef(/** @type {string|null} */ (null));
  const store = () => { clearTimeout(timer.current); if (pending.current !== null) { const text = pending.current; pending.current = null; void editing.answer(field, text); } };
  const change = (/** @type {any} */ event) => { pending.current = event.currentTarget.value; clearTimeout(timer.current); timer.current = window.setTimeout(store, STORE_AFTER_MS); };
  const key = (/** @type {KeyboardEvent} */ event) => { if (event.key === 'Enter' && field.kind === 'text') { event.preventDefault(); store(); void controller.next(field); } };
  useEffect(() => store, []);
  const shown = pending.current ?? value;
  const common = { id: idOf(field), 'aria-label': field.name, value: shown, readOnly: locked, onInput: change, onBlur: store };
  return html`<div class="field text-field" ref=${own}><label for=${idOf(field)}>${field.label}</label>
    ${field.kind === 'long' ? html`<textarea ...${common} rows="3" maxlength="2000"></textarea>` : html`<input ...${common} type=${field.path.endsWith('/phone') ? 'tel' : 'text'} maxlength="200" autocomplete="off" enterkeyhint="next" onKeyDown=${key} />`}
    ${field.help && html`<p class="help">${field.help}</p>`}</div>`;
}

/** @param {boolean} wanted @param {{current: HTMLElement|null}} own @param {string} selector */
function useFocus(wanted, own, selector) {
  useEffect(() => {
    if (!wanted || own.current?.contains(document.activeElement)) return;
    const target = /** @type {HTMLElement|null} */ (own.current?.querySelector(`${selector.split(',')[0]}:checked`) ?? own.current?.querySelector(selector) ?? null);
    target?.focus({ preventScroll: true });
    own.current?.scrollIntoView({ block: 'start' });
  }, [wanted]);
}
