import './node-version.mjs';

const { ensureClient } = await import('./client-build.mjs');
const { ensureChromium, ensurePostgres } = await import('./debian.mjs');
const { live } = await import('./life.mjs');
const { ensurePackages } = await import('./packages.mjs');
const { run } = await import('./run.mjs');
const { ownEnv } = await import('./test-steps.mjs');

live(async () => {
  await ensurePackages();
  await ensurePostgres();
  await ensureChromium();
  await ensureClient();
  const program = ['--import', 'tsx', 'tests/bench/run.ts', ...process.argv.slice(2)];
  return (await run(process.execPath, program, { env: ownEnv(), show: true })).code;
});
