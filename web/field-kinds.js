// What is a field made of? Small makers that give every control its label and its one plain name.

/** @typedef {import('./types.js').Field} Field */
/** @typedef {import('./types.js').Option} Option */

/** @param {string} title of the station: the first half of every accessible name */
export function makers(title) {
  const base = (/** @type {Field['kind']} */ kind, /** @type {string} */ path, /** @type {string} */ label, /** @type {Partial<Field>} */ rest) =>
    /** @type {Field} */ ({ kind, path, label, name: `${title}, ${label.charAt(0).toLowerCase()}${label.slice(1)}`, ...rest });
  /** @typedef {(path:string, label:string, rest?:Partial<Field>) => Field} Maker */
  /** @type {Maker} */ const text = (path, label, rest = {}) => base('text', path, label, rest);
  /** @type {Maker} */ const long = (path, label, rest = {}) => base('long', path, label, rest);
  /** @param {string} path @param {string} label @param {string} dimension @param {Partial<Field>} [rest] */
  const number = (path, label, dimension, rest = {}) => base('number', path, label, { dimension, means: meansOf(dimension), ...rest });
  /** @param {string} path @param {string} label @param {Option[]} options @param {Partial<Field>} [rest] */
  const choice = (path, label, options, rest = {}) => base('choice', path, label, { options, ...rest });
  /** @param {string} path @param {string} label @param {Option[]} options @param {Partial<Field>} [rest] */
  const many = (path, label, options, rest = {}) => base('many', path, label, { options, ...rest });
  /** @param {string} path @param {string} label @param {Field['change']} change @param {Partial<Field>} [rest] */
  const action = (path, label, change, rest = {}) => /** @type {Field} */ ({ ...base('action', path, label, { change, ...rest }), name: rest.name ?? label });
  /** @param {string} path @param {string} label @param {Partial<Field>} [rest] */
  const yesNo = (path, label, rest = {}) => choice(path, label, YES_NO, { yesNo: true, ...rest });
  /** @type {Maker} */ const heading = (path, label, rest = {}) => base('heading', path, label, rest);
  /** @type {Maker} */ const note = (path, label, rest = {}) => base('note', path, label, rest);
  /** @param {string} load @param {Partial<Field>} [rest] */
  const photo = (load, rest = {}) => base('photo', '/photos', 'Photo', { load, ...rest });
  return { text, long, number, choice, many, action, yesNo, heading, note, photo };
}

/** @type {Option[]} */
const YES_NO = [{ id: 'true', label: 'Yes' }, { id: 'false', label: 'No' }];
/** Only the list's name is picked here; what a means says about a number is Python's. @type {Record<string, 'length'|'stiffness'>} */
const MEANS = { length: 'length', small_length: 'length', bending_stiffness: 'stiffness', spring: 'stiffness', rotational_spring: 'stiffness' };

/** @param {string} dimension */
const meansOf = (dimension) => MEANS[dimension] ?? 'load';

/** @param {string} text "id = label" pairs parted by | @returns {Option[]} */
export const options = (text) => text.split('|').map((pair) => {
  const [id = '', label = ''] = pair.split('=');
  return { id: id.trim(), label: label.trim() };
});

/** @param {any} record */
export const supportOptions = (record) => record.supports.map((/** @type {any} */ support, /** @type {number} */ i) => (
  { id: String(i), label: `Support ${support.name || i + 1}` }));

/**
 * The fields of a place on the beam, measured from a point that a tape can find.
 * @param {any} record @param {string} path of the position @param {any} position
 * @param {ReturnType<typeof makers>} make @param {{edges?:boolean, prefix?:string, extra?:boolean}} [how]
 */
export function positionFields(record, path, position, make, how = {}) {
  const rest = { extra: how.extra };
  const before = how.prefix ?? '';
  const label = (/** @type {string} */ words) => (before ? `${before}, ${words}` : words.charAt(0).toUpperCase() + words.slice(1));
  const fields = [make.choice(`${path}/from`, label('measured from'), fromOptions(record), rest)];
  if (position?.from === 'support') {
    fields.push(make.choice(`${path}/support`, label('from which support'), supportOptions(record), rest));
    fields.push(make.choice(`${path}/side`, label('towards'), options(`left=${record.ends.left || 'Left'}|right=${record.ends.right || 'Right'}`), rest));
    fields.push(make.choice(`${path}/at`, label('from its'), options('face=Face|centre=Centre'), rest));
  }
  if (how.edges) fields.push(make.choice(`${path}/to`, label('to its'), options('near_edge=Near edge|middle=Middle'), rest));
  fields.push(make.number(`${path}/distance`, label('distance'), 'length', rest));
  return fields;
}

/** @param {any} record */
const fromOptions = (record) => options(`left_end=Left end${named(record.ends.left)}|right_end=Right end${named(record.ends.right)}|support=A support`);
/** @param {string} name */
const named = (name) => (name ? ` (${name.replace(/[=|]/g, ' ')})` : '');
