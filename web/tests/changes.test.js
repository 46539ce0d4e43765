// Does the structure of a record stay whole when spans, loads and limits come and go?
import assert from 'node:assert/strict';
import { test } from 'node:test';
import { addEntry, addHinge, addLimits, addLoad, addSpan, afterLook, BLANK, choiceValue, isoWithZone, MAX_SPANS, newRecord, prepared, removeLoad, removeSpan } from '../changes.js';
import { setAt } from '../pointer.js';

const names = (/** @type {any} */ record) => record.supports.map((/** @type {any} */ one) => one.name).join('');

test('there is always one support more than spans', () => {
  let record = BLANK;
  for (let i = 0; i < 20; i += 1) {
    record = addSpan(record, i % record.spans.length);
    assert.equal(record.supports.length, record.spans.length + 1);
  }
  assert.equal(record.spans.length, MAX_SPANS);
  for (let i = 0; i < 20; i += 1) record = removeSpan(record, 0);
  assert.equal(record.spans.length, 1);
  assert.equal(names(record), 'AB');
});

test('supports are lettered from the left unless someone named them', () => {
  assert.equal(names(addSpan(addSpan(BLANK, 0), 0)), 'ABCD');
  const named = setAt(BLANK, '/supports/1/name', 'wall');
  assert.equal(names(addSpan(named, 0)), 'AwallB');
});

test('a load that is measured from a support still means the same support after a span is put in or taken out to its left', () => {
  let record = addSpan(BLANK, 0);
  record = setAt(addLoad(record), '/loads/0/position', { from: 'support', support: 2, side: 'left', at: 'face', to: 'middle', distance: null });
  record = setAt(record, '/supports/2/note', 'the one');
  for (const changed of [addSpan(record, 0), removeSpan(record, 0)]) {
    assert.equal(changed.supports[changed.loads[0].position.support].note, 'the one');
  }
});

test('adding and removing a span to the right gives the record back', () => {
  const record = setAt(addHinge(addSpan(BLANK, 0)), '/hinges/0/position/support', 1);
  assert.deepEqual(removeSpan(addSpan(record, 1), 1 + 1), record);
});

test('ids of loads and limits are never given twice while one is in use', () => {
  let record = addLoad(addLoad(addLoad(BLANK)));
  record = addLoad(removeLoad(record, 1));
  assert.equal(new Set(record.loads.map((/** @type {any} */ one) => one.id)).size, 3);
});

test('a removed load leaves its photo on the check and leaves the lists that named it', () => {
  let record = addLimits(addLoad(BLANK));
  record = setAt(record, '/limits/0/covers_loads', ['l1']);
  record = { ...record, photos: [{ hash: 'h', load: 'l1' }] };
  const without = removeLoad(record, 0);
  assert.deepEqual(without.limits[0].covers_loads, []);
  assert.deepEqual(without.photos, [{ hash: 'h', load: null }]);
});

test('nothing of a new check is answered beforehand', () => {
  const record = newRecord(null, { display: 'us', phone: '1', name: 'N' }, new Date());
  const answers = [record.spans[0].length, record.supports[0].kind, record.section.identity, record.permanent.answer, record.self_weight.answer, record.restraint.answer, record.condition.void.answer];
  assert.ok(answers.every((answer) => answer === null));
  const filled = addEntry(addLimits(addLoad(record)), 0, 'shear');
  assert.ok([filled.loads[0].category, filled.loads[0].form, filled.limits[0].basis, filled.limits[0].kind, filled.limits[0].covers, filled.limits[0].entries[0].value].every((answer) => answer === null));
});

test('before a part of a position is answered the whole position stands', () => {
  const record = prepared(addLoad(BLANK), '/loads/0/position/from');
  assert.deepEqual(Object.keys(record.loads[0].position).sort(), ['at', 'distance', 'from', 'side', 'support', 'to']);
});

test('a look answer dates the finding, and something new seen asks again who was told', () => {
  const told = setAt(BLANK, '/condition/told', { name: 'N', time: 't' });
  assert.equal(afterLook(told, 'none', 'now').found_at, 'now');
  assert.deepEqual(afterLook(told, 'none', 'now').condition.told, { name: 'N', time: 't' });
  assert.equal(afterLook(told, 'something', 'now').condition.told, null);
});

test('yes is true, every support is null, a support is its index, all else is its id', () => {
  assert.equal(choiceValue('/loads/0/removable', 'true', true), true);
  assert.equal(choiceValue('/limits/0/entries/0/support', 'null'), null);
  assert.equal(choiceValue('/loads/0/position/support', '2'), 2);
  assert.equal(choiceValue('/supports/0/kind', 'fixed'), 'fixed');
});

test('a written time is the same instant, with its zone', () => {
  const date = new Date('2026-03-29T11:22:33Z');
  const written = isoWithZone(date);
  assert.match(written, /^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d[+-]\d\d:\d\d$/);
  assert.equal(new Date(written).getTime(), date.getTime());
});
