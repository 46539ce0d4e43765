// Does an export come back whole, and does a file from a stranger stay harmless?
import assert from 'node:assert/strict';
import { test } from 'node:test';
import { BundleError, packBundle, planImport, unpackBundle } from '../bundle.js';
import { BLANK } from '../changes.js';
import { strToU8, zipSync } from '../vendor/fflate.js';

const entry = (/** @type {string} */ id, notes = '') => ({ id, record: { ...structuredClone(BLANK), id, notes }, seq: 3, exported: null, deleted: null });
const NOW = '2026-01-01T00:00:00+00:00';
// SHA-256 of the three bytes "abc": FIPS 180-2, appendix B.1.
const ABC = 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad';

test('records and photos come back as they went out', async () => {
  const packed = packBundle([entry('one', 'ä'), entry('two')], new Map([[ABC, strToU8('abc')]]), NOW);
  const { records, photos, refused } = await unpackBundle(packed);
  assert.deepEqual(records, [entry('one', 'ä').record, entry('two').record]);
  assert.deepEqual(photos.map((photo) => [photo.hash, [...photo.bytes]]), [[ABC, [97, 98, 99]]]);
  assert.deepEqual(refused, []);
});

test('a photo whose bytes are not those of its name is left out and said', async () => {
  const { photos, refused } = await unpackBundle(packBundle([], new Map([[ABC, strToU8('abd')]]), NOW));
  assert.equal(photos.length, 0);
  assert.equal(refused.length, 1);
});

test('a file that would unpack to far more than a photo is refused before it is unpacked', async () => {
  const bomb = zipSync({ 'records.json': new Uint8Array(60_000_000) });
  assert.ok(bomb.length < 100_000);
  await assert.rejects(unpackBundle(bomb), BundleError);
});

test('names that lead elsewhere are never read', async () => {
  const { photos } = await unpackBundle(zipSync({ 'records.json': strToU8('{"format":"asfound-records","records":[]}'), '../photos/x.jpg': strToU8('x'), 'photos/../../a.jpg': strToU8('x') }));
  assert.equal(photos.length, 0);
});

test('what is no export says so', async () => {
  for (const bytes of [strToU8('no zip'), new Uint8Array(0), zipSync({ 'other.txt': strToU8('x') }), zipSync({ 'records.json': strToU8('{') }), zipSync({ 'records.json': strToU8('[]') })]) {
    await assert.rejects(unpackBundle(bytes), BundleError);
  }
});

test('a check that is here already in other words is kept beside, never overwritten', () => {
  const stored = [entry('one', 'here, newer')];
  const plan = planImport(stored, [entry('one', 'from the file').record, entry('two').record], () => 'fresh');
  assert.deepEqual(plan.add.map((one) => [one.id, one.record.id]), [['fresh', 'fresh'], ['two', 'two']]);
  assert.equal(plan.beside, 1);
});

test('the same content in another order of writing is the same check', () => {
  const turned = Object.fromEntries(Object.entries(entry('one').record).reverse());
  assert.deepEqual(planImport([entry('one')], [turned], () => 'fresh'), { add: [], same: 1, beside: 0 });
});

test('the same check twice in one file comes in once', () => {
  assert.equal(planImport([], [entry('one').record, entry('one').record], () => 'fresh').add.length, 1);
});
