// Can an older answer ever stand for a newer record?
import assert from 'node:assert/strict';
import { test } from 'node:test';
import { createChecking } from '../checking.js';

/** A solver whose answers are let go by hand. */
function heldSolver() {
  /** @type {{payload: any, resolve: (value: any) => void, reject: (error: Error) => void}[]} */ const asked = [];
  const ask = (/** @type {string} */ _, /** @type {any} */ payload) => new Promise((resolve, reject) => { asked.push({ payload, resolve, reject }); });
  return { asked, ask };
}
const settle = () => new Promise((resolve) => { setTimeout(resolve, 0); });

function started() {
  /** @type {string[]} */ const seen = [];
  const solver = heldSolver();
  const checking = createChecking({ ask: solver.ask, now: () => 'now', onAnswer: (seq, stage, result) => seen.push(`${seq} ${stage} ${result}`), onError: (seq, error) => seen.push(`${seq} error ${error.message}`) });
  return { seen, checking, asked: solver.asked };
}

test('the best estimate comes first, then the whole', async () => {
  const { seen, checking, asked } = started();
  checking.want(1, 'r1');
  asked[0]?.resolve('a'); await settle();
  asked[1]?.resolve('b'); await settle();
  assert.deepEqual(asked.map((one) => one.payload.stage), ['best', 'full']);
  assert.deepEqual(seen, ['1 best a', '1 full b']);
});

test('answers for an older record are dropped, and those between are never asked', async () => {
  const { seen, checking, asked } = started();
  checking.want(1, 'r1'); checking.want(2, 'r2'); checking.want(3, 'r3');
  asked[0]?.resolve('old'); await settle();
  asked[1]?.resolve('new'); await settle();
  assert.deepEqual(asked.map((one) => one.payload.record), ['r1', 'r3', 'r3']);
  assert.deepEqual(seen, ['3 best new']);
});

test('a check that was closed says nothing more', async () => {
  const { seen, checking, asked } = started();
  checking.want(1, 'r1'); checking.forget();
  asked[0]?.resolve('late'); await settle();
  assert.deepEqual(seen, []);
});

test('after an error the next record is asked all the same', async () => {
  const { seen, checking, asked } = started();
  checking.want(1, 'r1');
  asked[0]?.reject(new Error('broke')); await settle();
  checking.want(2, 'r2');
  asked[1]?.resolve('fine'); await settle();
  assert.deepEqual(seen, ['1 error broke', '2 best fine']);
});

test('looking again at a later time asks only for the whole, and never pushes in front of a newer record', async () => {
  const { seen, checking, asked } = started();
  checking.again(4, 'r4');
  asked[0]?.resolve('lapsed'); await settle();
  assert.deepEqual(seen, ['4 full lapsed']);
  checking.want(5, 'r5'); checking.again(4, 'r4');
  asked[1]?.resolve('a'); await settle();
  assert.equal(asked[2]?.payload.record, 'r5');
});
