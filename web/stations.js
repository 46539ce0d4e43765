// Which things does one walk past in a check, from where one stands to the result? One list for the picture, the walk and "All fields".
import * as beam from './stations-beam.js';
import { limitStations } from './stations-limits.js';
import { loadStations } from './stations-loads.js';
import { isUnder } from './pointer.js';

/** @typedef {import('./types.js').Station} Station */
/** @typedef {import('./types.js').Field} Field */

export const RESULT = '/result';

/** Facts without a field of their own: answering the look dates the finding. @type {Record<string, string>} */
const ANSWERED_AT = { '/found_at': '/condition', '/valid_until': '/condition' };

/** @param {any} record @param {import('./types.js').Hello} words @returns {Station[]} */
export function stations(record, words) {
  const vocabulary = words.vocabulary;
  return [
    beam.whereStation(), ...beam.beamStations(record, vocabulary), beam.overhangStation(record), beam.hingeStation(record),
    beam.memberStation(record, vocabulary), ...limitStations(record, vocabulary), ...loadStations(record, vocabulary),
    beam.lookStation(record, vocabulary), { path: RESULT, title: 'Result', fields: [] },
  ];
}

/** Where a path of an error, a pick or a missing fact is answered. @param {Station[]} all @param {string} asked @returns {Station} */
export function stationOf(all, asked) {
  const path = ANSWERED_AT[asked] ?? asked;
  const exact = all.find((one) => one.path === path) ?? all.find((one) => one.fields.some((field) => field.path === path));
  if (exact) return exact;
  const inside = all.find((one) => one.path !== '/loads' && one.path !== '/limits' && isUnder(path, one.path))
    ?? all.find((one) => one.fields.some((field) => isUnder(path, field.path) && field.path !== '/photos'))
    ?? all.find((one) => one.fields.some((field) => isUnder(field.path, path)))
    ?? all.find((one) => isUnder(one.path, path));
  return inside ?? /** @type {Station} */ (all[0]);
}

/** @param {Station} station @param {string} path @returns {Field|undefined} the field an error or pick belongs to */
export function fieldOf(station, path) {
  return station.fields.find((field) => field.path === path)
    ?? station.fields.find((field) => field.kind !== 'action' && isUnder(path, field.path))
    ?? station.fields.find((field) => field.kind !== 'action' && isUnder(field.path, path));
}

/** What Next leads to: the next field that is neither a button nor under "More". @param {Station} station @param {string} path */
export function fieldAfter(station, path) {
  const at = station.fields.findIndex((field) => field.path === path);
  return station.fields.slice(at + 1).find((field) => field.pause || (['number', 'choice', 'text', 'many'].includes(field.kind) && !field.extra));
}
