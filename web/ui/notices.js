// What has the page to say in one sentence, and which of it can be undone?
import { useEffect } from '../vendor/preact-hooks.js';
import { html } from './html.js';

const SHOWN_MS = 12_000;

/** @param {{controller: import('../controller.js').Controller}} props */
export function Notices({ controller }) {
  const { notice, failure } = controller.state;
  const now = notice.value;
  useEffect(() => {
    if (!now) return undefined;
    const timer = setTimeout(() => { if (notice.value === now) notice.value = null; }, SHOWN_MS);
    return () => clearTimeout(timer);
  }, [now]);
  return html`<div class="notices" role="status" aria-live="polite">
    ${failure.value && html`<div class="notice notice-failure"><p>Something in the page itself went wrong: ${failure.value} What you entered before is stored.</p>
      <button class="key" aria-label="Close the message" onClick=${() => { failure.value = ''; }}>Close</button></div>`}
    ${now && html`<div class="notice"><p>${now.text}</p>
      ${now.undo && html`<button class="key" onClick=${() => { now.undo?.(); notice.value = null; }}>${now.undoLabel ?? 'Undo'}</button>`}
      <button class="key" aria-label="Close the message" onClick=${() => { notice.value = null; }}>Close</button></div>`}
  </div>`;
}
