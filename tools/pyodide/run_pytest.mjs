// Do the solver's tests hold in the very set that ships? Starts the site's archives; only for pytest's sake the full standard library
// takes the place of the shipped one, and the parts of numpy that only tests want are added from the wheel.
//
//   node run_pytest.mjs SITE TESTS_FOLDER WHEEL...   (the wheel of numpy is among them)
import fs from 'node:fs';
import path from 'node:path';

import { main } from './main.mjs';
import { startShipped } from './shipped.mjs';

const HOME = '/home/pyodide';

/** Copy a folder of the computer into Python's file system. */
function copyIn(python, from, to) {
  python.FS.mkdirTree(to);
  for (const entry of fs.readdirSync(from, { withFileTypes: true })) {
    const [source, target] = [path.join(from, entry.name), `${to}/${entry.name}`];
    if (entry.isDirectory() && entry.name !== '__pycache__') copyIn(python, source, target);
    else if (entry.isFile()) python.FS.writeFile(target, fs.readFileSync(source));
  }
}

await main(async () => {
  const [site, tests, ...wheels] = process.argv.slice(2);
  const pyodideFolder = new URL('../node_modules/pyodide/', import.meta.url);
  const stdLibURL = new URL('python_stdlib.zip', pyodideFolder).pathname;
  const { python } = await startShipped(site, { stdLibURL });
  copyIn(python, tests, `${HOME}/tests`);
  python.FS.writeFile(`${HOME}/pyproject.toml`, fs.readFileSync(path.join(tests, '../pyproject.toml')));
  python.FS.writeFile(`${HOME}/run_pytest.py`, fs.readFileSync(new URL('run_pytest.py', import.meta.url)));
  python.FS.mkdirTree('/wheels');
  for (const wheel of wheels) python.FS.writeFile(`/wheels/${path.basename(wheel)}`, fs.readFileSync(wheel));
  return python.runPython(`import sys; sys.path.insert(0, "${HOME}"); import run_pytest; run_pytest.run()`);
});
