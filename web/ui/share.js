// How does the check leave this phone: sent, copied, or shown as a code?
import { useEffect, useMemo } from '../vendor/preact-hooks.js';
import { encode } from '../vendor/uqr.js';
import { html } from './html.js';
import { SolverStanding } from './standing.js';

/** @param {{controller: import('../controller.js').Controller}} props */
export function ShareScreen({ controller }) {
  const { state, sharing } = controller;
  const { shared, solver, entry, typing } = state;
  const seq = entry.value?.seq;
  useEffect(() => { if (seq !== undefined && solver.value.state === 'ready') void sharing.makeLink(); }, [seq, solver.value.state]);
  const made = shared.value?.state === 'made' ? shared.value : null;
  return html`<main class="page share-page"><header class="title-block"><h1>Share</h1><button class="key" aria-label="Back to the check" onClick=${() => controller.show({ name: 'check', id: state.screen.value.id, at: '/result' })}>‹ Check</button></header>
    <${SolverStanding} controller=${controller} />
    <p>The link holds the whole check with its results. Whoever opens it has it worked out again by the same program and sees whether the numbers are equal.</p>
    ${entry.value?.record.photos.length > 0 && html`<p class="standing"><b>Photos do not travel in the link</b>, only their hashes. Send them in a file: “Export all” in the list.</p>`}
    ${typing.value.length > 0 && html`<p class="standing hatched">Something is typed and not entered yet: the link is for the earlier values.</p>`}
    ${shared.value?.state === 'error' && html`<p class="read-back is-error" role="alert">${shared.value.message}</p>`}
    ${!made && shared.value?.state !== 'error' && html`<p class="quiet">The link is being made.</p>`}
    ${made && html`<div class="first-keys"><button class="key key-main" onClick=${() => { void sharing.send(); }}>Send the link</button><button class="key" onClick=${() => { void sharing.copy(); }}>Copy the link</button></div>
      <div class="field"><label for="link">The link, ${made.length} characters</label><textarea id="link" class="link-text" readonly rows="4" value=${made.link} onFocus=${(/** @type {any} */ event) => event.currentTarget.select()}></textarea></div>
      ${made.qr ? html`<${QrCode} text=${made.link} />` : html`<p class="quiet">The link is too long for a code that a phone reads well. Send or copy it.</p>`}`}
  </main>`;
}

/** @param {{text: string}} props */
function QrCode({ text }) {
  const { size, path } = useMemo(() => {
    const { data, size: modules } = encode(text, { ecc: 'L', border: 4 });
    const squares = data.flatMap((row, y) => row.map((dark, x) => (dark ? `M${x} ${y}h1v1h-1z` : '')));
    return { size: modules, path: squares.join('') };
  }, [text]);
  return html`<svg class="qr" role="img" aria-label="The link as a QR code" viewBox=${`0 0 ${size} ${size}`}><path class="qr-paper" d=${`M0 0h${size}v${size}H0z`} /><path class="qr-ink" d=${path} /></svg>`;
}
