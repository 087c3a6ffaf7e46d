import './node-version.mjs';

const [{ atEnd, end, live }, { wording, say }, { closingLine }, steps] = await Promise.all([
  import('./life.mjs'),
  import('./messages.mjs'),
  import('./test-report.mjs'),
  import('./test-steps.mjs'),
]);

const total = { passed: 0, failed: 0 };
let isFinished = false;

// The closing line comes last, whatever happened: an interrupted run has not passed.
atEnd(() => {
  if (!isFinished) total.failed += 1;
  say(closingLine(total));
});

live(async () => {
  try {
    const { names, rest } = steps.chosen(process.argv.slice(2));
    await steps.prepare(names);
    for (const name of names) {
      const { passed, failed } = await steps.take(name, rest);
      total.passed += passed;
      total.failed += failed;
    }
    isFinished = true;
  } catch (error) {
    console.error(wording(error));
  }
  return end(isFinished && total.failed === 0 && total.passed > 0 ? 0 : 1);
});
