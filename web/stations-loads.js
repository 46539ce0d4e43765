// Which questions are asked of the loads: the permanent one first, then each that was seen?
import { addLoad, blankPosition, removeLoad } from './changes.js';
import { makers, positionFields } from './field-kinds.js';

/** @typedef {import('./types.js').Station} Station */
/** @typedef {import('./types.js').Vocabulary} Vocabulary */

/** @type {Record<string, string>} */
const DIMENSION = { point: 'force', line: 'line_load', moment: 'moment' };

/** @param {any} record @param {Vocabulary} vocabulary @returns {Station[]} */
export function loadStations(record, vocabulary) {
  const next = `/loads/${record.loads.length}`;
  const permanent = makers('Permanent load');
  const fields = [
    permanent.note('/permanent', 'What rests on the beam for good: floor or roof, wall above, other beams landing on it, finishes.'),
    permanent.choice('/permanent/answer', 'Answer', vocabulary.permanent_answers),
  ];
  if (record.permanent.answer === 'entered') {
    fields.push(permanent.action('/permanent', 'Add a permanent load', (now) => addLoad(now, 'permanent'), { go: next }));
  }
  const seen = record.loads.map((/** @type {any} */ _, /** @type {number} */ i) => loadStation(record, i, vocabulary));
  if (!seen.length) {
    const make = makers('Loads');
    seen.push({ path: '/loads', title: 'Loads', fields: [
      make.note('/loads', 'Everything that stands, hangs or lies on the beam now. One entry for each.'),
      make.action('/loads', 'Add a load', (now) => addLoad(now), { go: next }),
    ] });
  }
  return [{ path: '/permanent', title: 'Permanent load', fields }, ...seen];
}

/** @param {any} record @param {number} i @param {Vocabulary} vocabulary @returns {Station} */
function loadStation(record, i, vocabulary) {
  const load = record.loads[i];
  const path = `/loads/${i}`;
  const title = `Load ${i + 1}`;
  const make = makers(title);
  const line = load.form === 'line';
  const fields = [
    make.text(`${path}/name`, 'What it is'), make.choice(`${path}/category`, 'Category', vocabulary.categories),
    make.choice(`${path}/form`, 'How it acts', vocabulary.load_forms),
    make.number(`${path}/magnitude`, line ? 'Size per length' : 'Size', DIMENSION[load.form] ?? 'force', { help: load.form ? '' : 'Choose first how it acts.' }),
  ];
  if (line) fields.push(make.yesNo(`${path}/whole_beam`, 'Along the whole beam'));
  if (!(line && load.whole_beam)) fields.push(...positionFields(record, `${path}/position`, load.position ?? blankPosition(), make, { edges: true }));
  if (line && !load.whole_beam) fields.push(make.number(`${path}/length`, 'Length along the beam', 'length'));
  fields.push(make.yesNo(`${path}/removable`, 'Could someone take it away'), make.photo(load.id));
  if (line) fields.push(make.number(`${path}/magnitude_end`, 'Size per length at its right end', 'line_load', { extra: true, help: 'Leave empty where it is the same all along; otherwise the size above is at its left end.' }));
  fields.push(make.text(`${path}/source`, 'Same source as', { extra: true, help: 'Loads with the same words here are one unknown: they are heavy or light together.' }));
  fields.push(make.long(`${path}/note`, 'Note on the load', { extra: true }));
  fields.push(make.action('/loads', 'Add another load', (now) => addLoad(now), { go: `/loads/${record.loads.length}` }));
  fields.push(make.action(path, 'Remove this load', (now) => removeLoad(now, i), { name: `Remove load ${i + 1}`, removes: true, go: '/permanent' }));
  return { path, title: load.name ? `${title}: ${load.name}` : title, fields };
}
