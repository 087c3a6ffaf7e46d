import './node-version.mjs';

const [{ live }, { launchProduct, interruptedCode }] = await Promise.all([
  import('./life.mjs'),
  import('./launch.mjs'),
]);
live(launchProduct, interruptedCode);
