// How does a record change when spans, hinges, loads or limits come and go? Structure only; no numbers are made up here.
import { getAt, removeAt, setAt } from './pointer.js';

/** @typedef {import('./types.js').CheckRecord} CheckRecord */

const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ';
export const MAX_SPANS = 12;

/** @param {CheckRecord|null} base the blank of Python when it is known @param {any} preferences @param {Date} now */
export function newRecord(base, preferences, now) {
  const stamp = isoWithZone(now);
  const record = structuredClone(base ?? BLANK);
  return {
    ...record, id: crypto.randomUUID(), created: stamp, changed: stamp,
    found_by: { ...record.found_by, name: preferences.name },
    settings: { ...record.settings, display: preferences.display, phone: preferences.phone },
  };
}

/** Local time with its zone, since "found at" is read by people. @param {Date} date */
export function isoWithZone(date) {
  const minutes = -date.getTimezoneOffset();
  const local = new Date(date.getTime() + minutes * 60000).toISOString().slice(0, 19);
  const size = Math.abs(minutes);
  const two = (/** @type {number} */ n) => String(n).padStart(2, '0');
  return `${local}${minutes < 0 ? '-' : '+'}${two(Math.floor(size / 60))}:${two(size % 60)}`;
}

/** @param {string} name */
const blankSupport = (name) => ({
  name, kind: null, bearing: null, bearing_drawn: null, stiffness: null, rotational: null, settlement: null, note: '',
});
const blankSpan = () => ({ measure: null, length: null, drawn: null });
export const blankPosition = () => ({ from: null, support: null, side: null, at: null, to: null, distance: null });

/** @param {CheckRecord} record @param {number} index the new span stands right of span `index` */
export function addSpan(record, index) {
  if (record.spans.length >= MAX_SPANS) return record;
  const place = index + 1;
  const supports = insert(record.supports, place + 1, blankSupport(nextName(record.supports)));
  const shifted = shiftSupports(record, (/** @type {number} */ at) => (at > place ? at + 1 : at));
  return {
    ...shifted, spans: insert(record.spans, place, blankSpan()),
    supports: inOrder(record.supports) ? reletter(supports) : supports,
  };
}

/** The support right of the span goes with it. @param {CheckRecord} record @param {number} index */
export function removeSpan(record, index) {
  if (record.spans.length === 1) return record;
  const gone = index + 1;
  const supports = record.supports.filter((/** @type {any} */ _, /** @type {number} */ i) => i !== gone);
  const shifted = shiftSupports(record, (/** @type {number} */ at) => (at >= gone ? at - 1 : at));
  return {
    ...shifted, spans: record.spans.filter((/** @type {any} */ _, /** @type {number} */ i) => i !== index),
    supports: inOrder(record.supports) ? reletter(supports) : supports,
  };
}

/** @template T @param {T[]} list @param {number} at @param {T} item */
const insert = (list, at, item) => [...list.slice(0, at), item, ...list.slice(at)];
/** @param {any[]} supports */
const inOrder = (supports) => supports.every((support, i) => support.name === LETTERS[i]);
/** @param {any[]} supports */
const reletter = (supports) => supports.map((support, i) => ({ ...support, name: LETTERS[i] }));
/** @param {any[]} supports */
function nextName(supports) {
  const used = new Set(supports.map((support) => support.name));
  return [...LETTERS].find((letter) => !used.has(letter)) ?? `S${supports.length + 1}`;
}

/** Every support index of the record through `move`. @param {CheckRecord} record @param {(at:number)=>number} move */
function shiftSupports(record, move) {
  /** @type {(value: any) => any} */
  const visit = (value) => {
    if (Array.isArray(value)) return value.map(visit);
    if (value === null || typeof value !== 'object') return value;
    /** @type {any} */ const copy = {};
    for (const [key, inner] of Object.entries(value)) {
      copy[key] = key === 'support' && typeof inner === 'number' ? move(inner) : visit(inner);
    }
    return copy;
  };
  return { ...record, hinges: visit(record.hinges), section: visit(record.section), loads: visit(record.loads), limits: visit(record.limits) };
}

/** The lowest "l3" not in use. @param {any[]} list @param {string} letter */
export function freeId(list, letter) {
  const used = new Set(list.map((item) => item.id));
  let n = 1;
  while (used.has(`${letter}${n}`)) n += 1;
  return `${letter}${n}`;
}

/** @param {CheckRecord} record @param {string|null} [category] */
export function addLoad(record, category = null) {
  const load = {
    id: freeId(record.loads, 'l'), name: '', category, form: null, magnitude: null, magnitude_end: null, position: null,
    length: null, whole_beam: false, source: '', removable: null, note: '', photos: [],
  };
  return { ...record, loads: [...record.loads, load] };
}

/** @param {CheckRecord} record @param {number} index */
export function removeLoad(record, index) {
  const id = record.loads[index].id;
  const photos = record.photos.map((/** @type {any} */ photo) => (photo.load === id ? { ...photo, load: null } : photo));
  const limits = record.limits.map((/** @type {any} */ sheet) => ({
    ...sheet, covers_loads: sheet.covers_loads.filter((/** @type {string} */ one) => one !== id),
  }));
  return { ...removeAt(record, `/loads/${index}`), photos, limits };
}

/** @param {CheckRecord} record */
export function addLimits(record) {
  const sheet = {
    id: freeId(record.limits, 's'), document: '', revision: '', issued_by: '', kind: null, basis: null, set: null, own: null,
    covers: null, covers_loads: [], span: null, span_rule: null, restraint: null, restraint_spacing: null, moment_at: null, entries: [],
  };
  return { ...record, limits: [...record.limits, sheet] };
}

/** @param {CheckRecord} record @param {number} sheet @param {string} criterion */
export function addEntry(record, sheet, criterion) {
  const path = `/limits/${sheet}/entries`;
  const entries = getAt(record, path);
  const entry = { id: freeId(entries, 'e'), criterion, value: null, support: null, zone: null, width: null, sag_under: null };
  return setAt(record, path, [...entries, entry]);
}

/** @param {CheckRecord} record */
export const addHinge = (record) => ({ ...record, hinges: [...record.hinges, { position: blankPosition() }] });
/** @param {CheckRecord} record */
export const addZone = (record) => setAt(record, '/section/zones', [
  ...record.section.zones, { position: blankPosition(), length: null, stiffness: null }]);

/** A look answer dates the finding; a new "something" needs someone to be told again. @param {CheckRecord} record @param {any} value @param {string} now */
export function afterLook(record, value, now) {
  const told = value === 'something' ? null : record.condition.told;
  return { ...record, found_at: now, condition: { ...record.condition, told } };
}

/** @type {CheckRecord} */
export const BLANK = {
  format: 'asfound-record', version: 1, id: '', created: '', changed: '', found_at: null, valid_until: null,
  found_by: { name: '', role: '', phone: '' },
  place: { site: '', member: '', drawing: '', revision: '', stage: '' },
  ends: { left: '', right: '' }, settings: { display: 'metric', phone: '' },
  spans: [blankSpan()], overhangs: { left: null, right: null },
  supports: [blankSupport('A'), blankSupport('B')], hinges: [],
  section: { identity: null, depth: null, stiffness: null, zones: [], note: '' },
  self_weight: { answer: null, mass: null }, permanent: { answer: null }, restraint: { answer: null, spacing: null },
  loads: [], limits: [],
  condition: {
    distress: { ends: null, midspan: null, underside: null }, distress_note: '',
    void: { answer: null, which: [], note: '' }, told: null,
  },
  photos: [], decision: null, notes: '',
};

const blankOwn = () => ({ permanent: '', permanent_favourable: '', leading: '', accompanying: '' });

/** Before an answer inside a position or a set of own factors stands, the whole of it must. @param {CheckRecord} record @param {string} path */
export function prepared(record, path) {
  const position = /^(.*\/position)\//.exec(path)?.[1];
  if (position && !getAt(record, position)) return setAt(record, position, blankPosition());
  const own = /^(.*\/own)\//.exec(path)?.[1];
  return own && !getAt(record, own) ? setAt(record, own, blankOwn()) : record;
}

/** What a choice writes. @param {string} path @param {string} id @param {boolean} [yesNo] */
export function choiceValue(path, id, yesNo) {
  if (id === 'null') return null;
  if (yesNo) return id === 'true';
  return /\/support$/.test(path) ? Number(id) : id;
}
