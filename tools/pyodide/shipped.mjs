// How do the checks under Node start exactly what ships? With the site's own starter on the site's own run-time folder.
import fs from 'node:fs';
import path from 'node:path';

/**
 * @param {string} site  folder of the assembled site
 * @param {{stdLibURL?: string, folder?: string}} [options]
 */
export async function startShipped(site, options = {}) {
  const here = path.resolve(site);
  const { RUNTIME, BUILD } = await import(path.join(here, 'runtime.js'));
  const { startPython, openBridge } = await import(path.join(here, 'solver-runtime.js'));
  const folder = path.join(here, RUNTIME.folder);
  const { loadPyodide } = await import(path.join(folder, 'pyodide.mjs'));
  const getFile = async (file) => new Uint8Array(fs.readFileSync(path.join(folder, file)));
  const python = await startPython({ loadPyodide, folder, runtime: RUNTIME, getFile, ...options });
  return { python, openBridge, RUNTIME, BUILD };
}
