// How does the page reach the solver without ever waiting for it? This module worker starts Python and answers one request after
// the other. It fetches nothing but the site's own files, all relative to its own address: so when it is started from the
// address cache-only/, which only the service worker can answer, every byte it runs on provably came from the cache.
/// <reference lib="webworker" />

import { BUILD, RUNTIME } from './runtime.js';
import { openBridge, startPython } from './solver-runtime.js';

/** @typedef {import('./messages.js').FromWorker} FromWorker */
/** @typedef {import('./messages.js').Progress} Progress */

const folder = new URL(RUNTIME.folder, import.meta.url).href;
const counted = new Set([RUNTIME.standardLibrary, ...RUNTIME.archives, ...RUNTIME.libraries.map(([file]) => file)]);
const WASM = 'pyodide.asm.wasm';

/** @type {((text: string) => string)|null} */
let handle = null;
/** @type {{id: number, text: string}[]} */
const queue = [];
let loaded = 0;
let total = 0;

/** @param {FromWorker} message */
const tell = (message) => self.postMessage(message);

/** @param {Progress['stage']} stage @param {string} label */
function progress(stage, label) {
  const bytes = stage === 'fetch';
  tell({ type: 'progress', stage, label, loaded: bytes ? loaded : 0, total: bytes ? total : 0 });
}

/** The bytes of a file, counted as they come in. @param {string} file @returns {Promise<Uint8Array>} */
async function getFile(file) {
  const answer = await fetch(folder + file);
  if (!answer.ok || !answer.body) throw new Error(`${file} could not be fetched (${answer.status})`);
  const content = new Uint8Array(/** @type {number} */ (RUNTIME.sizes[file]));
  let at = 0;
  for (const reader = answer.body.getReader(); ;) {
    const { done, value } = await reader.read();
    if (done) break;
    if (at + value.length > content.length) throw new Error(`${file} is longer than it should be`);
    content.set(value, at);
    at += value.length;
    loaded += value.length;
    progress('fetch', 'Fetching the solver');
  }
  if (at !== content.length) throw new Error(`${file} is shorter than it should be`);
  return content;
}

/** @param {boolean} countBytes */
async function start(countBytes) {
  if (countBytes) counted.add(WASM);
  total = [...counted].reduce((sum, file) => sum + (RUNTIME.sizes[file] ?? 0), 0);
  progress('fetch', 'Fetching the solver');
  // Pyodide fetches its largest file by itself and tells nobody how far it is: on a first visit we fetch it once, counted, and
  // Pyodide then finds it in the browser's HTTP cache. Never done with the service worker in charge: there it costs time and gives nothing.
  if (countBytes) await getFile(WASM);
  const { loadPyodide } = await import(folder + 'pyodide.mjs');
  const labels = { python: 'Starting Python', packages: 'Unpacking the solver' };
  const python = await startPython({
    loadPyodide, folder, runtime: RUNTIME, getFile, onStage: (stage) => progress(stage, labels[stage]),
  });
  python.globals.set('_build', BUILD.build);
  python.runPython('import os; os.environ["ASFOUND_BUILD"] = _build; del os, _build');
  progress('solver', 'Loading the solver');
  handle = openBridge(python);
  tell({ type: 'ready' });
  answerNext();
}

/** Answer one request, then let the messages in that came meanwhile: they may drop what is still waiting. */
function answerNext() {
  const request = handle && queue.shift();
  if (!handle || !request) return;
  try {
    tell({ type: 'answer', id: request.id, text: handle(request.text) });
  } catch (error) { // the bridge answers its own errors as JSON: what comes here is Python itself going down
    handle = null;
    tell({ type: 'failed', code: 'crashed', message: String(error) });
  }
  setTimeout(answerNext);
}

self.onmessage = (event) => {
  const message = /** @type {import('./messages.js').ToWorker} */ (event.data);
  if ('text' in message) {
    queue.push(message);
    if (queue.length === 1) setTimeout(answerNext);
  } else if (message.type === 'drop') {
    const index = queue.findIndex(({ id }) => id === message.id);
    if (index >= 0) queue.splice(index, 1);
  } else {
    start(message.countBytes).catch((error) => tell({ type: 'failed', code: 'start-failed', message: String(error) }));
  }
};
