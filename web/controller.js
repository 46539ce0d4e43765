// Who knows all parts? The one controller: it starts them, moves between screens and hands their answers to the state.
import { missingFeatures } from './boot.js';
import { isoWithZone } from './changes.js';
import { createChecking } from './checking.js';
import { createEditing } from './editing.js';
import { createLibrary } from './library.js';
import { startOffline } from './offline.js';
import { createSharing, messageOf } from './sharing.js';
import { startSolver } from './solver-client.js';
import { createState, DEFAULTS } from './state.js';
import { fieldAfter, fieldOf, stationOf } from './stations.js';
import { openStorage } from './storage.js';
import { createTabLock } from './tab-lock.js';

/** @typedef {import('./state.js').Screen} Screen */
/** @typedef {import('./types.js').Field} Field */

/** A result lapses with time, so it is asked for again now and then. */
const LOOK_AGAIN_MS = 240_000;
/** As long as a finger takes to notice that the page has led on by itself. */
const LED_ON_MS = 350;

export function startController() {
  const state = createState();
  /** @type {any} */ let storage = null;
  /** @type {any} */ let solver = null;
  /** @type {any} */ let offline = null;
  const ask = (/** @type {string} */ call, /** @type {any} */ payload) => (solver ? solver.ask(call, payload) : Promise.reject(new Error('The solver has not started.')));
  const fail = (/** @type {unknown} */ error) => { console.error(error); state.failure.value = messageOf(error); };
  const checking = createChecking({ ask, now: () => isoWithZone(new Date()),
    onAnswer: (seq, stage, result) => { state.answer.value = { seq, stage, result }; },
    onError: (seq, error) => { state.answer.value = { seq, stage: 'error', result: refused(error) }; } });
  const check = () => { const entry = state.entry.value; if (entry && state.solver.value.state === 'ready') checking.want(entry.seq, entry.record); };
  const checkAgain = () => { const entry = state.entry.value; if (entry && state.current.value && document.visibilityState === 'visible') checking.again(entry.seq, entry.record); };
  const editing = createEditing({ state, storage: () => storage, ask, check, fail });
  const library = createLibrary({ state, storage: () => storage, ask, savePreferences });
  const sharing = createSharing({ state, ask, library });
  const lock = createTabLock(() => { state.readOnly.value = 'This check was opened in another tab. It can be read here; that tab writes.'; });

  /** @param {Screen} screen @param {{replace?:boolean}} [how] */
  function show(screen, how = {}) {
    history[how.replace ? 'replaceState' : 'pushState']({ screen }, '');
    applyScreen(screen);
  }

  /** @param {Screen} screen */
  function applyScreen(screen) {
    state.padUp.value = false; state.meansFor.value = null; state.focus.value = null;
    /** @type {HTMLElement|null} */ (document.activeElement)?.blur(); // stores what is being written
    if (screen.name === 'list') { closeCheck(); void library.refresh().catch(fail); }
    state.screen.value = screen;
    if ((screen.name === 'check' || screen.name === 'share') && screen.id && state.entry.value?.id !== screen.id) void openCheck(screen.id).catch(fail);
    if (screen.name === 'opened') void sharing.openFragment();
  }

  function closeCheck() {
    checking.forget(); lock.release();
    state.entry.value = null; state.answer.value = null; state.drafts.value = {}; state.undo.value = []; state.readOnly.value = '';
  }

  /** @param {string} id */
  async function openCheck(id) {
    closeCheck();
    await editing.settled();
    const [entry, drafts] = await Promise.all([storage.check(id), storage.drafts(id)]);
    if (!entry) { state.notice.value = { text: 'That check is not stored here.' }; show({ name: 'list' }, { replace: true }); return; }
    state.drafts.value = drafts;
    state.entry.value = entry;
    void lock.take(id);
    check();
  }

  /** @param {any} patch */
  async function savePreferences(patch) {
    state.preferences.value = { ...state.preferences.value, ...patch };
    await storage.keep('preferences', state.preferences.value);
  }

  /** Which station stands open; its path is kept so that a reload comes back to it. @param {string} path */
  function go(path) {
    const screen = state.screen.value;
    const station = stationOf(state.walk.value, path);
    state.padUp.value = false; state.meansFor.value = null; state.padPart.value = 'text';
    const next = { ...screen, name: /** @type {const} */ ('check'), at: station.path };
    history.replaceState({ screen: next }, '');
    state.screen.value = next;
    const field = path === station.path ? undefined : fieldOf(station, path);
    state.focus.value = null;
    if (field) state.focus.value = field.path;
  }

  let led = { to: '', at: -Infinity };

  /** A finger that comes down just as Next leads on meant the thing before: it does not lead on twice. @param {number} step -1 or 1 */
  function walk(step) {
    if (led.to !== state.screen.value.at || performance.now() - led.at > LED_ON_MS) stepTo(step);
  }

  /** @param {number} step */
  function stepTo(step) {
    const all = state.walk.value;
    const at = all.findIndex((one) => one.path === stationOf(all, state.screen.value.at ?? '/place').path);
    const next = all[at + step];
    if (next) go(next.path);
  }

  /** Next: enter what is typed, then ask how it is known, then lead on. @param {Field} field */
  async function next(field) {
    const draft = editing.draftNow(field);
    if (state.padUp.value && draft.means === 'stated' && state.padPart.value !== 'high' && draft.text.trim()) { state.padPart.value = state.padPart.value === 'text' ? 'low' : 'high'; return; }
    if (!await editing.enter(field)) return;
    if (state.padUp.value && field.means && draft.text.trim() && !draft.means && state.meansFor.value !== field.path) { state.meansFor.value = field.path; return; }
    leadOn(field);
  }

  /** @param {Field} field */
  function leadOn(field) {
    state.meansFor.value = null;
    state.padPart.value = 'text';
    const station = stationOf(state.walk.value, field.path);
    const following = fieldAfter(station, field.path);
    if (following) { state.focus.value = null; state.focus.value = following.path; if (following.kind !== 'number') state.padUp.value = false; return; }
    state.padUp.value = false;
    if (!state.screen.value.all && !isWide()) { stepTo(1); led = { to: state.screen.value.at ?? '', at: performance.now() }; return; }
    const after = state.walk.value[state.walk.value.indexOf(station) + 1];
    const first = after && fieldAfter(after, '');
    state.focus.value = null;
    if (first) state.focus.value = first.path;
  }

  /** @param {Field} field @param {string} means */
  async function means(field, means) {
    await editing.chooseMeans(field, means);
    if (state.meansFor.value === field.path && means !== 'stated') leadOn(field); else { state.meansFor.value = null; if (means === 'stated') state.padPart.value = 'low'; }
  }

  /** @param {Field} field */
  async function act(field) { if (await editing.act(field) && field.go) go(field.go); }

  const start = () => {
    solver = startSolver({
      onProgress: (/** @type {any} */ news) => { if (state.solver.value.state !== 'ready') state.solver.value = { state: 'starting', label: news.label ?? '', loaded: news.loaded ?? 0, total: news.total ?? 0, message: '' }; },
      onReady: (/** @type {any} */ news) => { void ready(news.hello ?? news).catch(solverFailed); },
      onFailed: solverFailed,
    });
  };

  /** @param {any} problem */
  function solverFailed(problem) {
    state.solver.value = { ...state.solver.value, state: 'failed', message: messageOf(problem) };
    if (state.opened.value?.state === 'reading') state.opened.value = { state: 'waiting' };
  }

  /** @param {any} hello */
  async function ready(hello) {
    await ask('self_check', {});
    state.words.value = hello;
    state.solver.value = { state: 'ready', label: '', loaded: 0, total: 0, message: '' };
    check();
    if (state.screen.value.name === 'opened') void sharing.openFragment();
    await storage?.keep('hello', hello);
  }

  function retrySolver() {
    state.solver.value = { state: 'starting', label: 'The solver is starting again.', loaded: 0, total: 0, message: '' };
    solver.restart();
  }

  async function begin() {
    storage = await openStorage().catch((error) => { throw new Error(`This browser does not let the page store anything (a private window may be why): ${messageOf(error)}.`); });
    state.preferences.value = { ...DEFAULTS, ...await storage.kept('preferences') };
    const hello = await storage.kept('hello');
    if (hello && state.solver.value.state !== 'ready') state.words.value = hello;
    document.addEventListener('visibilitychange', checkAgain);
    setInterval(checkAgain, LOOK_AGAIN_MS);
    window.addEventListener('popstate', (event) => {
      if (state.clearing.value) { history.pushState({ screen: state.screen.value }, ''); return; } // that page is left by a name, not by Back
      applyScreen(event.state?.screen ?? firstScreen());
    });
    window.addEventListener('hashchange', () => { if (sharing.fragment()) applyScreen({ name: 'opened' }); });
    await library.refresh();
    const first = history.state?.screen ?? firstScreen();
    history.replaceState({ screen: first }, '');
    applyScreen(first);
    state.persisted.value = await navigator.storage?.persisted?.() ?? null;
  }
  const firstScreen = () => /** @type {Screen} */ (sharing.fragment() ? { name: 'opened' } : { name: 'list' });

  /** Browsers ask best when something worth keeping was just made. */
  async function persist() { state.persisted.value = await navigator.storage?.persist?.().catch(() => false) ?? null; }

  async function create() { const id = await library.create(); show({ name: 'check', id, at: '/place' }); void persist(); }

  window.addEventListener('error', (event) => { fail(event.error ?? event.message); });
  window.addEventListener('unhandledrejection', (event) => { fail(event.reason); });
  state.missing.value = missingFeatures();
  void begin().catch(fail);
  start();
  offline = startOffline({ onState: (/** @type {any} */ news) => { state.offline.value = { done: 0, total: 0, message: '', ...news }; } });

  return { state, editing, library, sharing, show, go, walk, next, means, act, create, persist, savePreferences, retrySolver, fail, photo: (/** @type {string} */ hash) => storage.photo(hash),
    back: () => show({ name: 'list' }), writeHere: () => { const id = state.entry.value?.id; if (id) void openCheck(id).catch(fail); },
    applyUpdate: () => offline.applyUpdate(), checkOffline: () => offline.checkAgain() };
}
/** @typedef {ReturnType<typeof startController>} Controller */

/** The same limit as in the style sheets: fields at the left, drawings at the right. */
export const isWide = () => matchMedia('(min-width: 1000px)').matches;

/** A check that Python refused as a whole. @param {any} error */
function refused(error) {
  const message = messageOf(error);
  return { refusal: { message, field: error.field ?? '', internal: error.kind !== 'input' }, errors: error.field ? [{ field: error.field, code: error.code, message }] : [], readings: {} };
}
