// Can any JSON that calls itself a record be drawn without the form falling over?
import assert from 'node:assert/strict';
import { test } from 'node:test';
import { addEntry, addHinge, addLimits, addLoad, addSpan, addZone, BLANK } from '../changes.js';
import { FIRST_WORDS } from '../first-words.js';
import { wholeRecord } from '../shape.js';
import { fieldAfter, stationOf, stations } from '../stations.js';

const FULL = { ...addZone(addHinge(addEntry(addLimits(addLoad(addSpan(BLANK, 0))), 0, 'sag'))), id: 'x' };

test('a whole record comes through unchanged', () => assert.deepEqual(wholeRecord(FULL), FULL));
test('what is no record is refused', () => {
  for (const value of [null, 3, 'text', [], {}, { format: 'asfound-record' }, { format: 'other', id: 'x' }]) assert.equal(wholeRecord(value), null);
});

test('whatever stands in any one place, the form can still be made', () => {
  const junk = [null, 0, true, 'text', [], [null], {}, { length: 3 }];
  for (const key of Object.keys(FULL)) {
    if (key === 'format' || key === 'id') continue;
    for (const value of junk) {
      const record = wholeRecord({ ...FULL, [key]: value });
      assert.ok(stations(record, FIRST_WORDS).length > 8, `${key} = ${JSON.stringify(value)}`);
    }
  }
});

test('texts and lists from a stranger are cut to a bearable size', () => {
  const record = wholeRecord({ ...FULL, notes: 'n'.repeat(1e6), loads: Array(1e4).fill({}) });
  assert.ok(record.notes.length < 1e4 && record.loads.length <= 2000);
});

test('every control has a name of its own', () => {
  const names = stations(FULL, FIRST_WORDS).flatMap((one) => one.fields).filter((field) => field.kind !== 'note' && field.kind !== 'heading').map((field) => field.name);
  assert.equal(new Set(names).size, names.length, names.filter((name, i) => names.indexOf(name) !== i).join('; '));
});

test('every field is found again by its path, as are paths below and above it', () => {
  const all = stations(FULL, FIRST_WORDS);
  for (const one of all) for (const field of one.fields) if (field.kind === 'number' || field.kind === 'choice') {
    assert.equal(stationOf(all, field.path).path, one.path, field.path);
    assert.equal(stationOf(all, `${field.path}/text`).path, one.path, field.path);
  }
  for (const [path, title] of [['/supports/1', 'Support B'], ['/spans/0/length', 'Span A–B'], ['/self_weight', 'Member'], ['/restraint/answer', 'Member'], ['/limits', 'Limits 1'],
    ['/condition/distress/ends', 'Look'], ['/loads/0/position/distance', 'Load 1'], ['/hinges/0/position', 'Hinges'], ['/ends/left', 'Where'], ['/found_at', 'Look']]) assert.equal(stationOf(all, path ?? '').title, title);
});

test('Next never leads to a button, a note, or what stands under More', () => {
  for (const one of stations(FULL, FIRST_WORDS)) for (const field of one.fields) {
    const next = fieldAfter(one, field.path);
    assert.ok(!next || (!next.extra && next.kind !== 'action' && next.kind !== 'note'));
  }
});
