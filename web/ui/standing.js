// How far are the solver and the store without signal? Said as it is, never sooner.
import { html } from './html.js';

/** @param {{controller: import('../controller.js').Controller}} props */
export function SolverStanding({ controller }) {
  const { solver, missing } = controller.state;
  const { state, label, loaded, total, message } = solver.value;
  if (missing.value.length) return html`<p class="standing" role="status">This browser lacks what the solver needs: ${missing.value.join(', ')}. Checks can be entered, kept and exported, not judged.</p>`;
  if (state === 'ready') return null;
  if (state === 'failed') {
    return html`<div class="standing standing-failed" role="alert"><p><b>The solver did not start.</b> ${message} Everything entered stays stored and can be exported; nothing can be judged yet.</p>
      <button class="key" onClick=${controller.retrySolver}>Try again</button></div>`;
  }
  return html`<div class="standing" role="status"><p>${sentence(label || 'The solver is starting')} You can enter everything meanwhile.</p>
    ${total > 0 ? html`<progress aria-label="Start of the solver" max=${total} value=${loaded}></progress>` : html`<progress aria-label="Start of the solver"></progress>`}</div>`;
}

/** @param {string} words */
const sentence = (words) => (/[.!?]$/.test(words) ? words : `${words}.`);

/** @type {Record<string, string>} */
const SAID = {
  checking: 'Without signal: being looked at.', downloading: 'Without signal: not yet, still loading.', verifying: 'Without signal: not yet, files are being verified.',
  ready: 'Ready without signal.', unavailable: 'Without signal: not available in this browser or at this address.', failed: 'Without signal: storing failed. It works only with signal for now.',
  'update-waiting': 'A new version waits.',
};

/** @param {{controller: import('../controller.js').Controller}} props */
export function OfflineStanding({ controller }) {
  const { state, message, done, total } = controller.state.offline.value;
  const loading = state === 'downloading' || state === 'verifying';
  return html`<div class="offline" role="status">
    <p class=${state === 'ready' ? 'offline-ready' : ''}>${SAID[state] ?? state} ${state === 'ready' ? '' : message}</p>
    ${loading && total > 0 && html`<progress aria-label="Storing for use without signal" max=${total} value=${done}></progress>`}
    ${state === 'update-waiting' && html`<button class="key" onClick=${controller.applyUpdate}>Use the new version</button>`}
    ${state === 'failed' && html`<button class="key" onClick=${controller.checkOffline}>Try storing again</button>`}
  </div>`;
}
