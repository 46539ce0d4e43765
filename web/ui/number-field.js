// How is one measured number written, read back and entered?
import { useEffect, useRef, useState } from '../vendor/preact-hooks.js';
import { differs } from '../drafts.js';
import { getAt } from '../pointer.js';
import { Choices } from './choice.js';
import { html } from './html.js';

/** @typedef {import('../controller.js').Controller} Controller */
/** @typedef {import('../types.js').Field} Field */

/** @type {['low'|'high', string][]} */
const ENDS = [['low', 'At least'], ['high', 'At most']];
/** A text that brings its own unit needs none printed beside it. */
const CARRIES_UNIT = /[\p{L}'"]/u;

/** Whether fingers are the pointer here, so that the page's own pad comes up. @param {Controller} controller */
export function usesPad(controller) {
  const wish = controller.state.preferences.value.pad;
  return wish === 'always' || (wish === 'touch' && matchMedia('(pointer: coarse)').matches);
}

/** @param {{controller: Controller, field: Field, alone?: boolean}} props `alone`: with the pad up, nothing but this field */
export function NumberField({ controller, field, alone }) {
  const { state, editing } = controller;
  const input = useRef(/** @type {HTMLInputElement|null} */ (null));
  const draft = editing.draftNow(field);
  const unit = draft.unit || editing.printedUnit(field);
  const pad = usesPad(controller);
  const wanted = state.focus.value === field.path;
  useEffect(() => { if (wanted && state.padPart.value === 'text' && document.activeElement !== input.current) { input.current?.focus({ preventScroll: Boolean(alone) }); if (!alone) input.current?.scrollIntoView({ block: 'center' }); } }, [wanted, state.focus.value]);
  const waiting = differs(state.drafts.value[field.path], getAt(state.record.value, field.path));
  const focused = () => { state.padPart.value = 'text'; if (state.focus.value !== field.path) state.focus.value = field.path; if (pad) state.padUp.value = true; if (!waiting) input.current?.select(); };
  const key = (/** @type {KeyboardEvent} */ event) => { if (event.key === 'Enter') { event.preventDefault(); void controller.next(field); } };
  return html`<div class=${`field number-field ${waiting ? 'is-waiting' : ''} ${alone && draft.means === 'stated' ? 'is-stated' : ''}`}>
    <label for=${idOf(field)}>${alone ? field.name : field.label}</label>
    <div class="number-line">
      <input id=${idOf(field)} ref=${input} type="text" aria-label=${field.name} aria-describedby=${`${idOf(field)}-read`} autocomplete="off" autocapitalize="off" spellcheck=${false}
        inputmode=${pad ? 'none' : 'text'} maxlength="40" enterkeyhint="next" value=${draft.text} readonly=${Boolean(state.readOnly.value)}
        onInput=${(/** @type {any} */ event) => editing.type(field, { text: event.currentTarget.value })} onFocus=${focused} onKeyDown=${key} />
      ${!CARRIES_UNIT.test(draft.text) && html`<span class="printed-unit" aria-hidden="true">${unit}</span>`}
      ${waiting && !alone && html`<button class="key key-main" aria-label=${`Enter, ${field.name}`} onClick=${() => { void controller.next(field); }}>Enter</button>`}
    </div>
    <${ReadBack} controller=${controller} field=${field} waiting=${waiting} />
    ${waiting && !alone && html`<button class="key key-known" aria-label=${`Drop what is typed, ${field.name}`} onClick=${() => { state.reading.value = null; editing.setDraft(field.path, null); }}>Drop what is typed</button>`}
    ${alone && draft.means === 'stated' && html`<${Stated} controller=${controller} field=${field} pad />`}
    ${!alone && field.help && html`<p class="help">${field.help}</p>`}
    ${!alone && field.means && (draft.text || waiting) && html`<${Means} controller=${controller} field=${field} />`}
  </div>`;
}

/** @param {Field} field */
export const idOf = (field) => `f${field.path.replace(/[^a-zA-Z0-9]/g, '-')}`;

/** The line under the field: what Python reads, or why it can't. @param {{controller: Controller, field: Field, waiting: boolean}} props */
function ReadBack({ controller, field, waiting }) {
  const { state } = controller;
  const live = state.reading.value;
  const entered = getAt(state.record.value, field.path);
  const draftText = state.drafts.value[field.path]?.text;
  const result = state.current.value;
  const error = result?.errors?.find((/** @type {any} */ one) => one.field === field.path || one.field.startsWith(`${field.path}/`));
  const id = `${idOf(field)}-read`;
  const say = (/** @type {string} */ kind, /** @type {any} */ words) => html`<p id=${id} class=${`read-back ${kind}`} aria-live="polite">${words}</p>`;
  if (waiting) {
    const stays = draftText === '' ? 'Emptied, not entered yet. ' : 'Not entered yet. ';
    if (live?.path === field.path && live.text === draftText) {
      return live.error ? say('is-error', `${stays}${live.error}`) : say('is-live', [`= ${live.shown}`, live.also ? ` = ${live.also}` : '', html`<small>${stays}</small>`]);
    }
    return say('', stays + (state.solver.value.state === 'ready' ? '' : 'Not yet read: the solver has not started.'));
  }
  if (error) return say('is-error', error.message);
  if (!entered) return say('', '');
  const read = result?.readings?.[field.path];
  if (!read) return say('', 'Entered, not yet read.');
  return say('', [`= ${read.shown}`, read.range ? html`<small>${read.range === 'exact' ? 'exact' : read.range}</small>` : '']);
}

/** How it is known, as large buttons. @param {{controller: Controller, field: Field, big?: boolean}} props */
export function Means({ controller, field, big }) {
  const { state, editing } = controller;
  const draft = editing.draftNow(field);
  const [open, setOpen] = useState(false);
  const options = state.words.value.vocabulary[`means_${field.means}`] ?? state.words.value.vocabulary.means_load ?? [];
  const known = options.find((one) => one.id === draft.means);
  if (known && !big && !open && known.id !== 'stated') {
    return html`<button class="key key-known" aria-label=${`How known: ${known.label}, change, ${field.name}`} onClick=${() => setOpen(true)}>How known: ${known.label} <small>change</small></button>`;
  }
  return html`<div class=${big ? 'means means-big' : 'means'}>
    <${Choices} name=${`${field.name}, how known`} legend=${big ? `${field.label}: how is it known?` : 'How known'} options=${options} value=${draft.means ?? null} small=${!big}
      locked=${Boolean(state.readOnly.value)} onChoose=${(/** @type {string} */ id) => { setOpen(false); void controller.means(field, id); }} />
    ${draft.means === 'stated' && !big && html`<${Stated} controller=${controller} field=${field} />`}
  </div>`;
}

/** The stated low and high of a number. @param {{controller: Controller, field: Field, pad?: boolean}} props */
function Stated({ controller, field, pad }) {
  const key = (/** @type {KeyboardEvent} */ event) => { if (event.key === 'Enter') { event.preventDefault(); void controller.next(field); } };
  return html`<div class="stated">${ENDS.map(([end, label]) => html`<${StatedEnd} key=${end} controller=${controller} field=${field} end=${end} label=${label} onKey=${key} />`)}
    ${!pad && html`<button class="key" aria-label=${`Enter the range, ${field.name}`} onClick=${() => { void controller.next(field); }}>Enter</button>`}
</div>`;
}

/** @param {{controller: Controller, field: Field, end: 'low'|'high', label: string, onKey: (event: KeyboardEvent) => void}} props */
function StatedEnd({ controller, field, end, label, onKey }) {
  const { state, editing } = controller;
  const input = useRef(/** @type {HTMLInputElement|null} */ (null));
  const pad = usesPad(controller);
  const wanted = pad && state.focus.value === field.path && state.padPart.value === end;
  useEffect(() => { if (wanted) input.current?.focus({ preventScroll: true }); }, [wanted]);
  const waiting = differs(state.drafts.value[field.path], getAt(state.record.value, field.path));
  const focused = () => { if (!pad) return; state.padPart.value = end; state.focus.value = field.path; state.padUp.value = true; };
  return html`<label>${label}<input id=${`${idOf(field)}-${end}`} ref=${input} type="text" maxlength="40" inputmode=${pad ? 'none' : 'text'} autocomplete="off" readonly=${Boolean(state.readOnly.value)}
    aria-label=${`${field.name}, ${label.toLowerCase()}`} value=${editing.draftNow(field)[end] ?? ''} onFocus=${focused} onKeyDown=${onKey}
    onInput=${(/** @type {any} */ event) => editing.type(field, { [end]: event.currentTarget.value })} /></label>`;
}
