// Does typing stay a draft until it is entered, and do the pad's keys write what they show?
import assert from 'node:assert/strict';
import { test } from 'node:test';
import { differs, draftOf, quantityOf, typed, withUnit } from '../drafts.js';

test('a half typed number differs from the entered one, its own text does not', () => {
  const entered = { text: '12', unit: 'kN', value: 12000 };
  assert.equal(differs({ text: '1', unit: 'kN' }, entered), true);
  assert.equal(differs(draftOf(entered, 'kN'), entered), false);
  assert.equal(differs({ text: '', unit: 'kN' }, entered), true);
  assert.equal(differs({ text: '', unit: 'kN' }, null), false);
  assert.equal(differs(undefined, entered), false);
});

test('a number that brought its own unit takes the unit printed in the field when it is typed anew', () => {
  const entered = { text: '5.40 m', unit: '' };
  assert.equal(draftOf(entered, 'm').unit, 'm');
  assert.equal(differs(draftOf(entered, 'm'), entered), false);
});

test('a changed unit or way of knowing counts as typing', () => {
  const entered = { text: '12', unit: 'kN', means: 'tape' };
  assert.equal(differs({ text: '12', unit: 't', means: 'tape' }, entered), true);
  assert.equal(differs({ text: '12', unit: 'kN', means: 'stated', low: '11', high: '13' }, entered), true);
});

test('the page never writes a value, and an emptied field is no answer', () => {
  assert.equal('value' in /** @type {any} */ (quantityOf(draftOf({ text: '3', unit: 'm', value: 3 }, 'm'))), false);
  assert.equal(quantityOf({ text: '  ', unit: 'm' }), null);
  assert.deepEqual(quantityOf({ text: ' 5.6 ', unit: 'm', means: 'stated', low: '5.5', high: '5.7' }), { text: '5.6', unit: 'm', means: 'stated', low: '5.5', high: '5.7' });
});

test('low and high go when they are no longer the way it is known', () => {
  assert.deepEqual(quantityOf({ text: '5', unit: 'm', means: 'tape', low: '4', high: '6' }), { text: '5', unit: 'm', means: 'tape' });
});

test('a unit key takes the place of a unit that stands there, and only of that', () => {
  const units = ['m', 'mm', 'cm'];
  assert.equal(withUnit('5.62', 'm', units), '5.62 m');
  assert.equal(withUnit('5.62 m', 'mm', units), '5.62 mm');
  assert.equal(withUnit('5.62 mm', 'm', units), '5.62 m');
  assert.equal(withUnit('5.62mm ', 'cm', units), '5.62 cm');
  assert.equal(withUnit('', 'm', units), 'm');
});

test('keys write at the caret and over a selection; backspace takes one away', () => {
  assert.deepEqual(typed('52', 1, 1, '.'), { text: '5.2', caret: 2 });
  assert.deepEqual(typed('5.62', 0, 4, '7'), { text: '7', caret: 1 });
  assert.deepEqual(typed('5.62', 4, 4, 'Backspace'), { text: '5.6', caret: 3 });
  assert.deepEqual(typed('5', 0, 0, 'Backspace'), { text: '5', caret: 0 });
  assert.equal(typed('1'.repeat(40), 40, 40, '1').text.length, 40);
});
