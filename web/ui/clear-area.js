// What fills the screen when people must go away from the beam? Three lines, a call, and who was told.
import { useEffect, useRef, useState } from '../vendor/preact-hooks.js';
import { OutcomeShape } from './bar.js';
import { html } from './html.js';

/** @param {{controller: import('../controller.js').Controller, lines: string[]}} props */
export function ClearArea({ controller, lines }) {
  const { record, preferences } = controller.state;
  const [name, setName] = useState('');
  const [said, setSaid] = useState('');
  const head = useRef(/** @type {HTMLHeadingElement|null} */ (null));
  useEffect(() => head.current?.focus(), []);
  const phone = record.value?.settings.phone || preferences.value.phone;
  const leave = () => { if (name.trim()) void controller.editing.told(name.trim()); else setSaid('Type the name of who was told. Then this page can be left.'); };
  return html`<main class="clear-area" role="alertdialog" aria-label="Clear the area">
    <div class="clear-mark"><${OutcomeShape} word="clear" /></div>
    <h1 ref=${head} tabindex="-1">${lines[0]}</h1><p>${lines[1]}</p><p>${lines[2]}</p>
    ${phone ? html`<a class="key key-call" href=${`tel:${phone.replace(/[^+0-9*#,;]/g, '')}`} aria-label=${`Call ${phone}`}>Call ${phone}</a>` : html`<p class="quiet">No phone number was stored. Ring whoever is in charge of the site.</p>`}
    <form class="clear-told" onSubmit=${(/** @type {Event} */ event) => { event.preventDefault(); leave(); }}>
      <label for="told">Name of who was told</label><input id="told" type="text" maxlength="120" autocomplete="off" value=${name} onInput=${(/** @type {any} */ event) => setName(event.currentTarget.value)} />
      <p role="alert">${said}</p>
      <button class="key" type="submit">They were told: leave this page</button>
    </form></main>`;
}
