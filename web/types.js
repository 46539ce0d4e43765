// Which shapes do the page's parts hand to each other? Types only; nothing here runs.

/**
 * A written number of the record. `value` is written by Python only.
 * @typedef {{text:string, unit:string, means?:string, low?:string, high?:string, value?:number}} Quantity
 */
/** @typedef {{id:string, label:string, help?:string, basis?:string, edition?:string, from_memory?:boolean}} Option */
/** The record's own shape belongs to Python; the page reads it by path. @typedef {any} CheckRecord */
/** @typedef {Quantity & {at?:string}} Draft */
/**
 * @typedef {{id:string, record:CheckRecord, seq:number, exported:string|null, deleted:string|null, origin?:string}} Entry
 */
/**
 * One thing to answer.
 * @typedef {object} Field
 * @property {'text'|'long'|'number'|'choice'|'many'|'action'|'heading'|'note'|'photo'} kind
 * @property {string} path JSON pointer into the record
 * @property {string} label what stands beside the control
 * @property {string} name accessible name, unique on the page
 * @property {string} [dimension] of a number
 * @property {'length'|'load'|'stiffness'|'settlement'|null} [means] which list of "how measured" belongs to a number
 * @property {Option[]} [options] ids of yes/no questions are 'true' and 'false'
 * @property {boolean} [yesNo]
 * @property {boolean} [extra] stands under "More"
 * @property {boolean} [pause] Next stops at this heading: buttons stand below it
 * @property {boolean} [sag] a sag limit may be written as a part of the span, L/360
 * @property {string} [help]
 * @property {string} [load] id of the load a photo belongs to, '' for the whole check
 * @property {(record: CheckRecord) => CheckRecord} [change] of an action
 * @property {string} [go] where an action leads
 * @property {boolean} [removes]
 */
/** @typedef {{path:string, title:string, fields:Field[]}} Station */
/**
 * Every list of choices that Python sends.
 * @typedef {Record<'support_kinds'|'measures'|'means_length'|'means_load'|'categories'|'load_forms'|'criteria'|'kinds'|'bases'|'sets'|
 *   'covers'|'span_rules'|'restraints'|'restraint_found'|'moment_at'|'sag_under'|'identity'|'permanent_answers'|
 *   'self_weight_answers'|'distress_places'|'distress_answers'|'void_answers'|'void_reasons'|'decisions', Option[]> & Record<string, Option[]|undefined>} Vocabulary
 */
/**
 * The words and units that Python sends with `hello`.
 * @typedef {object} Hello
 * @property {Vocabulary} vocabulary
 * @property {Record<string, Record<string, {unit:string, keys:string[]}>>} units
 * @property {Record<string, string[]>} steps by which a distance can be moved
 * @property {any} [blank]
 * @property {Record<string,string>} [versions]
 * @property {string[]} [cautions]
 * @property {string[]} [not_compared]
 * @property {string[]} [limits_of_tool]
 */
/** The answer of `check`; see pysolver/check. @typedef {any} Result */
/**
 * @typedef {object} Preferences
 * @property {'metric'|'us'} display
 * @property {string} phone
 * @property {string} name
 * @property {'auto'|'paper'|'dark'|'sun'} light
 * @property {boolean} large
 * @property {'touch'|'always'|'never'} pad
 * @property {string|null} exported when everything was last exported
 */
export {};
