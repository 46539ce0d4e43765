// How does the app open without signal, and how do we know that it will? Every file is fetched once, checked against its SHA-256
// and kept; from then on the app is answered from what was kept and never from the network. One version at a time, never mixed.
// The assembly fills in the four values below.
/// <reference lib="webworker" />
'use strict';

const VERSION = '@VERSION@';
const POLICY = '@POLICY@';
/** @type {{path: string, sha256: string, size: number}[]} */
const FILES = [/*@FILES@*/];
/** Content types by ending: hosts get some of them wrong. @type {Record<string, string>} */
const TYPES = {/*@TYPES@*/};

const worker = /** @type {ServiceWorkerGlobalScope} */ (/** @type {unknown} */ (self));
const SCOPE = worker.registration.scope;
const PREFIX = `asfound ${new URL(SCOPE).pathname} `; // another copy of the app may live on this origin
const CACHE = PREFIX + VERSION;
const TOTAL = FILES.reduce((sum, file) => sum + file.size, 0);
const MARK = `${SCOPE}cache-only/proved`;
const AT_ONCE = 4;

/** @param {import('../web/messages.js').FromServiceWorker} message */
async function tellPages(message) {
  const pages = await worker.clients.matchAll({ includeUncontrolled: true, type: 'window' });
  for (const page of pages) if (page.url.startsWith(SCOPE)) page.postMessage(message);
}

/** @param {ArrayBuffer} bytes */
async function sha256(bytes) {
  const digest = new Uint8Array(await crypto.subtle.digest('SHA-256', bytes));
  return Array.from(digest, (byte) => byte.toString(16).padStart(2, '0')).join('');
}

/** What is kept of a file: our own headers, whatever the host sent. @param {string} path @param {ArrayBuffer} bytes */
function kept(path, bytes) {
  const type = TYPES[path.slice(path.lastIndexOf('.'))] ?? 'application/octet-stream';
  return new Response(bytes, { headers: {
    'content-type': type, 'content-length': String(bytes.byteLength), 'content-security-policy': POLICY,
    'x-content-type-options': 'nosniff', 'referrer-policy': 'no-referrer',
  } });
}

/** The file, if a version on this device has the very same bytes. @param {typeof FILES[0]} file */
async function fromThisDevice(file) {
  for (const name of await caches.keys()) {
    if (!name.startsWith(PREFIX)) continue;
    const found = await (await caches.open(name)).match(SCOPE + file.path);
    const bytes = await found?.arrayBuffer();
    if (bytes && bytes.byteLength === file.size && await sha256(bytes) === file.sha256) return bytes;
  }
  return null;
}

/** The file from the host; a stale copy on the way is passed over once. @param {typeof FILES[0]} file */
async function fromNetwork(file) {
  let problem = '';
  for (const cache of /** @type {RequestCache[]} */ (['no-cache', 'reload'])) {
    const answer = await fetch(SCOPE + file.path, { cache }).catch(() => null);
    const bytes = answer?.ok ? await answer.arrayBuffer().catch(() => null) : null;
    if (bytes && await sha256(bytes) === file.sha256) return bytes;
    problem = bytes ? 'did not arrive as it was published' : `could not be fetched (${answer ? answer.status : 'no connection'})`;
  }
  throw new Error(`${file.path} ${problem}`);
}

/** Keep every file of this version that is not kept yet, telling the pages how far it is. */
async function keepAll() {
  const cache = await caches.open(CACHE);
  const waiting = [...FILES];
  let done = 0;
  async function keepSome() {
    for (let file = waiting.shift(); file; file = waiting.shift()) {
      await cache.put(SCOPE + file.path, kept(file.path, await fromThisDevice(file) ?? await fromNetwork(file)));
      done += file.size;
      await tellPages({ type: 'install-progress', version: VERSION, done, total: TOTAL });
    }
  }
  // One failure ends all: what the others would still fetch is not asked for, and no progress is told after the reason.
  const stop = (/** @type {unknown} */ error) => { waiting.length = 0; throw error; };
  const ends = await Promise.allSettled(Array.from({ length: AT_ONCE }, () => keepSome().catch(stop)));
  const failed = ends.find((end) => end.status === 'rejected');
  if (failed) throw failed.reason;
}

async function install() {
  try {
    await keepAll();
  } catch (error) {
    await caches.delete(CACHE); // Firefox would keep the half of it
    await tellPages({ type: 'install-failed', version: VERSION, message: error instanceof Error ? error.message : String(error) });
    throw error;
  }
}

async function activate() {
  for (const name of await caches.keys()) if (name.startsWith(PREFIX) && name !== CACHE) await caches.delete(name);
  await worker.clients.claim(); // so that the first visit is already answered from the cache
}

/** @returns {Promise<import('../web/messages.js').CacheStatus>} */
async function status() {
  const cache = await caches.open(CACHE);
  const there = new Set((await cache.keys()).map((request) => request.url));
  return { version: VERSION, complete: FILES.every((file) => there.has(SCOPE + file.path)), proved: there.has(MARK) };
}

/**
 * The answer to any request below our scope: from the cache of this version or not at all. Query strings carry no meaning.
 * An address below cache-only/ exists nowhere but here: a worker started from it can get nothing from the network.
 * @param {Request} request
 */
async function answer(request) {
  const address = new URL(request.url);
  const path = (address.origin + address.pathname).slice(SCOPE.length).replace(/^cache-only\//, '');
  const cache = await caches.open(CACHE);
  const found = await cache.match(SCOPE + (path || 'index.html'));
  if (found) return found;
  const page = request.mode === 'navigate' ? await cache.match(`${SCOPE}index.html`) : undefined;
  return page ?? new Response('This is not part of the app.', { status: 404, headers: { 'content-security-policy': POLICY } });
}

worker.addEventListener('install', (event) => event.waitUntil(install()));
worker.addEventListener('activate', (event) => event.waitUntil(activate()));
worker.addEventListener('fetch', (event) => {
  const inScope = event.request.method === 'GET' && event.request.url.startsWith(SCOPE);
  event.respondWith(inScope ? answer(event.request) : new Response(null, { status: 404 }));
});
worker.addEventListener('message', (event) => {
  const { type } = /** @type {import('../web/messages.js').ToServiceWorker} */ (event.data);
  const reply = (/** @type {unknown} */ value) => event.ports[0]?.postMessage(value);
  if (type === 'activate') event.waitUntil(worker.skipWaiting());
  else if (type === 'claim') event.waitUntil(worker.clients.claim().then(() => reply(true)));
  else if (type === 'status') event.waitUntil(status().then(reply));
  else if (type === 'proved') event.waitUntil(caches.open(CACHE).then((cache) => cache.put(MARK, new Response(''))).then(() => reply(true)));
  else if (type === 'repair') event.waitUntil(keepAll().then(() => reply({ ok: true }), (error) => reply({ ok: false, message: String(error) })));
});
