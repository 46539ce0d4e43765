// What does the check say, why, and who decides? Numbers and words come from Python as they stand; nothing is picked beforehand.
import { useState } from '../vendor/preact-hooks.js';
import { OutcomeShape } from './bar.js';
import { html } from './html.js';
import { ResultDrawings } from './result-drawings.js';
import { CriteriaTable, FirstCriterion, Lists, ReactionsTable } from './result-tables.js';

/** @typedef {import('../controller.js').Controller} Controller */

/** @param {{controller: Controller}} props */
export function ResultView({ controller }) {
  const { state } = controller;
  const result = state.current.value;
  if (!result) return html`<p class="quiet">${state.solver.value.state === 'ready' ? 'The newest values are being worked out.' : 'No result yet: the solver has not started. Everything entered is stored.'}</p>`;
  if (result.refusal) {
    return html`<div class="refusal" role="alert"><p><b>Cannot be judged.</b> ${result.refusal.message}</p>
      ${result.refusal.field && html`<button class="key key-main" onClick=${() => controller.go(result.refusal.field)}>Go to that field</button>`}</div>`;
  }
  return html`<div class="result">
    ${state.typing.value.length > 0 && html`<p class="standing hatched">typing: this result is for the earlier values</p>`}
    <${Verdict} result=${result} onGo=${controller.go} onDecide=${goToDecision} />
    <${Problems} result=${result} controller=${controller} />
    <${FirstCriterion} result=${result} />
    <${ResultDrawings} controller=${controller} />
    <${CriteriaTable} result=${result} /><${ReactionsTable} result=${result} />
    <${Decision} key=${state.entry.value?.id} controller=${controller} result=${result} />
    <button class="key key-main key-on" onClick=${() => controller.show({ name: 'share', id: state.entry.value?.id })}>Share this check</button>
    <${Lists} result=${result} />
  </div>`;
}

/** The decision stands below the figures it rests on; this leads there without picking anything. */
function goToDecision() {
  const heading = document.getElementById('decision');
  heading?.focus({ preventScroll: true });
  heading?.scrollIntoView({ block: 'start' });
}

/** @param {{result: any, onGo?: (path:string)=>void, onDecide?: ()=>void}} props */
export function Verdict({ result, onGo, onDecide }) {
  const { outcome } = result;
  const [first, ...others] = outcome.missing ?? [];
  const named = new Set((outcome.missing ?? []).map((/** @type {any} */ fact) => fact.text));
  const reasons = (outcome.reasons ?? []).filter((/** @type {string} */ reason) => !named.has(reason));
  return html`<section class=${`verdict is-${outcome.word}`} aria-label="Outcome in full"><div class="verdict-mark" aria-hidden="true"><${OutcomeShape} word=${outcome.word} /></div>
    <div class="verdict-words"><h2>${outcome.title}</h2>${outcome.as_found && html`<p>${outcome.as_found}</p>`}
      ${outcome.lapsed && html`<p><b>as found earlier, look again</b></p>`}
      ${outcome.rules_out && html`<p>Rules out: <b>${outcome.rules_out}</b></p>`}${outcome.until && html`<p>Holds until ${outcome.until} or any change.</p>`}
      ${onDecide && html`<button class="key key-decide" onClick=${onDecide}>Decide ›</button>`}</div>
    ${reasons.length > 0 && html`<ul class="reasons">${reasons.map((/** @type {string} */ reason) => html`<li>${reason}</li>`)}</ul>`}
    ${first && html`<${Missing} fact=${first} onGo=${onGo} main />`}
    ${others.length > 0 && html`<details class="missing"><summary>${others.length} more ${others.length === 1 ? 'fact is' : 'facts are'} missing</summary>${others.map((/** @type {any} */ fact) => html`<${Missing} fact=${fact} onGo=${onGo} />`)}</details>`}
  </section>`;
}

/** A fact that is missing, and the way to it. @param {{fact: any, onGo?: (path:string)=>void, main?: boolean}} props */
function Missing({ fact, onGo, main }) {
  return html`<div class="missing"><p>Missing: <b>${fact.text}</b>${fact.who ? html`<br />Who can give it: ${fact.who}` : ''}</p>
    ${onGo && fact.path && html`<button class=${main ? 'key key-main' : 'key'} aria-label=${`Answer: ${fact.text}`} onClick=${() => onGo(fact.path)}>Answer<span aria-hidden="true"> ›</span></button>`}</div>`;
}

/** @param {{controller: Controller, result: any}} props */
function Problems({ controller, result }) {
  if (!result.errors?.length) return null;
  return html`<section class="problems" aria-label="What could not be read"><h2>Could not be read</h2><ul>${result.errors.map((/** @type {any} */ one) => html`<li>${one.message}
    <button class="key" aria-label=${`Go to: ${one.message}`} onClick=${() => controller.go(one.field)}>Go there</button></li>`)}</ul></section>`;
}

/** @param {{controller: Controller, result: any}} props */
function Decision({ controller, result }) {
  const { record, preferences, readOnly, typing } = controller.state;
  const [choice, setChoice] = useState('');
  const [name, setName] = useState(preferences.value.name || record.value?.found_by.name || '');
  const [said, setSaid] = useState('');
  const made = record.value?.decision;
  const open = (result.decisions ?? []).find((/** @type {any} */ one) => one.id === choice && !one.ruled_out);
  const write = () => {
    if (typing.value.length) { setSaid('Something is typed and not entered yet: press Next there first.'); return; }
    if (!open || !name.trim()) { setSaid(open ? 'Type the name of who decides.' : 'Pick one of the decisions that are left.'); return; }
    setSaid('');
    void controller.editing.decide(choice, name.trim());
  };
  return html`<section class="decision" aria-label="Decision"><h2 id="decision" tabindex="-1">Decision, yours and not the tool’s</h2>
    ${made && html`<p class="made">Decided: <b>${result.decisions?.find((/** @type {any} */ one) => one.id === made.choice)?.label ?? made.choice}</b>, ${made.name}, ${made.time.slice(0, 16).replace('T', ' ')}</p>`}
    <fieldset class="choices" aria-label="Decision"><legend>What is left to pick</legend><div class="choice-list">${(result.decisions ?? []).map((/** @type {any} */ one) => one.ruled_out
      ? html`<p key=${one.id} class="choice is-struck"><span class="choice-mark" aria-hidden="true"></span><span class="choice-words"><del>${one.label}</del><small>${one.why}</small></span></p>`
      : html`<label key=${one.id} class=${choice === one.id ? 'choice is-chosen' : 'choice'}><input type="radio" name="decision" aria-label=${`Decision: ${one.label}`} checked=${choice === one.id} disabled=${Boolean(readOnly.value)} onChange=${() => setChoice(one.id)} />
          <span class="choice-mark" aria-hidden="true"></span><span class="choice-words">${one.label}${(one.help || one.why) && html`<small>${one.help || one.why}</small>`}</span></label>`)}</div></fieldset>
    <div class="field"><label for="decider">Name of who decides</label><input id="decider" type="text" maxlength="120" value=${name} onInput=${(/** @type {any} */ event) => setName(event.currentTarget.value)} /></div>
    <p class="read-back is-error" role="alert">${said}</p>
    <button class="key" onClick=${write}>Write down the decision</button></section>`;
}
