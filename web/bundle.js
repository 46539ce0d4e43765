// How do all checks travel as one file, and what may a file from a stranger do? A .zip of records.json and photos/<sha256>.jpg:
// sizes are capped before anything is inflated, photos must match their names, and nothing stored here is ever overwritten.
import { strFromU8, strToU8, unzipSync, zipSync } from './vendor/fflate.js';
import { MAX_PHOTO, sha256 } from './photos.js';
import { wholeRecord } from './shape.js';

/** @typedef {import('./types.js').Entry} Entry */

const MAX_FILE = 500_000_000;
const MAX_RECORDS_TEXT = 20_000_000;
const MAX_TOTAL = 500_000_000;
const MAX_MEMBERS = 5000;
const PHOTO_NAME = /^photos\/([0-9a-f]{64})\.jpg$/;

/** The file can't be taken in; the message is for the user. */
export class BundleError extends Error {}

/** @param {Entry[]} entries @param {Map<string, Uint8Array>} photos by hash @param {string} now @returns {Uint8Array<ArrayBuffer>} */
export function packBundle(entries, photos, now) {
  const text = JSON.stringify({ format: 'asfound-records', version: 1, exported: now, records: entries.map((entry) => entry.record) }, null, 1);
  /** @type {Record<string, any>} */ const files = { 'records.json': strToU8(text) };
  for (const [hash, bytes] of photos) files[`photos/${hash}.jpg`] = [bytes, { level: 0 }]; // pictures don't get smaller
  return /** @type {Uint8Array<ArrayBuffer>} */ (zipSync(files, { level: 6 }));
}

/**
 * @param {Uint8Array} bytes
 * @returns {Promise<{records:any[], photos:{hash:string, bytes:Uint8Array<ArrayBuffer>}[], refused:string[]}>}
 */
export async function unpackBundle(bytes) {
  if (bytes.length > MAX_FILE) throw new BundleError(`The file has ${Math.round(bytes.length / 1e6)} MB; ${MAX_FILE / 1e6} MB is the most. Export fewer checks at a time.`);
  const files = inflate(bytes);
  if (!files['records.json']) throw new BundleError('There is no records.json in this file: it is no export of Asfound. Choose the .zip that “Export all” made.');
  const { records, refused } = readRecords(strFromU8(files['records.json']));
  const photos = [];
  for (const [name, content] of Object.entries(files)) {
    const hash = PHOTO_NAME.exec(name)?.[1];
    if (!hash) continue;
    const own = new Uint8Array(content);
    if (await sha256(own.buffer) === hash) photos.push({ hash, bytes: own });
    else refused.push(`Photo ${hash.slice(0, 8)}… is not the picture its name says: left out.`);
  }
  return { records, photos, refused };
}

/** @param {Uint8Array} bytes @returns {Record<string, Uint8Array>} */
function inflate(bytes) {
  let total = 0;
  let members = 0;
  const filter = (/** @type {{name:string, originalSize:number}} */ member) => {
    members += 1;
    const wanted = member.name === 'records.json' || PHOTO_NAME.test(member.name);
    if (!wanted) return false;
    const most = member.name === 'records.json' ? MAX_RECORDS_TEXT : MAX_PHOTO;
    total += member.originalSize;
    if (member.originalSize > most || total > MAX_TOTAL || members > MAX_MEMBERS) throw new BundleError(`“${member.name}” would unpack to more than is taken in (${Math.round(member.originalSize / 1e6)} MB). Nothing was read.`);
    return true;
  };
  try {
    return unzipSync(bytes, { filter });
  } catch (error) {
    if (error instanceof BundleError) throw error;
    throw new BundleError('This is not a .zip file, or it is damaged. Nothing was read. Choose the file that “Export all” made, or export again.');
  }
}

/** @param {string} text */
function readRecords(text) {
  /** @type {any} */ let content;
  try { content = JSON.parse(text); } catch { throw new BundleError('records.json in this file can’t be read: it is damaged. Nothing was taken in.'); }
  if (content?.format !== 'asfound-records' || !Array.isArray(content.records)) throw new BundleError('records.json is not a list of checks of Asfound. Nothing was taken in.');
  /** @type {any[]} */ const records = [];
  /** @type {string[]} */ const refused = [];
  content.records.slice(0, MAX_MEMBERS).forEach((/** @type {any} */ one, /** @type {number} */ i) => {
    const record = wholeRecord(one);
    if (record) records.push(record); else refused.push(`Entry ${i + 1} is no check of Asfound: left out.`);
  });
  return { records, refused };
}

/** The same content gives the same text, in whatever order it was written. @param {any} value @returns {string} */
function inOrder(value) {
  return JSON.stringify(value, (_, inner) => (inner && typeof inner === 'object' && !Array.isArray(inner)
    ? Object.fromEntries(Object.entries(inner).sort(([a], [b]) => (a < b ? -1 : 1))) : inner));
}

/**
 * What an import adds. A check that is here already in the same words is left alone; one that differs comes in as a second check.
 * @param {Entry[]} stored @param {any[]} records @param {() => string} newId
 * @returns {{add: Entry[], same: number, beside: number}}
 */
export function planImport(stored, records, newId) {
  const here = new Map(stored.map((entry) => [entry.id, inOrder(entry.record)]));
  /** @type {{add: Entry[], same: number, beside: number}} */ const plan = { add: [], same: 0, beside: 0 };
  for (const record of records) {
    const known = here.get(record.id);
    if (known === inOrder(record)) { plan.same += 1; continue; }
    const id = known === undefined ? record.id : newId();
    if (known !== undefined) plan.beside += 1;
    here.set(id, inOrder(record));
    plan.add.push({ id, record: { ...record, id }, seq: 0, exported: null, deleted: null, origin: known === undefined ? 'from a file' : 'from a file, beside the one here' });
  }
  return plan;
}
