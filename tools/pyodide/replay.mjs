// Does the shipped set answer every public call? Starts from the site's archives alone and replays pysolver's own example requests;
// an answer with an internal error, or any exception (a module that was not shipped), ends with exit code 1.
//
//   node replay.mjs SITE
import { main } from './main.mjs';
import { startShipped } from './shipped.mjs';

await main(async () => {
  const { python, openBridge } = await startShipped(process.argv[2]);
  const handle = openBridge(python);
  const [calls, examples] = JSON.parse(python.runPython(`
import json
import pysolver.bridge as bridge
json.dumps([list(getattr(bridge, "CALLS", ())), list(getattr(bridge, "examples", list)())])
`));
  const requests = ['{"call": "hello"}', '{"call": "self_check"}', ...examples];
  const problems = [];
  const called = new Set();
  for (const request of requests) {
    const { call } = JSON.parse(request);
    called.add(call);
    const answer = JSON.parse(handle(request));
    const expected = answer.ok || answer.error.kind === 'input';
    const must = call === 'hello' || call === 'self_check';
    if (!expected || (must && !answer.ok)) problems.push(`${call}: ${JSON.stringify(answer.error)}`);
  }
  for (const call of calls) if (!called.has(call)) problems.push(`${call}: pysolver.bridge.examples() has no request for it`);
  if (problems.length) {
    console.log(problems.join('\n'));
    return 1;
  }
  console.log(`${requests.length} requests answered`);
});
