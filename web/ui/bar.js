// What stands at the foot of every check? The outcome, with a word, a shape and a pattern of its own; never colour alone.
import { html } from './html.js';

/** @typedef {import('../controller.js').Controller} Controller */
/** @typedef {'within'|'close'|'over'|'cannot'|'clear'|'working'|'typing'} Word */

/** Two rails are the limits; the mark between, at, or beyond them is the beam. @param {{word: string}} props */
export function OutcomeShape({ word }) {
  const rails = html`<path class="shape-rail" d="M4 12H44M4 36H44" />`;
  /** @type {Record<string, any>} */ const shapes = {
    within: html`${rails}<path class="shape-curve" d="M6 24Q24 34 42 24" />`,
    close: html`${rails}<path class="shape-curve" d="M6 20Q24 52 42 20" /><path class="shape-tick" d="M20 41h8" />`,
    over: html`${rails}<path class="shape-curve" d="M4 16Q24 74 44 16" /><path class="shape-fill" d="M16 36h16l-8 9z" />`,
    cannot: html`<path class="shape-rail shape-broken" d="M4 12H44M4 36H44" /><path class="shape-curve" d="M6 24h10M32 24h10" /><circle class="shape-curve" cx="24" cy="24" r="4" />`,
    clear: html`<path class="shape-fill" d="M16 3h16l13 13v16L32 45H16L3 32V16z" /><path class="shape-inverse" d="M24 11v17M24 34v4" />`,
    working: html`${rails}<path class="shape-fill" d="M10 21h6v6h-6zM21 21h6v6h-6zM32 21h6v6h-6z" />`,
  };
  return html`<svg class="outcome-shape" viewBox="0 0 48 48" aria-hidden="true">${shapes[word] ?? shapes.working}</svg>`;
}

/** @type {Record<string, string>} */
export const WORDS = { within: 'WITHIN', close: 'CLOSE', over: 'OVER', cannot: 'NOT JUDGED', clear: 'CLEAR AREA', working: 'WAIT' };

/** @param {Controller} controller @returns {{word:string, lines:string[], typing:boolean}} */
export function barOf(controller) {
  const { current, typing, solver, answer } = controller.state;
  const waiting = typing.value.length > 0;
  const result = current.value;
  const said = result?.outcome ?? null;
  if (waiting) return { word: said?.word ?? 'working', typing: true, lines: ['typing: result is for the earlier values', said?.title ?? 'no result yet', 'Press Next to enter what is typed.'] };
  if (said) return { word: said.word, lines: said.lines, typing: false };
  if (result?.refusal) return { word: 'cannot', typing: false, lines: ['cannot be judged', result.refusal.message, result.refusal.internal ? 'The solver stopped on this check. Everything is stored.' : 'Tap to go there.'] };
  if (solver.value.state === 'failed') return { word: 'cannot', typing: false, lines: ['cannot be judged: the solver did not start', 'Everything entered is stored.', 'Tap for “Try again”.'] };
  if (solver.value.state === 'starting') return { word: 'working', typing: false, lines: ['not yet judged: the solver is starting', 'What you enter is stored.', solver.value.label] };
  return { word: 'working', typing: false, lines: ['working out the newest values', answer.value ? 'The earlier result no longer stands.' : '', ''] };
}

/** The word under the shape is drawn by the style sheet: the name of the button says it already. @param {{controller: Controller}} props */
export function OutcomeBar({ controller }) {
  const { word, lines, typing } = barOf(controller);
  const go = () => controller.go(controller.state.current.value?.refusal?.field || '/result');
  return html`<button class=${`outcome-bar is-${word} ${typing ? 'is-typing' : ''}`} aria-label=${`Outcome: ${lines.filter(Boolean).map((line) => line.replace(/\.$/, '')).join('. ')}. Open the result`} onClick=${go}>
    <span class="outcome-mark" aria-hidden="true"><span class="outcome-picture"><${OutcomeShape} word=${word} /></span><b class="outcome-word" data-word=${WORDS[word] ?? ''}></b></span>
    <span class="outcome-lines" role="status" aria-live="polite"><span class="outcome-first">${lines[0] ?? ''}</span>${' '}
      <span class="outcome-rest"><span>${lines[1] ?? ''}</span>${' '}<span class="outcome-now">${lines[2] ?? ''}</span></span></span>
  </button>`;
}
