// How is Python brought up from the site's archives? The solver worker uses this, and so do the assembly's own checks under Node:
// what is tested is what ships. Only documented options of Pyodide are used.

const SITE = '/lib/python3.14/site-packages/';

/**
 * @typedef {object} Runtime  written by the assembly into runtime.js
 * @property {string} folder  of the run-time files, relative to the site, ending in a slash
 * @property {string} pyodide  version
 * @property {string} python  e.g. '3.14'
 * @property {string} abi
 * @property {string} standardLibrary  file name
 * @property {string[]} archives  file names, unpacked into site-packages
 * @property {[string, string][]} libraries  file name and place in site-packages
 * @property {Record<string, number>} sizes  bytes by file name
 */

/** @typedef {import('./vendor/pyodide.js').PyodideAPI} Python */

/**
 * Members of a stored (not deflated) zip archive.
 * @param {Uint8Array} bytes
 * @returns {Generator<[string, Uint8Array]>}
 */
export function* storedMembers(bytes) {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const text = new TextDecoder();
  const end = bytes.length - 22; // our archives have no comment, so the end record is the last 22 bytes
  if (end < 0 || view.getUint32(end, true) !== 0x06054b50) throw new Error('an archive of the app is damaged');
  let entry = view.getUint32(end + 16, true);
  for (let left = view.getUint16(end + 10, true); left > 0; left--) {
    if (view.getUint16(entry + 10, true) !== 0) throw new Error('an archive of the app is compressed, which it must not be');
    const size = view.getUint32(entry + 20, true);
    const nameLength = view.getUint16(entry + 28, true);
    const local = view.getUint32(entry + 42, true);
    const start = local + 30 + view.getUint16(local + 26, true) + view.getUint16(local + 28, true);
    yield [text.decode(bytes.subarray(entry + 46, entry + 46 + nameLength)), bytes.subarray(start, start + size)];
    entry += 46 + nameLength + view.getUint16(entry + 30, true) + view.getUint16(entry + 32, true);
  }
}

/** @param {Python} python @param {Uint8Array} archive */
function mount(python, archive) {
  const made = new Set();
  for (const [name, content] of storedMembers(archive)) {
    const file = SITE + name;
    const folder = file.slice(0, file.lastIndexOf('/'));
    if (!made.has(folder)) python.FS.mkdirTree(folder);
    made.add(folder);
    python.FS.writeFile(file, content);
  }
}

/**
 * Start Python with the site's archives in place; nothing of pysolver or numpy is imported yet.
 * @param {object} from
 * @param {typeof import('./vendor/pyodide.js').loadPyodide} from.loadPyodide
 * @param {string} from.folder  address (or path, under Node) of the run-time folder, ending in a slash
 * @param {Runtime} from.runtime
 * @param {(file: string) => Promise<Uint8Array>} from.getFile  bytes of a file of the run-time folder
 * @param {(stage: 'python'|'packages') => void} [from.onStage]
 * @param {string} [from.stdLibURL]  another standard library, for tests that need more of it
 * @returns {Promise<Python>}
 */
export async function startPython({ loadPyodide, folder, runtime, getFile, onStage, stdLibURL }) {
  const archives = Promise.all(runtime.archives.map(getFile));
  const libraries = Promise.all(runtime.libraries.map(([file]) => getFile(file)));
  for (const pending of [archives, libraries]) pending.catch(() => {}); // reported below, where they are awaited
  onStage?.('python');
  const python = await loadPyodide({
    indexURL: folder,
    stdLibURL: stdLibURL ?? folder + runtime.standardLibrary,
    // Spares fetching and parsing the list of all packages, of which none is loaded.
    lockFileContents: {
      info: { abi_version: runtime.abi, arch: 'wasm32', platform: 'emscripten', version: runtime.pyodide, python: runtime.python },
      packages: {},
    },
  });
  const [archiveBytes, libraryBytes] = await Promise.all([archives, libraries]);
  onStage?.('packages');
  for (const archive of archiveBytes) mount(python, archive);
  runtime.libraries.forEach(([, place], index) => python.FS.writeFile(SITE + place, /** @type {Uint8Array} */ (libraryBytes[index])));
  python.runPython('import importlib; importlib.invalidate_caches(); del importlib');
  return python;
}

/**
 * The one door to the solver: a function from a request to an answer, both JSON text.
 * @param {Python} python
 * @returns {(text: string) => string}
 */
export function openBridge(python) {
  return python.pyimport('pysolver.bridge').handle;
}
