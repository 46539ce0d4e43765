// Which messages pass between the page, the solver worker and the service worker? Types only; nothing here runs.

/**
 * @typedef {object} Progress
 * @property {'fetch'|'python'|'packages'|'solver'} stage
 * @property {string} label  what is being done, in the user's words
 * @property {number} loaded  bytes fetched so far, out of `total`; both 0 in a stage that has no bytes to count
 * @property {number} total
 */

/** Page to solver worker: begin. `countBytes` fetches the largest file once by itself, to be able to count (first visit only).
 * @typedef {{type: 'start', countBytes: boolean}} StartMessage */

/** Page to solver worker: one request of pysolver.bridge, as JSON text.
 * @typedef {{id: number, text: string}} RequestMessage */

/** Page to solver worker: the answer to this request is no longer wanted.
 * @typedef {{type: 'drop', id: number}} DropMessage */

/** @typedef {StartMessage|RequestMessage|DropMessage} ToWorker */

/** Solver worker to page.
 * @typedef {({type: 'progress'} & Progress)
 *   | {type: 'ready'}
 *   | {type: 'failed', code: 'start-failed'|'crashed', message: string}
 *   | {type: 'answer', id: number, text: string}} FromWorker */

/** What pysolver.bridge answers.
 * @typedef {{ok: true, result: any}
 *   | {ok: false, error: {kind: 'input'|'internal', code: string, field: string|null, message: string}}} BridgeAnswer */

/** Page to service worker. `status` and `repair` are answered on the port sent along.
 * @typedef {{type: 'status'|'repair'|'activate'|'claim'|'proved'}} ToServiceWorker */

/** @typedef {{version: string, complete: boolean, proved: boolean}} CacheStatus */

/** Service worker to every page of the site, while it installs.
 * @typedef {{type: 'install-progress', version: string, done: number, total: number}
 *   | {type: 'install-failed', version: string, message: string}} FromServiceWorker */

export {};
