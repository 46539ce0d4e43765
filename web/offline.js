// Will the app open here without signal? Registers the service worker, follows its install, and says 'ready' only after a solver
// worker that could get nothing from the network has answered the self check.

import { startSolver } from './solver-client.js';

/** @typedef {import('./messages.js').CacheStatus} CacheStatus */
/** @typedef {import('./messages.js').FromServiceWorker} FromServiceWorker */
/** @typedef {import('./messages.js').ToServiceWorker} ToServiceWorker */

/**
 * @typedef {object} OfflineState
 * @property {'checking'|'downloading'|'verifying'|'ready'|'unavailable'|'failed'|'update-waiting'} state
 * @property {string} message  the sentence to show
 * @property {number} done  bytes kept, out of `total`; both 0 where nothing is counted
 * @property {number} total
 */

const ANSWER_WITHIN_MS = 20_000;
const INSTALL_SILENT_MS = 120_000;
/** The service worker's last words may come after its end is seen. */
const REASON_WITHIN_MS = 500;
const PROOF_WITHIN_MS = 180_000;
const LOOK_FOR_UPDATES_EVERY_MS = 3_600_000;

const READY = 'Ready without signal: this version was started here from what is kept on this device and gave the right answers.';

/** @template T @param {Promise<T>} promise @param {number} ms @param {string} problem @returns {Promise<T>} */
function within(promise, ms, problem) {
  /** @type {ReturnType<typeof setTimeout>|undefined} */
  let timer;
  const late = new Promise((_, reject) => { timer = setTimeout(() => reject(new Error(problem)), ms); });
  return Promise.race([promise, /** @type {Promise<never>} */ (late)]).finally(() => clearTimeout(timer));
}

/** @param {unknown} error */
const reasonOf = (error) => (error instanceof Error ? error.message : String(error)).replace(/\.$/, '');

/** Ask a service worker and wait for its answer. @param {ServiceWorker} to @param {ToServiceWorker['type']} type @returns {Promise<any>} */
function ask(to, type, ms = ANSWER_WITHIN_MS) {
  const { port1, port2 } = new MessageChannel();
  const answer = new Promise((resolve) => { port1.onmessage = ({ data }) => resolve(data); });
  to.postMessage({ type }, [port2]);
  return within(answer, ms, 'the service worker did not answer').finally(() => port1.close());
}

/** Wait until this service worker has left its install: true if it is of use. @param {ServiceWorker} installing @returns {Promise<boolean>} */
function installed(installing) {
  return new Promise((resolve) => {
    const look = () => {
      if (installing.state === 'activated' || installing.state === 'installed') resolve(true);
      else if (installing.state === 'redundant') resolve(false);
    };
    installing.addEventListener('statechange', look);
    look();
  });
}

/** Wait until this service worker is in charge of new starts. @param {ServiceWorker} active @returns {Promise<void>} */
function activated(active) {
  return new Promise((resolve) => {
    const look = () => { if (active.state === 'activated') resolve(); };
    active.addEventListener('statechange', look);
    look();
  });
}

/**
 * Start a solver from an address that only the service worker can answer and let it check itself.
 * @returns {Promise<void>} rejects with the reason when it can't be done
 */
export function startFromCacheAlone() {
  return new Promise((resolve, reject) => {
    const finish = (/** @type {Error|null} */ problem) => {
      clearTimeout(timer);
      solver.stop();
      if (problem) reject(problem); else resolve();
    };
    const timer = setTimeout(() => finish(new Error('the start took too long')), PROOF_WITHIN_MS);
    const solver = startSolver({
      onReady: () => solver.ask('self_check').then(() => finish(null), finish),
      onFailed: ({ code, message }) => { if (code !== 'stalled') finish(new Error(message)); },
    }, { address: new URL('./cache-only/solver-worker.js', import.meta.url), countBytes: false });
  });
}

/** Why this browser can't keep the app at all, or ''. */
function whyUnavailable() {
  if (!self.isSecureContext) return 'Not available without signal: this address is not HTTPS. Open the app over HTTPS, then it can be kept.';
  if (!('serviceWorker' in navigator)) return 'Not available without signal: this browser (or a private window) keeps no apps. Use an ordinary window.';
  return '';
}

/**
 * Keep the app on this device and say how far that is.
 * @param {{onState: (state: OfflineState) => void}} events
 * @returns {{applyUpdate: () => void, checkAgain: () => Promise<void>}}
 *   `applyUpdate` changes to the version that waits and loads the page anew; `checkAgain` looks for a newer version, fetches what is
 *   missing and makes the start from the cache alone again
 */
export function startOffline({ onState }) {
  const say = (/** @type {OfflineState['state']} */ state, /** @type {string} */ message, done = 0, total = 0) => onState({ state, message, done, total });
  const reason = whyUnavailable();
  if (reason) {
    say('unavailable', reason);
    return { applyUpdate: () => {}, checkAgain: async () => {} };
  }
  const container = navigator.serviceWorker;
  const hadController = !!container.controller;
  let leaving = false;
  let installFailure = '';
  let heard = Date.now();
  /** @type {ServiceWorkerRegistration|null} */
  let registration = null;
  /** @type {Promise<void>|null} */
  let running = null;

  container.addEventListener('message', ({ data }) => {
    const message = /** @type {FromServiceWorker} */ (data);
    heard = Date.now();
    if (message.type === 'install-failed') installFailure = message.message;
    else if (message.type === 'install-progress' && !registration?.active && !installFailure) {
      say('downloading', 'Fetching the app for use without signal', message.done, message.total);
    }
  });
  container.startMessages();
  container.addEventListener('controllerchange', () => {
    if (leaving) location.reload();
    else if (hadController) say('update-waiting', 'A newer version was put in place from another window. Load this page again to use it.');
  });

  /** Follow an install to its end. @param {ServiceWorker} installing */
  async function follow(installing) {
    heard = Date.now();
    installFailure = '';
    /** @type {ReturnType<typeof setInterval>|undefined} */
    let timer;
    const silence = new Promise((_, reject) => {
      timer = setInterval(() => { if (Date.now() - heard > INSTALL_SILENT_MS) reject(new Error('nothing more arrived')); }, 1000);
    });
    const good = await Promise.race([installed(installing), /** @type {Promise<never>} */ (silence)]).finally(() => clearInterval(timer));
    if (good) return;
    await new Promise((resolve) => { setTimeout(resolve, REASON_WITHIN_MS); }); // the reason comes by another way, a little later
    throw new Error(installFailure || 'a file could not be fetched or kept');
  }

  /** Fetch what is missing or damaged. @param {ServiceWorker} active */
  async function repair(active) {
    say('downloading', 'Some files on this device are missing or damaged. Fetching them again');
    const repaired = await ask(active, 'repair', INSTALL_SILENT_MS);
    if (!repaired.ok) throw new Error(repaired.message);
  }

  async function start() {
    say('verifying', 'Starting the solver from this device alone, without the network');
    await startFromCacheAlone();
  }

  /** @param {ServiceWorker} active @param {boolean} anew  even when this version was proved here before */
  async function prove(active, anew) {
    await within(activated(active), ANSWER_WITHIN_MS, 'the service worker does not start');
    if (!container.controller) await ask(active, 'claim'); // a forced reload leaves the page without one
    const status = /** @type {CacheStatus} */ (await ask(active, 'status'));
    if (!status.complete) await repair(active);
    else if (status.proved && !anew) return;
    await start().catch(() => repair(active).then(start));
    await ask(active, 'proved');
  }

  /** @param {boolean} anew */
  async function check(anew) {
    say('checking', 'Looking at what is kept on this device');
    try {
      // Registering again is a way to ask for the registration, and starts anew after an install that failed.
      const registration = watched(await container.register(new URL('./sw.js', import.meta.url), { updateViaCache: 'none' }));
      if (anew) await registration.update().catch(() => {}); // no signal: what is here is checked all the same
      if (!registration.active && registration.installing) await follow(registration.installing);
      const active = registration.active ?? registration.waiting;
      if (!active) throw new Error('the service worker is gone; load the page again');
      await prove(active, anew);
      if (registration.waiting && registration.active) sayWaiting();
      else say('ready', READY);
    } catch (error) {
      say('failed', `Not ready without signal: ${reasonOf(error)}. The app works while there is signal; connect and check again.`);
    }
  }

  function sayWaiting() {
    say('update-waiting', 'A newer version is on this device, fetched and checked. It is used when you say so; the one in use keeps working.');
  }

  /** Follow updates that come later. @param {ServiceWorkerRegistration} found */
  function watched(found) {
    if (found === registration) return found;
    registration = found;
    found.addEventListener('updatefound', async () => {
      const installing = found.installing;
      if (!installing || !found.active) return; // the first install is followed by `check`
      try {
        await follow(installing);
        if (found.waiting) sayWaiting();
      } catch (error) {
        say('ready', `${READY} A newer version could not be fetched (${reasonOf(error)}).`);
      }
    });
    let looked = Date.now();
    document.addEventListener('visibilitychange', () => {
      if (document.visibilityState !== 'visible' || Date.now() - looked < LOOK_FOR_UPDATES_EVERY_MS) return;
      looked = Date.now();
      found.update().catch(() => {});
    });
    return found;
  }

  /** One check at a time. @param {boolean} anew @returns {Promise<void>} */
  const checkOnce = (anew) => (running ??= check(anew).finally(() => { running = null; }));
  void checkOnce(false);
  return {
    applyUpdate() {
      leaving = true;
      if (registration?.waiting) registration.waiting.postMessage({ type: 'activate' });
      else location.reload();
    },
    checkAgain: () => checkOnce(true),
  };
}
