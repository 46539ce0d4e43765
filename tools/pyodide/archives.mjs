// How does a wheel become what the phone starts from? Pyodide under Node installs it with micropip, which proves its dependencies,
// then compiles everything to .pyc archives with its own Python (archives.py).
//
//   node archives.mjs standard-library PYODIDE OUT.zip
//   node archives.mjs application PYODIDE OUT_FOLDER BOOTSTRAP_WHEEL,... WHEEL,...
//
// The second form prints one line of JSON: {libraries, examples, packages}.
import fs from 'node:fs';
import path from 'node:path';

import { main } from './main.mjs';

const SITE = '/lib/python3.14/site-packages';

/** Pyodide with the module archives.py; a fixed hash seed, since the order of sets reaches the .pyc files. */
async function start(pyodideFolder) {
  const { loadPyodide } = await import(path.resolve(pyodideFolder, 'pyodide.mjs'));
  const python = await loadPyodide({ indexURL: path.resolve(pyodideFolder) + '/', env: { HOME: '/home/pyodide', PYTHONHASHSEED: '0' } });
  python.FS.mkdirTree('/tools');
  python.FS.writeFile('/tools/archives.py', fs.readFileSync(new URL('archives.py', import.meta.url)));
  python.runPython('import sys; sys.path.append("/tools")');
  return python;
}

async function standardLibrary(pyodideFolder, out) {
  const python = await start(pyodideFolder);
  python.FS.writeFile('/stock.zip', fs.readFileSync(path.resolve(pyodideFolder, 'python_stdlib.zip')));
  python.pyimport('archives').standard_library('/stock.zip', '/out.zip');
  fs.writeFileSync(out, python.FS.readFile('/out.zip'));
}

/** Install wheels from local files only: a dependency that is not among them is an error, never a download. */
async function install(python, bootstrap, wheels) {
  for (const wheel of bootstrap) python.unpackArchive(new Uint8Array(fs.readFileSync(wheel)), 'wheel', { extractDir: SITE });
  python.FS.mkdirTree('/wheels');
  for (const wheel of wheels) python.FS.writeFile(`/wheels/${path.basename(wheel)}`, fs.readFileSync(wheel));
  python.globals.set('URLS', python.toPy(wheels.map((wheel) => `emfs:/wheels/${path.basename(wheel)}`)));
  await python.runPythonAsync(`
import micropip
micropip.set_index_urls(["http://no-index.invalid/{package_name}"])
for url in URLS:
    await micropip.install(url)
`);
  return python.runPython('micropip.freeze()');
}

async function application(pyodideFolder, outFolder, bootstrap, wheels) {
  const python = await start(pyodideFolder);
  const lock = await install(python, bootstrap, wheels);
  fs.writeFileSync(path.join(outFolder, 'frozen-lock.json'), lock);
  const archives = python.pyimport('archives');
  const examples = archives.use_everything();
  const libraries = archives.numpy_archive('/numpy.zip').toJs();
  const packages = archives.app_archive('/app.zip', archives.pure_distributions(), '/numpy.zip').toJs({ dict_converter: Object.fromEntries });
  for (const name of ['numpy', 'app']) fs.writeFileSync(path.join(outFolder, `${name}.zip`), python.FS.readFile(`/${name}.zip`));
  for (const library of libraries) {
    fs.writeFileSync(path.join(outFolder, libraryFile(library)), python.FS.readFile(`${SITE}/${library}`));
  }
  return { libraries: libraries.map((library) => [libraryFile(library), library]), examples, packages, python: python.runPython('import platform; platform.python_version()') };
}

/** numpy/linalg/_umath_linalg.cpython-314-....so -> numpy-umath-linalg.wasm; the ending makes hosts compress it. */
function libraryFile(library) {
  return `numpy-${path.basename(library).split('.')[0].replaceAll('_', '-').replace(/^-/, '')}.wasm`;
}

await main(async () => {
  const [mode, pyodideFolder, out, bootstrap, wheels] = process.argv.slice(2);
  if (mode === 'standard-library') return standardLibrary(pyodideFolder, out);
  console.log(JSON.stringify(await application(pyodideFolder, out, bootstrap.split(','), wheels.split(','))));
});
