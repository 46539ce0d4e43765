// Which questions are asked of a design sheet: what it limits, on which basis, for which beam?
import { addEntry, addLimits } from './changes.js';
import { makers, positionFields, supportOptions } from './field-kinds.js';
import { removeAt, setAt } from './pointer.js';

/** @typedef {import('./types.js').Station} Station */
/** @typedef {import('./types.js').Field} Field */
/** @typedef {import('./types.js').Vocabulary} Vocabulary */

/** Which unit list an entry's figure takes. @type {Record<string, string>} */
const DIMENSION = {
  sagging: 'moment', hogging: 'moment', shear: 'force', reaction: 'force', hold_down: 'force', sag: 'small_length', line_load: 'line_load', area_load: 'area_load',
};
/** @type {[string, string][]} */
const OWN = [['permanent', 'Factor, permanent'], ['permanent_favourable', 'Factor, permanent where it helps'], ['leading', 'Factor, leading variable'], ['accompanying', 'Factor, accompanying variable']];

/** @param {any} record @param {Vocabulary} vocabulary @returns {Station[]} */
export function limitStations(record, vocabulary) {
  const all = record.limits.map((/** @type {any} */ _, /** @type {number} */ i) => limitStation(record, i, vocabulary));
  if (all.length) return all;
  const make = makers('Limits');
  return [{ path: '/limits', title: 'Limits', fields: [
    make.note('/limits', 'What the designer allows, copied from a sheet, a label or a drawing note.'),
    make.action('/limits', 'Add a design sheet', addLimits, { go: '/limits/0' }),
  ] }];
}

/** @param {any} record @param {number} i @param {Vocabulary} vocabulary @returns {Station} */
function limitStation(record, i, vocabulary) {
  const sheet = record.limits[i];
  const path = `/limits/${i}`;
  const title = `Limits ${i + 1}`;
  const make = makers(title);
  const fields = [
    make.text(`${path}/document`, 'Document'), make.text(`${path}/revision`, 'Revision'), make.text(`${path}/issued_by`, 'Issued by'),
    make.choice(`${path}/kind`, 'Kind of figure', vocabulary.kinds), make.choice(`${path}/basis`, 'Basis', vocabulary.bases),
    ...setFields(sheet, path, make, vocabulary), ...coverFields(record, sheet, path, make, vocabulary),
    ...sheet.entries.flatMap((/** @type {any} */ _, /** @type {number} */ k) => entryFields(record, i, k, vocabulary)),
    make.heading(`${path}/entries`, sheet.entries.length ? 'Add a further limit' : 'Add each limit that the sheet gives', { pause: true }),
    ...vocabulary.criteria.map((criterion) => make.action(`${path}/entries`, `+ ${criterion.label}`,
      (now) => addEntry(now, i, criterion.id), { name: `${title}, add ${criterion.label.toLowerCase()}`, go: `${path}/entries/${sheet.entries.length}/value`, help: criterion.help })),
    ...issuedFor(sheet, path, make, vocabulary),
  ];
  fields.push(make.action('/limits', 'Add another design sheet', addLimits, { go: `/limits/${record.limits.length}` }));
  fields.push(make.action(path, 'Remove this sheet', (now) => removeAt(now, path), { name: `Remove ${title.toLowerCase()}`, removes: true, go: '/limits' }));
  return { path, title: sheet.document ? `${title}: ${sheet.document}` : title, fields };
}

/** @param {any} sheet @param {string} path @param {ReturnType<typeof makers>} make @param {Vocabulary} vocabulary @returns {Field[]} */
function setFields(sheet, path, make, vocabulary) {
  if (sheet.basis !== 'factored' && sheet.basis !== 'unfactored') return [];
  const fitting = vocabulary.sets.filter((set) => !set.basis || set.basis === sheet.basis || set.basis === 'both');
  const labelled = fitting.map((set) => ({ ...set, label: set.edition ? `${set.label}, ${set.edition}` : set.label,
    help: set.from_memory ? [set.help, 'Factors from memory: look them up.'].filter(Boolean).join(' ') : set.help }));
  const fields = [make.choice(`${path}/set`, 'Combination', labelled)];
  if (sheet.set === 'own') for (const [key, label] of OWN) fields.push(make.text(`${path}/own/${key}`, label));
  return fields;
}

/** @param {any} record @param {any} sheet @param {string} path @param {ReturnType<typeof makers>} make @param {Vocabulary} vocabulary @returns {Field[]} */
function coverFields(record, sheet, path, make, vocabulary) {
  const fields = [make.choice(`${path}/covers`, 'What it covers', vocabulary.covers)];
  if (sheet.covers === 'added') {
    const loads = record.loads.map((/** @type {any} */ load, /** @type {number} */ i) => ({ id: load.id, label: load.name || `Load ${i + 1}` }));
    fields.push(loads.length ? make.many(`${path}/covers_loads`, 'Which loads were added later', loads) : make.note(`${path}/covers_loads`, 'Enter the loads, then come back and mark those added later.'));
  }
  return fields;
}

/** @param {any} sheet @param {string} path @param {ReturnType<typeof makers>} make @param {Vocabulary} vocabulary @returns {Field[]} */
function issuedFor(sheet, path, make, vocabulary) {
  const fields = [
    make.heading(`${path}/issued`, 'The beam it was issued for'),
    make.number(`${path}/span`, 'Span it was issued for', 'length', { means: null }),
    make.choice(`${path}/span_rule`, 'Span counted as', vocabulary.span_rules),
    make.choice(`${path}/restraint`, 'Restraint it was issued for', vocabulary.restraints),
  ];
  if (sheet.restraint === 'spacing') fields.push(make.number(`${path}/restraint_spacing`, 'Restraint spacing it was issued for', 'length', { means: null }));
  fields.push(make.choice(`${path}/moment_at`, 'Moments at supports are taken at', vocabulary.moment_at));
  return fields;
}

/** @param {any} record @param {number} i @param {number} k @param {Vocabulary} vocabulary @returns {Field[]} */
function entryFields(record, i, k, vocabulary) {
  const entry = record.limits[i].entries[k];
  const path = `/limits/${i}/entries/${k}`;
  const same = record.limits[i].entries.filter((/** @type {any} */ one) => one.criterion === entry.criterion);
  const word = vocabulary.criteria.find((one) => one.id === entry.criterion)?.label ?? 'Limit';
  const label = same.length > 1 ? `${word} ${same.indexOf(entry) + 1}` : word;
  const make = makers(`Limits ${i + 1}, ${label.toLowerCase()}`);
  const fields = [make.heading(path, label), { ...make.number(`${path}/value`, label, DIMENSION[entry.criterion] ?? 'force', { means: null, sag: entry.criterion === 'sag' }), name: `Limits ${i + 1}, ${label.toLowerCase()}` }];
  if (entry.criterion === 'reaction' || entry.criterion === 'hold_down') {
    fields.push(make.choice(`${path}/support`, 'At', [{ id: 'null', label: 'Every support' }, ...supportOptions(record)]));
  }
  if (entry.criterion === 'area_load') fields.push(make.number(`${path}/width`, 'Width carried by this beam', 'length'));
  if (entry.criterion === 'sag') fields.push(make.choice(`${path}/sag_under`, 'Sag under', vocabulary.sag_under));
  fields.push(...zoneFields(record, path, entry, make));
  fields.push(make.action(path, `Remove ${label.toLowerCase()}`, (now) => removeAt(now, path), { name: `Limits ${i + 1}, remove ${label.toLowerCase()}`, removes: true, go: `/limits/${i}` }));
  return fields;
}

/** @param {any} record @param {string} path @param {any} entry @param {ReturnType<typeof makers>} make @returns {Field[]} */
function zoneFields(record, path, entry, make) {
  if (entry.criterion === 'reaction' || entry.criterion === 'hold_down') return [];
  const zone = `${path}/zone`;
  const name = make.heading(zone, '').name.replace(/, $/, '');
  if (!entry.zone) {
    const blank = { position: { from: null, support: null, side: null, at: null, to: null, distance: null }, length: null };
    return [make.action(zone, 'It holds only for a stretch', (now) => setAt(now, zone, blank), { name: `${name}, only for a stretch`, go: path })];
  }
  return [
    ...positionFields(record, `${zone}/position`, entry.zone.position, make, { prefix: 'Stretch' }), make.number(`${zone}/length`, 'Stretch, length', 'length', { means: null }),
    make.action(zone, 'It holds for the whole beam', (now) => setAt(now, zone, null), { name: `${name}, for the whole beam`, removes: true, go: path }),
  ];
}
