// Which questions are asked of the place, the supports, the spans, the member and its look?
import { addHinge, addSpan, addZone, MAX_SPANS, removeSpan } from './changes.js';
import { makers, positionFields } from './field-kinds.js';
import { removeAt } from './pointer.js';

/** @typedef {import('./types.js').Station} Station */
/** @typedef {import('./types.js').Vocabulary} Vocabulary */

/** @returns {Station} */
export function whereStation() {
  const make = makers('Where');
  return { path: '/place', title: 'Where', fields: [
    make.note('/place', 'Stand facing the beam. Name both ends as anyone on site would: a grid line, a door, the street.'),
    make.text('/place/member', 'Member mark'), make.text('/ends/left', 'Left end'), make.text('/ends/right', 'Right end'),
    make.text('/place/site', 'Site and place'), make.text('/found_by/name', 'Found by'),
    make.text('/found_by/role', 'Role', { extra: true }), make.text('/found_by/phone', 'Phone of the finder', { extra: true }),
    make.text('/settings/phone', 'Phone to ring', { extra: true }),
    make.text('/place/drawing', 'Drawing', { extra: true }), make.text('/place/revision', 'Revision of the drawing', { extra: true }),
    make.text('/place/stage', 'Stage of the work', { extra: true }), make.long('/notes', 'Notes', { extra: true }),
  ] };
}

/** Support, span, support, ... from the left. @param {any} record @param {Vocabulary} vocabulary @returns {Station[]} */
export function beamStations(record, vocabulary) {
  /** @type {Station[]} */ const all = [];
  record.supports.forEach((/** @type {any} */ _, /** @type {number} */ i) => {
    all.push(supportStation(record, i, vocabulary));
    if (i < record.spans.length) all.push(spanStation(record, i, vocabulary));
  });
  return all;
}

/** @param {any} record @param {number} i @param {Vocabulary} vocabulary @returns {Station} */
function supportStation(record, i, vocabulary) {
  const support = record.supports[i];
  const title = `Support ${support.name || i + 1}`;
  const make = makers(title);
  const path = `/supports/${i}`;
  const atEnd = i === 0 || i === record.supports.length - 1;
  const kinds = vocabulary.support_kinds.filter((kind) => atEnd || kind.id !== 'free');
  const spring = support.kind === 'spring' ? [
    make.number(`${path}/stiffness`, 'Stiffness, downwards', 'spring'), make.number(`${path}/rotational`, 'Stiffness, turning', 'rotational_spring'),
  ] : [];
  const seated = support.kind === 'free' ? [] : [
    make.number(`${path}/bearing`, 'Bearing length', 'small_length'), ...spring,
    make.number(`${path}/bearing_drawn`, 'Bearing length on the drawing', 'small_length', { extra: true, means: null }),
    make.number(`${path}/settlement`, 'Settlement, downwards', 'small_length', { extra: true, means: 'settlement' }),
  ];
  return { path, title, fields: [
    make.choice(`${path}/kind`, 'Kind', kinds), ...seated,
    make.text(`${path}/name`, 'Name', { extra: true }), make.long(`${path}/note`, 'What is under it', { extra: true }),
  ] };
}

/** @param {any} record @param {number} i @param {Vocabulary} vocabulary @returns {Station} */
function spanStation(record, i, vocabulary) {
  const ends = `${record.supports[i].name || i + 1}–${record.supports[i + 1].name || i + 2}`;
  const title = `Span ${ends}`;
  const make = makers(title);
  const path = `/spans/${i}`;
  const span = record.spans[i];
  const label = span.measure === 'clear' ? 'Clear opening' : span.measure === 'centres' ? 'Centre to centre' : 'Length';
  const fields = [
    make.choice(`${path}/measure`, 'Measured how', vocabulary.measures), make.number(`${path}/length`, label, 'length'),
    make.number(`${path}/drawn`, 'Length on the drawing', 'length', { extra: true, means: null }),
  ];
  if (record.spans.length < MAX_SPANS) {
    fields.push(make.action(path, 'Add a span to the right', (now) => addSpan(now, i), { name: `Add a span to the right of ${ends}`, go: `/spans/${i + 1}` }));
  }
  if (record.spans.length > 1) {
    fields.push(make.action(path, 'Remove this span', (now) => removeSpan(now, i), { name: `Remove span ${ends}`, removes: true, go: '/spans/0' }));
  }
  return { path, title, fields };
}

/** @param {any} record @returns {Station} */
export function overhangStation(record) {
  const make = makers('Overhangs');
  const first = record.supports[0].name || 'first support';
  const last = record.supports[record.supports.length - 1].name || 'last support';
  return { path: '/overhangs', title: 'Overhangs', fields: [
    make.note('/overhangs', 'How far the beam runs on beyond its outer supports. Leave empty where it stops there.'),
    make.number('/overhangs/left', `Beyond ${first}`, 'length'), make.number('/overhangs/right', `Beyond ${last}`, 'length'),
  ] };
}

/** @param {any} record @returns {Station} */
export function hingeStation(record) {
  const make = makers('Hinges');
  const fields = [make.note('/hinges', record.hinges.length ? 'Where the beam can turn between supports.' : 'A splice that can turn, or a dropped-in length. None entered.')];
  record.hinges.forEach((/** @type {any} */ hinge, /** @type {number} */ i) => {
    const path = `/hinges/${i}`;
    const inner = makers(`Hinge ${i + 1}`);
    fields.push(inner.heading(path, `Hinge ${i + 1}`), ...positionFields(record, `${path}/position`, hinge.position, inner));
    fields.push(inner.action(path, 'Remove this hinge', (now) => removeAt(now, path), { name: `Remove hinge ${i + 1}`, removes: true, go: '/hinges' }));
  });
  fields.push(make.action('/hinges', 'Add a hinge', addHinge, { go: '/hinges' }));
  return { path: '/hinges', title: 'Hinges', fields };
}

/** @param {any} record @param {Vocabulary} vocabulary @returns {Station} */
export function memberStation(record, vocabulary) {
  const make = makers('Member');
  const fields = [
    make.choice('/section/identity', 'Same as on the sheet', vocabulary.identity), make.number('/section/depth', 'Depth', 'small_length'),
    make.choice('/self_weight/answer', 'Self weight', vocabulary.self_weight_answers),
  ];
  if (record.self_weight.answer === 'entered') fields.push(make.number('/self_weight/mass', 'Self weight per length', 'mass_per_length'));
  fields.push(make.choice('/restraint/answer', 'Held against moving sideways', vocabulary.restraint_found));
  if (record.restraint.answer === 'spacing') fields.push(make.number('/restraint/spacing', 'Spacing of what holds it', 'length'));
  fields.push(make.number('/section/stiffness', 'Bending stiffness EI', 'bending_stiffness', { extra: true, help: 'May stay empty: sag is then not compared.' }));
  record.section.zones.forEach((/** @type {any} */ zone, /** @type {number} */ i) => {
    const path = `/section/zones/${i}`;
    const inner = makers(`Stretch ${i + 1} of the member`);
    fields.push(inner.heading(path, `Stretch ${i + 1} of other stiffness`, { extra: true }));
    fields.push(...positionFields(record, `${path}/position`, zone.position, inner, { extra: true }));
    fields.push(inner.number(`${path}/length`, 'Length', 'length', { extra: true }), inner.number(`${path}/stiffness`, 'Bending stiffness EI', 'bending_stiffness', { extra: true }));
    fields.push(inner.action(path, 'Remove this stretch', (now) => removeAt(now, path), { name: `Remove stretch ${i + 1}`, removes: true, extra: true, go: '/section' }));
  });
  fields.push(make.action('/section/zones', 'Add a stretch of other stiffness', addZone, { extra: true, go: '/section' }));
  fields.push(make.long('/section/note', 'Note on the member', { extra: true }));
  return { path: '/section', title: 'Member', fields };
}

/** @param {any} record @param {Vocabulary} vocabulary @returns {Station} */
export function lookStation(record, vocabulary) {
  const make = makers('Look');
  const places = vocabulary.distress_places.map((place) => make.choice(
    `/condition/distress/${place.id}`, place.label, vocabulary.distress_answers, { help: place.help }));
  const some = record.condition.void.answer === 'some'
    ? [make.many('/condition/void/which', 'Which of these', vocabulary.void_reasons), make.text('/condition/void/note', 'Note on what was found')] : [];
  return { path: '/condition', title: 'Look', fields: [
    make.note('/condition', 'Look from where you stand. Do not go on or under the beam to answer.'), ...places,
    make.text('/condition/distress_note', 'What was seen'),
    make.choice('/condition/void/answer', 'Anything the sheet does not allow', vocabulary.void_answers, { help: vocabulary.void_reasons.map((one) => one.label).join('; ') }),
    ...some, make.photo('', { extra: true }),
  ] };
}
