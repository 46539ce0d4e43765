// Which drawings show the result, in which order?
import { Drawing } from './drawing.js';
import { html } from './html.js';

const SHEETS = [['free_body', 'Free body with reactions'], ['shear', 'Shear'], ['moment', 'Moment'], ['sag', 'Sag']];

/** @param {{controller: import('../controller.js').Controller, result?: any}} props */
export function ResultDrawings({ controller, result }) {
  const drawings = (result ?? controller.state.current.value)?.drawings;
  if (!drawings) return null;
  return html`<section class="sheets" aria-label="Drawings">${SHEETS.map(([key = '', title = '']) => drawings[key] && html`<figure key=${key} class="sheet"><figcaption class="unseen">${title}</figcaption>
    <${Drawing} svg=${drawings[key]} label=${title} /></figure>`)}</section>`;
}
