// Are paths into a record those of RFC 6901, and does nothing else change when one place does?
import assert from 'node:assert/strict';
import { test } from 'node:test';
import { getAt, isUnder, parts, removeAt, setAt } from '../pointer.js';

// The document and the pointers of RFC 6901, section 5.
const DOCUMENT = { foo: ['bar', 'baz'], '': 0, 'a/b': 1, 'c%d': 2, 'e^f': 3, 'g|h': 4, 'i\\j': 5, 'k"l': 6, ' ': 7, 'm~n': 8 };
const POINTERS = /** @type {[string, any][]} */ ([['', DOCUMENT], ['/foo', ['bar', 'baz']], ['/foo/0', 'bar'], ['/', 0], ['/a~1b', 1], ['/c%d', 2], ['/e^f', 3],
  ['/g|h', 4], ['/i\\j', 5], ['/k"l', 6], ['/ ', 7], ['/m~0n', 8]]);

test('every example of RFC 6901 section 5 leads to its value', () => {
  for (const [pointer, value] of POINTERS) assert.deepEqual(getAt(DOCUMENT, pointer), value, pointer);
});

test('what was set is found, and the original is untouched', () => {
  const before = structuredClone(DOCUMENT);
  for (const [pointer] of POINTERS.slice(1)) assert.equal(getAt(setAt(DOCUMENT, pointer, 'new'), pointer), 'new', pointer);
  assert.deepEqual(DOCUMENT, before);
});

test('a path that leads nowhere gives undefined, also past a text or a null', () => {
  assert.equal(getAt({ a: null, b: 'text' }, '/a/x'), undefined);
  assert.equal(getAt({ b: 'text' }, '/b/length'), undefined);
  assert.equal(getAt({}, '/constructor'), undefined);
});

test('the prototype of objects can not be reached', () => {
  assert.throws(() => setAt({}, '/__proto__/polluted', true), RangeError);
  assert.equal(/** @type {any} */ ({}).polluted, undefined);
});

test('removing an element closes the gap', () => {
  assert.deepEqual(removeAt({ list: ['a', 'b', 'c'] }, '/list/1'), { list: ['a', 'c'] });
});

test('a path is under another only at a slash', () => {
  assert.equal(isUnder('/loads/1/name', '/loads/1'), true);
  assert.equal(isUnder('/loads/10', '/loads/1'), false);
  assert.deepEqual(parts('/loads/10'), ['loads', '10']);
});
