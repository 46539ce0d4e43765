// How does a script under Node end? With the message of its error alone: Node's own report would print a line of Pyodide's
// minified source, of a megabyte. And at once: Pyodide leaves timers behind.
import fs from 'node:fs';

/** @param {() => Promise<number|void>} work  resolves to the exit code */
export async function main(work) {
  try {
    process.exit((await work()) ?? 0);
  } catch (error) {
    fs.writeSync(2, `${error?.message ?? error}\n${(error?.stack ?? '').split('\n').filter((line) => line.length < 300).slice(0, 8).join('\n')}\n`);
    process.exit(1);
  }
}
