// How are criteria, reactions and what was not compared laid out to be read aloud over a phone?
import { html } from './html.js';

/** @type {Record<string, string>} */
const STATES = { within: 'within', close: 'close', over: 'over', not_judged: 'not judged', cannot: 'cannot be judged' };

/** @param {{result: any}} props */
export function CriteriaTable({ result }) {
  const rows = result.criteria ?? [];
  if (!rows.length) return html`<p class="quiet">Nothing to compare yet.</p>`;
  return html`<section aria-label="Governing"><h2>Compared, place by place</h2><${Criteria} rows=${rows} /></section>`;
}

/** What governs, by itself: the first of the list. @param {{result: any}} props */
export function FirstCriterion({ result }) {
  const rows = (result.criteria ?? []).slice(0, 1);
  return rows.length ? html`<div class="governs"><h3>Governs</h3><${Criteria} rows=${rows} /></div>` : null;
}

/** @param {{rows: any[]}} props */
function Criteria({ rows }) {
  return html`<p class="criteria-head" aria-hidden="true"><span>ratio to the limit:</span><span>best</span><span>worst</span></p>
    <ul class="criteria">${rows.map((row) => html`<li class=${`criterion is-${row.state}`}>
      <p class="criterion-name"><b>${row.title}</b> <span class="criterion-state">${STATES[row.state] ?? row.state}</span></p>
      <p class="criterion-ratios"><span class="unseen">Ratio </span><b>${row.ratio}</b>${row.ratio_high && html`<span class="unseen"> worst </span><b>${row.ratio_high}</b>`}</p>
      <p class="criterion-place">${row.place}</p>
      <dl class="criterion-figures">${pair('Unfactored', row.unfactored)}${pair('Factored', row.factored)}${pair('Worst', row.high)}${pair('Limit', row.limit)}</dl>
      <p class="criterion-source">${[row.combination, row.document, row.note].filter(Boolean).join('; ')}</p></li>`)}</ul>`;
}

/** @param {string} name @param {any} value */
const pair = (name, value) => (value === null || value === undefined || value === '' ? null : html`<div><dt>${name}</dt><dd>${value}</dd></div>`);

/** @param {{result: any}} props */
export function ReactionsTable({ result }) {
  const rows = result.reactions ?? [];
  if (!rows.length) return null;
  return html`<section aria-label="Reactions"><h2>Reactions, positive up</h2><p class="quiet">Best: unfactored. Low and high: the least and the largest of all cases, with factors.</p><table class="ruled"><thead><tr><th scope="col">Support</th><th scope="col">Best</th><th scope="col">Low</th><th scope="col">High</th></tr></thead>
    <tbody>${rows.map((/** @type {any} */ row) => html`<tr><th scope="row">${row.support}</th><td>${row.unfactored}</td><td>${row.low}</td><td>${row.high}</td></tr>${(row.unit_note || row.fixing) && html`<tr><td colspan="4" class="quiet">${[row.unit_note, row.fixing].filter(Boolean).join('; ')}</td></tr>`}`)}</tbody></table></section>`;
}

/** @param {{result: any}} props */
export function Lists({ result }) {
  return html`${list('Compared', result.compared)}${list('Not compared', result.not_compared)}${list('Notes', result.notes)}${list('Cautions', result.cautions)}
    ${result.equilibrium && html`<p class="quiet">${result.equilibrium}</p>`}
    <p class="quiet versions">${Object.entries(result.versions ?? {}).map(([name, version]) => `${name} ${version}`).join(', ')}</p>`;
}

/** @param {string} title @param {string[]|undefined} items */
const list = (title, items) => (items?.length ? html`<section aria-label=${title}><h2>${title}</h2><ul class="plain">${items.map((item) => html`<li>${item}</li>`)}</ul></section>` : null);
