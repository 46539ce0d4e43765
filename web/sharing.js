// How does a check go to the office as a link, and what happens with a link that comes in?
import { isoWithZone } from './changes.js';
import { wholeRecord } from './shape.js';

/** Links of any version: Python says what it can read. */
export const LINK_START = /^r\d/;

/** @param {{state: import('./state.js').State, ask: (call:string, payload:any) => Promise<any>, library: ReturnType<typeof import('./library.js').createLibrary>}} parts */
export function createSharing({ state, ask, library }) {
  const appUrl = () => location.origin + location.pathname;
  const fragment = () => { const raw = location.hash.slice(1); return LINK_START.test(raw) ? raw : ''; };

  /** Makes the link of the open check. */
  async function makeLink() {
    const record = state.record.value;
    state.shared.value = { state: 'working' };
    try {
      const made = await ask('link', { record, app_url: appUrl(), now: isoWithZone(new Date()) });
      state.shared.value = { state: 'made', ...made, title: record.place.member };
    } catch (error) {
      state.shared.value = { state: 'error', message: messageOf(error) };
    }
  }

  /** Through the phone's own sharing where there is one, else the clipboard. */
  async function send() {
    const { link, title } = state.shared.value;
    if (navigator.share) {
      try { await navigator.share({ title: `Asfound: ${title || 'beam check'}`, url: link }); state.notice.value = { text: 'The link was handed on.' }; } catch (error) {
        if (/** @type {any} */ (error).name !== 'AbortError') await copy();
      }
      return;
    }
    await copy();
  }

  async function copy() {
    try { await navigator.clipboard.writeText(state.shared.value.link); state.notice.value = { text: 'The link is on the clipboard. Paste it into a message.' }; } catch {
      state.notice.value = { text: 'The browser did not allow copying. Select the link below and copy it by hand.' };
    }
  }

  /** Reads the link in the address. The address keeps it until it is stored here. */
  async function openFragment() {
    const text = fragment();
    if (!text) return;
    if (state.solver.value.state !== 'ready') { state.opened.value = { state: 'waiting' }; return; }
    state.opened.value = { state: 'reading' };
    try {
      const answer = await ask('open', { fragment: text, now: isoWithZone(new Date()) });
      if (fragment() !== text) return;
      const record = wholeRecord(answer.record);
      state.opened.value = record ? { ...answer, record, state: 'read' } : { state: 'error', message: 'The link holds no check of Asfound.' };
    } catch (error) {
      state.opened.value = { state: 'error', message: messageOf(error) };
    }
  }

  /** @returns {Promise<string>} id of the copy */
  async function keepOpened() {
    const id = await library.keep(library.asNew(state.opened.value.record), 'copy of a link');
    history.replaceState(history.state, '', location.pathname + location.search);
    return id;
  }

  return { fragment, makeLink, send, copy, openFragment, keepOpened };
}

/** @param {unknown} error */
export const messageOf = (error) => /** @type {any} */ (error)?.userMessage ?? /** @type {any} */ (error)?.message ?? String(error);
