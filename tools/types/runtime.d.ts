// web/runtime.js is written by the assembly (tools/precache.py); this is what it exports.
import type { Runtime } from '../../web/solver-runtime.js';

export const RUNTIME: Runtime;
/** `build` is the hash of everything in the site; records carry it. */
export const BUILD: { version: string; build: string; pyodide: string; numpy: string; python: string };
