// Is this object from a file or a link something the form can draw? It fills gaps and drops what has the wrong type, so that a
// broken record can be shown and kept. Whether its content is right is Python's question, never this file's.
import { addEntry, addHinge, addLimits, addLoad, addZone, BLANK } from './changes.js';

/** @typedef {import('./types.js').CheckRecord} CheckRecord */

const MAX_LIST = 2000;
const MAX_TEXT = 4000;
const FULL = addZone(addHinge(addEntry(addLimits(addLoad(BLANK)), 0, 'sagging')));
/** Lists whose blank is empty: what one element looks like. @type {Record<string, any>} */
const ELEMENTS = {
  spans: BLANK.spans[0], supports: BLANK.supports[0], hinges: FULL.hinges[0], zones: FULL.section.zones[0], loads: FULL.loads[0],
  limits: FULL.limits[0], entries: FULL.limits[0].entries[0], which: '', covers_loads: '',
  photos: { hash: '', name: '', type: '', bytes: 0, note: '', load: null, taken: '' },
};

/** @param {unknown} value @returns {CheckRecord|null} null when it isn't a record at all */
export function wholeRecord(value) {
  if (!isObject(value)) return null;
  const given = /** @type {any} */ (value);
  if (given.format !== 'asfound-record' || typeof given.id !== 'string' || given.id === '') return null;
  const record = like(BLANK, given, '');
  record.version = given.version;
  record.loads.forEach((/** @type {any} */ load, /** @type {number} */ i) => { load.photos = hashes(given.loads[i]?.photos); });
  if (record.spans.length === 0) record.spans = structuredClone(BLANK.spans);
  while (record.supports.length < record.spans.length + 1) record.supports.push(structuredClone(BLANK.supports[1]));
  return record;
}

/** @param {unknown} list */
const hashes = (list) => (Array.isArray(list) ? list.filter((one) => typeof one === 'string').slice(0, 50) : []);
/** @param {unknown} value */
const isObject = (value) => value !== null && typeof value === 'object' && !Array.isArray(value);

/** @param {any} pattern @param {any} value @param {string} key @returns {any} */
function like(pattern, value, key) {
  if (Array.isArray(pattern)) return likeList(value, key);
  if (isObject(pattern)) return likeObject(pattern, value);
  if (typeof pattern === 'string') return typeof value === 'string' ? value.slice(0, MAX_TEXT) : pattern;
  if (typeof pattern === 'number') return typeof value === 'number' ? value : pattern;
  if (typeof pattern === 'boolean') return typeof value === 'boolean' ? value : pattern;
  return plain(value, 0); // a null of the blank: an answer, a quantity or a position
}

/** @param {any} pattern @param {any} value */
function likeObject(pattern, value) {
  const given = isObject(value) ? value : {};
  /** @type {any} */ const copy = {};
  for (const key of Object.keys(pattern)) copy[key] = like(pattern[key], given[key], key);
  return copy;
}

/** @param {any} value @param {string} key */
function likeList(value, key) {
  if (!Array.isArray(value)) return [];
  if (key === 'photos' && value.every((one) => typeof one === 'string')) return hashes(value);
  return value.slice(0, MAX_LIST).map((one) => like(ELEMENTS[key] ?? null, one, ''));
}

/** Any JSON value, cut at a depth no record reaches. @param {any} value @param {number} depth @returns {any} */
function plain(value, depth) {
  if (value === undefined || depth > 6) return null;
  if (typeof value === 'string') return value.slice(0, MAX_TEXT);
  if (Array.isArray(value)) return value.slice(0, MAX_LIST).map((one) => plain(one, depth + 1));
  if (!isObject(value)) return value;
  return Object.fromEntries(Object.entries(value).filter(([key]) => key !== '__proto__').map(([key, one]) => [key, plain(one, depth + 1)]));
}
