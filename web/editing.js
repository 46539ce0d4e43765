// How does an answer get into the record, and onto the disk before the next one? Typing makes drafts; only Next or a choice enters.
import { afterLook, choiceValue, isoWithZone, prepared } from './changes.js';
import { differs, draftOf, quantityOf } from './drafts.js';
import { photoRefusal, sha256, withoutPhoto, withPhoto } from './photos.js';
import { getAt, isUnder, setAt } from './pointer.js';
import { Conflict } from './storage.js';

/** @typedef {import('./types.js').Field} Field */
/** @typedef {import('./types.js').Draft} Draft */
/** @typedef {{state: import('./state.js').State, storage: () => import('./storage.js').Storage, ask: (call:string, payload:any) => Promise<any>,
 *   check: () => void, fail: (error:unknown) => void}} Parts */

const MAX_UNDO = 50;
const READ_PAUSE_MS = 120;

/** @param {Parts} parts */
export function createEditing({ state, storage, ask, check, fail }) {
  /** @type {Promise<unknown>} every write waits for the one before */ let queue = Promise.resolve();
  let readTimer = 0;

  /** @param {() => Promise<unknown>} work */
  function inTurn(work) {
    const done = queue.then(work);
    queue = done.catch(fail);
    return queue;
  }

  /** @param {(record:any) => any} change @param {string} label @param {{keepDecision?:boolean, undoing?:boolean, merge?:boolean}} [how] `merge`: one undo for a run of letters */
  function commit(change, label, how = {}) {
    const id = state.entry.value?.id;
    if (!id || state.readOnly.value) return Promise.resolve();
    return inTurn(async () => {
      // The check may have been closed since; what was answered in it is stored all the same.
      const entry = state.entry.value?.id === id ? state.entry.value : await storage().check(id);
      if (!entry) return;
      const before = entry.record;
      let after = change(before);
      if (after === before) return;
      if (before.decision && !how.keepDecision) after = { ...after, decision: null };
      const stored = await write({ ...entry, record: { ...after, changed: isoWithZone(new Date()) } });
      if (!stored || state.entry.value?.id !== stored.id) return;
      state.entry.value = stored;
      const last = state.undo.value[state.undo.value.length - 1];
      if (!how.undoing && !(how.merge && last?.label === label)) state.undo.value = [...state.undo.value, { record: before, label }].slice(-MAX_UNDO);
      if (before.decision && !after.decision && !how.undoing) state.notice.value = { text: 'The decision was made for the earlier values: decide again at the result.' };
      check();
    });
  }

  /** @param {import('./types.js').Entry} entry */
  async function write(entry) {
    try { return await storage().putCheck(entry); } catch (error) {
      if (!(error instanceof Conflict)) throw error;
      state.readOnly.value = 'This check was changed in another tab. Nothing from here overwrote it.';
      return null;
    }
  }

  /** @param {string} path @param {Draft|null} draft */
  function setDraft(path, draft) {
    const id = state.entry.value?.id;
    if (!id || state.readOnly.value) return;
    const { [path]: _, ...rest } = state.drafts.value;
    state.drafts.value = draft ? { ...rest, [path]: draft } : rest;
    void inTurn(() => storage().putDraft(id, path, draft));
  }

  /** @param {Field} field */
  function printedUnit(field) {
    const display = state.record.value?.settings.display === 'us' ? 'us' : 'metric';
    return state.words.value.units[display]?.[field.dimension ?? '']?.unit ?? '';
  }

  /** @param {Field} field @returns {Draft} */
  const draftNow = (field) => state.drafts.value[field.path] ?? draftOf(getAt(state.record.value, field.path), printedUnit(field));

  /** Move a distance by a step; Python adds. @param {Field} field @param {string} by */
  async function step(field, by) {
    const { text, unit } = draftNow(field);
    const system = state.record.value?.settings.display === 'us' ? 'us' : 'metric';
    try { type(field, { text: (await ask('step', { text, unit: unit || printedUnit(field), by, system })).text }); } catch (error) {
      state.reading.value = { path: field.path, text, error: /** @type {any} */ (error).userMessage ?? String(error) };
    }
  }

  /** @param {Field} field @param {Partial<Draft>} patch */
  function type(field, patch) {
    setDraft(field.path, { ...draftNow(field), ...patch });
    if (patch.text !== undefined) readSoon(field);
  }

  /** @param {Field} field */
  function readSoon(field) {
    clearTimeout(readTimer);
    readTimer = window.setTimeout(() => { void read(field); }, READ_PAUSE_MS);
  }

  /** What Python makes of the text, shown under the field. @param {Field} field @returns {Promise<boolean>} false if it can't be read */
  async function read(field) {
    const { text, unit } = draftNow(field);
    const path = field.path;
    if (text.trim() === '' || state.solver.value.state !== 'ready') { state.reading.value = null; return true; }
    try {
      const { shown, also } = await ask('read', { dimension: field.dimension, text, unit, system: state.record.value?.settings.display, sag: Boolean(field.sag) });
      if (draftNow(field).text === text) state.reading.value = { path, text, shown, also };
      return true;
    } catch (error) {
      const problem = /** @type {any} */ (error);
      if (problem.kind !== 'input') return true;
      if (draftNow(field).text === text) state.reading.value = { path, text, error: problem.userMessage ?? problem.message };
      return false;
    }
  }

  /** Next: the draft becomes the record's number, unless Python can't read it. @param {Field} field @returns {Promise<boolean>} */
  async function enter(field) {
    const draft = state.drafts.value[field.path];
    if (!draft) return true;
    if (!differs(draft, getAt(state.record.value, field.path))) { setDraft(field.path, null); return true; }
    clearTimeout(readTimer);
    if (!await read(field)) return false;
    await commit((record) => setAt(prepared(record, field.path), field.path, quantityOf(draft)), field.name);
    const entered = getAt(state.record.value, field.path);
    if (!differs(state.drafts.value[field.path], entered)) setDraft(field.path, null);
    return true;
  }

  /** @param {Field} field @param {string} means */
  function chooseMeans(field, means) {
    const entered = getAt(state.record.value, field.path);
    const draft = draftNow(field);
    if (!entered || differs(state.drafts.value[field.path], entered) || means === 'stated') { setDraft(field.path, { ...draft, means }); return Promise.resolve(); }
    const { low, high, ...rest } = entered;
    return commit((record) => setAt(record, field.path, { ...rest, means }), `${field.name}, how known`);
  }

  /** @param {Field} field @param {string} id */
  function choose(field, id) {
    const value = choiceValue(field.path, id, field.yesNo);
    return answer(field, value);
  }

  /** @param {Field} field @param {any} value */
  function answer(field, value) {
    const look = isUnder(field.path, '/condition/distress') || field.path === '/condition/void/answer';
    return commit((record) => {
      if (getAt(record, field.path) === value) return record;
      const next = setAt(prepared(record, field.path), field.path, value);
      return look ? afterLook(next, value, isoWithZone(new Date())) : next;
    }, field.name, { merge: field.kind === 'text' || field.kind === 'long' });
  }

  /** @param {Field} field @param {string} id @param {boolean} on */
  function mark(field, id, on) {
    const marked = getAt(state.record.value, field.path) ?? [];
    return answer(field, on ? [...marked, id] : marked.filter((/** @type {string} */ one) => one !== id));
  }

  /** Adding or removing moves what stands at a path, so nothing may be half typed then. @param {Field} field */
  async function act(field) {
    const waiting = state.typing.value[0];
    if (waiting && field.removes) { state.notice.value = { text: 'Something is typed and not entered yet. Enter or clear it first, then remove.' }; return false; }
    await commit(/** @type {any} */ (field.change), field.label);
    return true;
  }

  function undo() {
    const last = state.undo.value[state.undo.value.length - 1];
    if (!last) return Promise.resolve();
    state.undo.value = state.undo.value.slice(0, -1);
    return commit(() => last.record, `Undo ${last.label}`, { undoing: true, keepDecision: true });
  }

  /** @param {File} file @param {string} load id, '' for the whole check */
  async function addPhoto(file, load) {
    const refusal = photoRefusal(file);
    if (refusal) { state.notice.value = { text: refusal }; return; }
    const bytes = await file.arrayBuffer();
    const hash = await sha256(bytes);
    await inTurn(() => storage().putPhoto(hash, new Blob([bytes], { type: file.type })));
    const taken = file.lastModified ? isoWithZone(new Date(file.lastModified)) : '';
    await commit((record) => withPhoto(record, { hash, name: file.name.slice(0, 200), type: file.type, bytes: file.size, load: load || null, taken }), 'Photo');
  }

  /** @param {string} hash @param {string} load */
  const removePhoto = (hash, load) => commit((record) => {
    const at = record.photos.findIndex((/** @type {any} */ one) => one.hash === hash && (one.load ?? '') === load);
    return at < 0 ? record : withoutPhoto(record, at);
  }, 'Photo removed');

  /** @param {string} choice @param {string} name */
  const decide = (choice, name) => commit((record) => ({ ...record, decision: { choice, name, time: isoWithZone(new Date()) } }), 'Decision', { keepDecision: true });
  /** @param {string} name who was told to clear the area */
  const told = (name) => commit((record) => setAt(record, '/condition/told', { name, time: isoWithZone(new Date()) }), 'Who was told', { keepDecision: true });

  return { commit, setDraft, type, step, read, enter, choose, chooseMeans, answer, mark, act, undo, addPhoto, removePhoto, decide, told, printedUnit, draftNow, settled: () => queue };
}
/** @typedef {ReturnType<typeof createEditing>} Editing */
