// What does one see while a check is open: picture, walk, questions, outcome?
import { useEffect, useRef, useState } from '../vendor/preact-hooks.js';
import { stationOf } from '../stations.js';
import { OutcomeBar } from './bar.js';
import { Drawing } from './drawing.js';
import { html } from './html.js';
import { endsOf, titleOf } from './list.js';
import { usesPad } from './number-field.js';
import { PadPanel } from './pad.js';
import { ResultView } from './result.js';
import { SolverStanding } from './standing.js';
import { StationFields } from './station.js';

/** @typedef {import('../controller.js').Controller} Controller */
/** @typedef {import('../types.js').Station} Station */

const WIDE = '(min-width: 1000px)';

function useWide() {
  const [wide, setWide] = useState(matchMedia(WIDE).matches);
  useEffect(() => {
    const query = matchMedia(WIDE);
    const look = () => setWide(query.matches);
    query.addEventListener('change', look);
    return () => query.removeEventListener('change', look);
  }, []);
  return wide;
}

/** @param {{controller: Controller}} props */
export function CheckScreen({ controller }) {
  const { state } = controller;
  const wide = useWide();
  if (!state.entry.value) return html`<main class="page"><p class="quiet">Opening the check.</p></main>`;
  const station = stationOf(state.walk.value, state.screen.value.at ?? '/place');
  const field = station.fields.find((one) => one.path === state.focus.value && one.kind === 'number')
    ?? state.walk.value.flatMap((one) => one.fields).find((one) => one.path === state.focus.value && one.kind === 'number');
  const pad = state.padUp.value && field && usesPad(controller) ? field : null;
  if (wide) return html`<${WideCheck} controller=${controller} station=${station} pad=${pad} />`;
  return html`<div class=${`check ${pad ? 'with-pad' : ''} ${pad && state.meansFor.value ? 'asks-means' : ''} ${station.path === '/result' ? 'at-result' : ''}`}>
    ${!pad && html`<${TopLine} controller=${controller} />`}
    ${(pad || !state.screen.value.all) && html`<${WorkingDrawing} controller=${controller} station=${station} strip=${Boolean(pad) || station.path === '/result'} pickable=${!pad} />`}
    ${pad ? html`<main class="pad-main"><h1 class="unseen">${titleOf(state.entry.value)}</h1><${PadPanel} key=${pad.path} controller=${controller} field=${pad} /></main>`
      : state.screen.value.all ? html`<${AllFields} controller=${controller} station=${station} withResult />`
        : html`<${Walk} controller=${controller} station=${station} /><${OneStation} key=${station.path} controller=${controller} station=${station} />`}
    <${OutcomeBar} controller=${controller} />
  </div>`;
}

/** @param {{controller: Controller, station: Station, pad: any}} props */
function WideCheck({ controller, station, pad }) {
  return html`<div class="check check-wide">
    <${TopLine} controller=${controller} wide />
    <div class="columns">
      <div class="column column-fields"><${AllFields} controller=${controller} station=${station} />${pad && html`<${PadPanel} key=${pad.path} controller=${controller} field=${pad} />`}</div>
      <main class="column column-drawings"><${WorkingDrawing} controller=${controller} station=${station} />
        <section class="station" id="result" aria-label="Result"><${ResultView} controller=${controller} /></section></main>
    </div>
    <${OutcomeBar} controller=${controller} />
  </div>`;
}

/** @param {{controller: Controller, wide?: boolean}} props */
function TopLine({ controller, wide }) {
  const { state } = controller;
  const entry = /** @type {import('../types.js').Entry} */ (state.entry.value);
  const last = state.undo.value[state.undo.value.length - 1];
  const all = state.screen.value.all;
  return html`<header class="top-line">
    <button class="key" aria-label="Back to the list" onClick=${controller.back}>‹ List</button>
    <div class="top-title"><h1>${titleOf(entry)}</h1><span>${endsOf(entry.record)}</span></div>
    ${last && html`<button class="key" aria-label=${`Undo: ${last.label}`} onClick=${() => { void controller.editing.undo(); }}>Undo</button>`}
    ${wide ? html`<button class="key" onClick=${() => controller.show({ name: 'share', id: entry.id })}>Share</button>`
      : html`<button class="key" aria-pressed=${Boolean(all)} aria-label="All fields" onClick=${() => controller.show({ ...state.screen.value, all: !all }, { replace: true })}>All</button>`}
  </header>
  ${state.readOnly.value && html`<p class="standing" role="alert">${state.readOnly.value} <button class="key" onClick=${controller.writeHere}>Write here</button></p>`}`;
}

/** @param {{controller: Controller, station: Station, strip?: boolean, pickable?: boolean}} props */
function WorkingDrawing({ controller, station, strip, pickable = true }) {
  const { current, answer, record } = controller.state;
  const drawn = current.value?.drawings?.working ?? answer.value?.result?.drawings?.working;
  const picks = current.value?.picks ?? answer.value?.result?.picks ?? [];
  if (!drawn) {
    const names = (record.value?.supports ?? []).map((/** @type {any} */ one) => one.name || '?').join(' ——— ');
    return html`<div class=${strip ? 'drawing drawing-strip drawing-waits' : 'drawing drawing-waits'}><p aria-label="Supports from the left">${names}</p>${!strip && html`<small>The picture is drawn once the solver has read the check.</small>`}</div>`;
  }
  return html`<${Drawing} svg=${drawn} label="Working drawing of the beam" picks=${picks} selected=${selectedPick(picks, controller, station)} strip=${strip} natural
    onPick=${pickable ? controller.go : undefined} />`;
}

/** @param {any[]} picks @param {Controller} controller @param {Station} station */
function selectedPick(picks, controller, station) {
  const focus = controller.state.focus.value ?? '';
  const found = picks.find((pick) => focus.startsWith(`${pick.path}/`) || focus === pick.path) ?? picks.find((pick) => pick.path === station.path)
    ?? picks.find((pick) => pick.path.startsWith(`${station.path}/`));
  return found?.path;
}

/**
 * Keys are new with each station: when Next leads on just as a finger comes down, the finger's key is gone and does nothing,
 * rather than leading on once more.
 * @param {{controller: Controller, station: Station}} props
 */
function Walk({ controller, station }) {
  const all = controller.state.walk.value;
  const at = all.indexOf(station);
  const before = all[at - 1];
  const after = all[at + 1];
  return html`<nav class="walk" aria-label="Walk along the beam">
    <button key=${`before ${station.path}`} class="walk-key" disabled=${!before} aria-label=${before ? `Previous thing: ${before.title}` : 'Previous thing'} onClick=${() => controller.walk(-1)}>‹</button>
    <label class="walk-name"><b aria-hidden="true">${station.title}</b><small aria-hidden="true">${at + 1} of ${all.length}</small>
      <select aria-label="Go to" value=${station.path} onChange=${(/** @type {any} */ event) => controller.go(event.currentTarget.value)}>${all.map((one) => html`<option key=${one.path} value=${one.path}>${one.title}</option>`)}</select></label>
    <button key=${`after ${station.path}`} class="walk-key" disabled=${!after} aria-label=${after ? `Next thing: ${after.title}` : 'Next thing'} onClick=${() => controller.walk(1)}>›</button>
  </nav>`;
}

/**
 * Keys are new with each station: when Next leads on just as a finger comes down, the finger's key is gone and does nothing,
 * rather than leading on once more.
 * @param {{controller: Controller, station: Station}} props
 */
function OneStation({ controller, station }) {
  const after = controller.state.walk.value[controller.state.walk.value.indexOf(station) + 1];
  return html`<main class="station one-station" aria-label=${station.title}>${station.path !== '/result' && html`<h2 class="unseen">${station.title}</h2>`}<${SolverStanding} controller=${controller} />
    ${station.path === '/result' ? html`<${ResultView} controller=${controller} />`
      : html`<${StationFields} controller=${controller} station=${station} />`}
    ${after && html`<button key=${station.path} class="key key-on" aria-label=${`On to ${after.title}`} onClick=${() => controller.walk(1)}>On to ${after.title} ›</button>`}</main>`;
}

/** The same questions as an ordinary list. @param {{controller: Controller, station: Station, withResult?: boolean}} props */
function AllFields({ controller, station, withResult }) {
  const own = useRef(/** @type {HTMLElement|null} */ (null));
  useEffect(() => {
    if (controller.state.focus.value) return;
    const section = document.getElementById(sectionId(station.path));
    if (station.path === '/result') document.getElementById('result')?.scrollIntoView({ block: 'start' });
    else if (station.path !== '/place') section?.scrollIntoView({ block: 'start' });
  }, [station.path]);
  return html`<div class="all-fields" role=${withResult ? 'main' : 'form'} aria-label="All fields" ref=${own}><${SolverStanding} controller=${controller} />
    ${controller.state.walk.value.filter((one) => one.path !== '/result').map((one) => html`<section class="station" key=${one.path} id=${sectionId(one.path)} aria-label=${one.title}>
      <h2>${one.title}</h2><${StationFields} controller=${controller} station=${one} /></section>`)}
    ${withResult && html`<section class="station" id="result" aria-label="Result"><${ResultView} controller=${controller} /></section>`}
  </div>`;
}

/** @param {string} path */
const sectionId = (path) => `s${path.replace(/[^a-zA-Z0-9]/g, '-')}`;
