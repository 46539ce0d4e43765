// Does a touch select what lies under it, and ask when two things do?
import assert from 'node:assert/strict';
import { test } from 'node:test';
import { REACH, within } from '../picking.js';

const POINTS = [{ x: 0, y: 0, name: 'A' }, { x: 40, y: 0, name: 'load' }, { x: 300, y: 0, name: 'B' }];
const named = (/** @type {number} */ x, /** @type {number} */ y) => within(POINTS, x, y).map((point) => point.name);

test('the reach is that of the design: 32 pixels', () => assert.equal(REACH, 32));
test('one thing within reach is meant', () => assert.deepEqual(named(290, 10), ['B']));
test('two within reach are both offered, the nearest first', () => assert.deepEqual(named(25, 0), ['load', 'A']));
test('nothing within reach selects nothing', () => assert.deepEqual(named(150, 150), []));
test('exactly at the reach still counts, a hair beyond does not', () => {
  assert.deepEqual(named(300, 32), ['B']);
  assert.deepEqual(named(300, 32.001), []);
});
