// How does pysolver's drawing get onto the page, and what does a touch in it select? The only place where markup is inserted: it comes
// from pysolver, which escapes every name in it.
import { useEffect, useLayoutEffect, useRef, useState } from '../vendor/preact-hooks.js';
import { within } from '../picking.js';
import { html } from './html.js';

/** @typedef {{path:string, label:string, x:number, y:number}} Pick */

/** A drawing a little too wide is made smaller; a much wider one is paged, so that its figures stay readable. */
const MOST_SHRINK = 1.3;

/**
 * @param {{svg:string, label:string, picks?:Pick[], selected?:string, onPick?:(path:string)=>void, strip?:boolean, natural?:boolean}} props
 * `natural`: one drawing unit is one pixel at least, and long beams are paged by buttons
 */
export function Drawing({ svg, label, picks = [], selected, onPick, strip, natural }) {
  const frame = useRef(/** @type {HTMLDivElement|null} */ (null));
  const sheet = useRef(/** @type {HTMLDivElement|null} */ (null));
  const [box, setBox] = useState('0 0 100 100');
  const [several, setSeveral] = useState(/** @type {Pick[]} */ ([]));
  const [long, setLong] = useState(false);
  useLayoutEffect(() => {
    const host = sheet.current;
    if (!host) return;
    host.innerHTML = svg;
    const drawn = host.querySelector('svg');
    if (!drawn) return;
    if (!drawn.hasAttribute('aria-labelledby')) { drawn.setAttribute('role', 'img'); drawn.setAttribute('aria-label', label); }
    setBox(drawn.getAttribute('viewBox') ?? '0 0 100 100');
    const { width, height } = drawn.viewBox.baseVal;
    const room = frame.current?.clientWidth ?? width;
    host.parentElement?.style.setProperty('--drawn-width', width > room * MOST_SHRINK ? `${width}px` : '100%');
    host.parentElement?.style.setProperty('--drawn-shape', `${width} / ${height}`);
  }, [svg, label]);
  useEffect(() => { const el = frame.current; setLong(Boolean(el && el.scrollWidth > el.clientWidth + 2)); }, [svg, strip, box]);
  const chosen = picks.find((pick) => pick.path === selected);
  useEffect(() => { bringIntoView(frame.current, sheet.current, chosen); }, [selected, box, svg, strip, long]);

  const touch = (/** @type {MouseEvent} */ event) => {
    const drawn = sheet.current?.querySelector('svg');
    const matrix = drawn?.getScreenCTM();
    if (!onPick || !matrix) return;
    const points = picks.map((pick) => ({ pick, x: matrix.a * pick.x + matrix.e, y: matrix.d * pick.y + matrix.f }));
    const near = within(points, event.clientX, event.clientY).map((point) => point.pick);
    const [only] = near;
    if (only && near.length === 1) { setSeveral([]); onPick(only.path); } else setSeveral(near);
  };
  const page = (/** @type {number} */ way) => frame.current?.scrollBy({ left: way * frame.current.clientWidth * 0.8 });
  return html`<div class=${['drawing', strip ? 'drawing-strip' : '', natural ? 'drawing-natural' : '', long && !strip ? 'drawing-long' : ''].join(' ').trim()}>
    <div class="drawing-frame" ref=${frame} onClick=${touch}>
      <div class="drawing-layers"><div ref=${sheet} class="drawing-sheet"></div>
        ${chosen && html`<svg class="drawing-mark" viewBox=${box} aria-hidden="true"><circle cx=${chosen.x} cy=${chosen.y} r="17" /></svg>`}</div>
    </div>
    ${long && !strip && html`<button class="key page-key page-left" aria-label=${`${label}: page left`} onClick=${() => page(-1)}>‹</button><button class="key page-key page-right" aria-label=${`${label}: page right`} onClick=${() => page(1)}>›</button>`}
    ${several.length > 1 && html`<div class="several" role="group" aria-label="Which one is meant"><p>Which one?</p>
      ${several.map((pick) => html`<button class="key" key=${pick.path} onClick=${() => { setSeveral([]); onPick?.(pick.path); }}>${pick.label}</button>`)}
      <button class="key" onClick=${() => setSeveral([])}>None of these</button></div>`}
  </div>`;
}

/** @param {HTMLElement|null} frame @param {HTMLElement|null} sheet @param {Pick|undefined} chosen */
function bringIntoView(frame, sheet, chosen) {
  const matrix = sheet?.querySelector('svg')?.getScreenCTM();
  if (!frame || !matrix || !chosen) return;
  const x = matrix.a * chosen.x + matrix.e - frame.getBoundingClientRect().left;
  if (x < 40 || x > frame.clientWidth - 40) frame.scrollLeft += x - frame.clientWidth / 2;
}
