// What does this tool not do, and whose work does it stand on?
import { html } from './html.js';

/** @param {{controller: import('../controller.js').Controller}} props */
export function About({ controller }) {
  const words = controller.state.words.value;
  /** @param {string} title @param {string[]|undefined} items */
  const list = (title, items) => items?.length ? html`<h2>${title}</h2><ul class="plain">${items.map((item) => html`<li>${item}</li>`)}</ul>` : null;
  return html`<main class="page"><header class="title-block"><h1>What this tool does not do</h1><button class="key" onClick=${controller.back}>‹ List</button></header>
    <p>Asfound records a beam as found and compares it with the limits its designer gave. It is a record and a comparison: no approval, no permit and no design. Local codes and licensed practice decide. On seeing distress, clear the area first.</p>
    ${list('Not compared', words.not_compared)}${list('Limits of the tool', words.limits_of_tool)}${list('Cautions', words.cautions)}
    <h2>Notices and licences</h2><p><a class="key" href="notices.txt">Notices and licences of everything inside</a></p>
    <p class="quiet">${Object.entries(words.versions ?? {}).map(([name, version]) => `${name} ${version}`).join(', ')}</p></main>`;
}
