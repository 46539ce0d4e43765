// How does the page ask the solver? It starts the worker, watches that it gets on, and turns requests and answers into promises.

/** @typedef {import('./messages.js').Progress} Progress */
/** @typedef {import('./messages.js').BridgeAnswer} BridgeAnswer */
/** @typedef {import('./messages.js').FromWorker} FromWorker */

/** A start that shows no sign of life for this long is reported. A blocked WebAssembly makes Pyodide's loader wait for ever
 * without an error; a slow phone starts Python in well under this. */
export const STALLED_AFTER_MS = 30_000;

/** What `ask` rejects with. */
export class SolverError extends Error {
  /** @param {'input'|'internal'|'start'|'dropped'} kind @param {string} code @param {string|null} field @param {string} message */
  constructor(kind, code, field, message) {
    super(message);
    this.name = 'SolverError';
    this.kind = kind;
    this.code = code;
    this.field = field;
    /** The sentence to show. */
    this.userMessage = message;
  }
}

/**
 * @typedef {object} Solver
 * @property {(call: string, payload?: object, options?: {replaces?: string}) => Promise<any>} ask  resolves with the result or
 *   rejects with a SolverError. With `replaces`, an earlier request under the same word that is not yet answered is dropped: its
 *   promise rejects with kind 'dropped', and its answer, should it still come, is ignored.
 * @property {() => void} restart  stop the worker and start afresh; requests that are not yet answered are asked again
 */

/** @typedef {{text: string, replaces: string|undefined, resolve: (result: any) => void, reject: (error: SolverError) => void}} Pending */

/**
 * Start the solver in its worker.
 * @param {object} events
 * @param {(progress: Progress) => void} [events.onProgress]
 * @param {(about: {hello: any}) => void} [events.onReady]  after each start; `hello` is the result of the call 'hello'
 * @param {(problem: {code: string, message: string}) => void} [events.onFailed]  code 'stalled' (it may still come), 'start-failed',
 *   'no-worker' or 'crashed'; all else on the page keeps working, and `restart` may be offered
 * @param {{address?: URL, stalledAfter?: number, countBytes?: boolean}} [options]  for tests and for the check without network
 * @returns {Solver & {stop: () => void}}
 */
export function startSolver({ onProgress, onReady, onFailed }, options = {}) {
  const address = options.address ?? new URL('./solver-worker.js', import.meta.url);
  const stalledAfter = options.stalledAfter ?? STALLED_AFTER_MS;
  /** @type {Map<number, Pending>} */
  const pending = new Map();
  /** @type {Worker|null} */
  let worker = null;
  /** @type {SolverError|null} */
  let down = null;
  let ready = false;
  let lastId = 0;
  /** @type {ReturnType<typeof setTimeout>|undefined} */
  let watchdog;

  function watch() {
    clearTimeout(watchdog);
    watchdog = setTimeout(() => onFailed?.({
      code: 'stalled',
      message: `The solver has shown no progress for ${Math.round(stalledAfter / 1000)} seconds. Wait, or try again. Entries and photos are kept.`,
    }), stalledAfter);
  }

  /** @param {string} code @param {string} message @param {'start'|'internal'} kind */
  function fail(code, message, kind) {
    clearTimeout(watchdog);
    stop();
    down = new SolverError(kind, code, null, message);
    for (const { reject } of pending.values()) reject(down);
    pending.clear();
    onFailed?.({ code, message });
  }

  function stop() {
    clearTimeout(watchdog);
    worker?.terminate();
    worker = null;
    ready = false;
  }

  /** @param {number} id */
  const send = (id) => worker?.postMessage({ id, text: /** @type {Pending} */ (pending.get(id)).text });

  function greet() {
    clearTimeout(watchdog);
    ready = true;
    ask('hello').then((hello) => onReady?.({ hello }), (error) => {
      if (error.code !== 'crashed') fail('start-failed', `The solver started but does not answer: ${error.message} Try again.`, 'start');
    });
    for (const id of pending.keys()) if (id !== lastId) send(id);
  }

  /** @param {number} id @param {string} text */
  function settle(id, text) {
    const waiting = pending.get(id);
    if (!waiting) return; // dropped meanwhile
    pending.delete(id);
    const answer = /** @type {BridgeAnswer} */ (JSON.parse(text));
    if (answer.ok) return waiting.resolve(answer.result);
    const { kind, code, field, message } = answer.error;
    waiting.reject(new SolverError(kind, code, field, message));
  }

  /** @param {FromWorker} message */
  function receive(message) {
    if (message.type === 'answer') settle(message.id, message.text);
    else if (message.type === 'ready') greet();
    else if (message.type === 'progress') {
      watch();
      onProgress?.({ stage: message.stage, label: message.label, loaded: message.loaded, total: message.total });
    } else if (message.code === 'crashed') {
      fail('crashed', `The solver stopped (${message.message}). Try again. Entries and photos are kept.`, 'internal');
    } else fail('start-failed', `The solver could not start (${message.message}). Try again. Entries and photos are kept.`, 'start');
  }

  function launch() {
    down = null;
    try {
      worker = new Worker(address, { type: 'module' });
    } catch (error) {
      return fail('no-worker', `This browser can't start the solver (${error}). Use a newer one.`, 'start');
    }
    const started = worker;
    started.addEventListener('message', ({ data }) => { if (worker === started) receive(data); });
    started.addEventListener('error', (event) => {
      event.preventDefault();
      if (worker === started) fail('start-failed', `The solver could not be fetched or run (${event.message || 'no reason given'}). Try again.`, 'start');
    });
    watch();
    started.postMessage({ type: 'start', countBytes: options.countBytes ?? !navigator.serviceWorker?.controller });
  }

  /** @param {string} word */
  function drop(word) {
    for (const [id, waiting] of pending) {
      if (waiting.replaces !== word) continue;
      pending.delete(id);
      worker?.postMessage({ type: 'drop', id });
      waiting.reject(new SolverError('dropped', 'dropped', null, 'A later request took its place.'));
    }
  }

  /** @type {Solver['ask']} */
  function ask(call, payload = {}, { replaces } = {}) {
    if (down) return Promise.reject(down);
    if (replaces) drop(replaces);
    return new Promise((resolve, reject) => {
      const id = ++lastId;
      pending.set(id, { text: JSON.stringify({ ...payload, call }), replaces, resolve, reject });
      if (ready) send(id);
    });
  }

  function restart() {
    stop();
    launch();
  }

  launch();
  return { ask, restart, stop };
}
