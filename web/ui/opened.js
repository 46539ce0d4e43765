// What does someone see who opens a link: the record in words, the result worked out anew, and whether both agree?
import { getAt } from '../pointer.js';
import { stations } from '../stations.js';
import { html } from './html.js';
import { Verdict } from './result.js';
import { ResultDrawings } from './result-drawings.js';
import { CriteriaTable, Lists, ReactionsTable } from './result-tables.js';
import { SolverStanding } from './standing.js';

/** @typedef {import('../controller.js').Controller} Controller */

/** @param {{controller: Controller}} props */
export function OpenedScreen({ controller }) {
  const opened = controller.state.opened.value;
  return html`<main class="page opened-page"><header class="title-block"><h1>A check from a link</h1><button class="key" onClick=${controller.back}>‹ List</button></header>
    <${SolverStanding} controller=${controller} />
    ${opened?.state === 'error' && html`<div class="refusal" role="alert"><p><b>The link could not be read.</b> ${opened.message}</p><p>Nothing stored here was changed. Ask for the link again, as a whole: messengers sometimes cut long links.</p></div>`}
    ${(opened?.state === 'waiting' || opened?.state === 'reading') && html`<p class="quiet">The link is kept in the address and is read as soon as the solver has started.</p>`}
    ${opened?.state === 'read' && html`<${Read} controller=${controller} opened=${opened} />`}
  </main>`;
}

/** @param {{controller: Controller, opened: any}} props */
function Read({ controller, opened }) {
  const { record, result, agreement } = opened;
  const keep = () => { void controller.sharing.keepOpened().then((/** @type {string} */ id) => controller.show({ name: 'check', id, at: '/place' })).catch(controller.fail); };
  return html`${result.clear_area && html`<div class="refusal" role="alert">${result.clear_area.lines.map((/** @type {string} */ line, /** @type {number} */ i) => (i ? html`<p>${line}</p>` : html`<h2>${line}</h2>`))}</div>`}
    ${agreement.equal === false && html`<p class="standing" role="alert"><b>The numbers worked out here are not those of the link.</b> See below which; ask whoever sent it.</p>`}
    <p class="standing">To read only. Found by ${record.found_by.name || 'someone not named'}${record.found_at ? `, ${record.found_at.slice(0, 16).replace('T', ' ')}` : ''}. ${record.photos.length ? `${record.photos.length} photo${record.photos.length === 1 ? '' : 's'} stayed on the sender’s phone.` : ''}</p>
    <${Verdict} result=${result} />
    <section class=${agreement.equal ? 'agreement' : 'agreement agreement-differs'} aria-label="Agreement"><h2>${agreement.equal ? 'Worked out again: the numbers are equal' : 'Worked out again: the numbers differ'}</h2><p>${agreement.shown}</p>
      ${agreement.differs?.length > 0 && html`<details><summary>Which numbers differ</summary><table class="ruled"><thead><tr><th scope="col">Number</th><th scope="col">In the link</th><th scope="col">Here</th></tr></thead><tbody>${agreement.differs.map((/** @type {any} */ one) => html`<tr><th scope="row">${one.name}</th><td>${one.recorded}</td><td>${one.now}</td></tr>`)}</tbody></table></details>`}</section>
    <${CriteriaTable} result=${result} /><${ReactionsTable} result=${result} /><${ResultDrawings} controller=${controller} result=${result} />
    <h2>The record in words</h2><${InWords} record=${record} result=${result} words=${controller.state.words.value} />
    <${Lists} result=${result} />
    <button class="key key-main" onClick=${keep}>Keep a copy as a new check</button>`;
}

/** @param {{record: any, result: any, words: import('../types.js').Hello}} props */
export function InWords({ record, result, words }) {
  return html`${stations(record, words).map((station) => {
    const rows = station.fields.map((field) => ({ field, words: inWords(field, getAt(record, field.path), result) })).filter((row) => row.words);
    return rows.length ? html`<section class="in-words" key=${station.path} aria-label=${station.title}><h3>${station.title}</h3><dl>${rows.map(({ field, words: said }) => html`<div><dt>${field.label}</dt><dd>${said}</dd></div>`)}</dl></section>` : null;
  })}${record.decision && html`<p>Decision: ${words.vocabulary.decisions.find((one) => one.id === record.decision.choice)?.label ?? record.decision.choice}, ${record.decision.name}, ${record.decision.time}</p>`}`;
}

/** @param {import('../types.js').Field} field @param {any} value @param {any} result @returns {string} */
function inWords(field, value, result) {
  if (['action', 'heading', 'note', 'photo'].includes(field.kind) || value === null || value === undefined || value === '') return '';
  if (field.kind === 'number') {
    const read = result.readings?.[field.path];
    return read ? [read.shown, read.range].filter(Boolean).join('; ') : `${value.text} ${value.unit ?? ''} (not read)`;
  }
  if (field.kind === 'choice') return field.options?.find((one) => one.id === String(value))?.label ?? String(value);
  if (field.kind === 'many') return value.map((/** @type {string} */ id) => field.options?.find((one) => one.id === id)?.label ?? id).join('; ');
  return String(value);
}
