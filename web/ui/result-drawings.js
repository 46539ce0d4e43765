// Which drawings show the result, in which order?
import { Drawing } from './drawing.js';
import { html } from './html.js';

const SHEETS = [['moment', 'Moment'], ['shear', 'Shear'], ['sag', 'Sag'], ['free_body', 'Free body with reactions']];

/** @param {{controller: import('../controller.js').Controller, result?: any}} props */
export function ResultDrawings({ controller, result }) {
  const drawings = (result ?? controller.state.current.value)?.drawings;
  if (!drawings) return null;
  return html`<section class="sheets" aria-label="Drawings">${inOrder(result ?? controller.state.current.value).map(([key = '', title = '']) => drawings[key] && html`<figure key=${key} class="sheet"><figcaption class="unseen">${title}</figcaption>
    <${Drawing} svg=${drawings[key]} label=${title} /></figure>`)}</section>`;
}

/** The drawing of what governs comes first: it is the one that is looked for. @param {any} result */
function inOrder(result) {
  const governs = result.criteria?.[0]?.criterion;
  return governs === 'shear' ? [...SHEETS].sort(([a = ''], [b = '']) => Number(b === 'shear') - Number(a === 'shear')) : SHEETS;
}
