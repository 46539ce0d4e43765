// Can this browser run the app, and if not, what is missing? Written so that older browsers still get as far as the answer.

/** The oldest engines the app is meant for. Below them something in the list underneath is missing. */
export const OLDEST_ENGINES = 'Chrome, Edge and Android 114; Firefox 114; Safari and iOS 16.4';

/** A module with one function that uses WebAssembly's exceptions, which Python needs: (try (catch_all)). */
const WASM_WITH_EXCEPTIONS = new Uint8Array([0, 97, 115, 109, 1, 0, 0, 0, 1, 4, 1, 96, 0, 0, 3, 2, 1, 0, 10, 8, 1, 6, 0, 6, 64, 25, 11, 11]);

/** @returns {boolean} */
function runsPython() {
  try {
    return typeof BigInt64Array !== 'undefined' && WebAssembly.validate(WASM_WITH_EXCEPTIONS);
  } catch {
    return false;
  }
}

/** @returns {boolean} */
function hasModuleWorkers() {
  let asked = false;
  try {
    // The browser reads `type` only where it knows module workers. The file holds comments alone.
    new Worker(new URL('./messages.js', import.meta.url), { get type() { asked = true; return /** @type {const} */ ('module'); } }).terminate();
  } catch {
    // Whatever the reason, by then `type` was read or not.
  }
  return asked;
}

/**
 * Plain sentences on what this browser lacks; empty when it has all that is needed.
 * @returns {string[]}
 */
export function missingFeatures() {
  /** @type {[boolean, string][]} */
  const wanted = [
    [self.isSecureContext, 'This page did not come over HTTPS, so nothing can be kept for use without signal and records cannot be sealed.'],
    [runsPython(), 'This browser cannot run the solver (WebAssembly with exceptions is missing).'],
    [typeof Worker !== 'undefined' && hasModuleWorkers(), 'This browser cannot run the solver beside the page (module workers are missing).'],
    [typeof indexedDB !== 'undefined', 'This browser cannot keep checks on the device (IndexedDB is missing).'],
    ['serviceWorker' in navigator && 'caches' in self, 'This browser cannot open the app without signal (service workers are missing; a private window may be why).'],
    [typeof crypto !== 'undefined' && !!crypto.subtle, 'This browser cannot seal records (Web Crypto is missing).'],
    [typeof structuredClone === 'function' && typeof DecompressionStream === 'function', 'This browser is older than the app was made for.'],
  ];
  return wanted.filter(([there]) => !there).map(([, sentence]) => sentence);
}
