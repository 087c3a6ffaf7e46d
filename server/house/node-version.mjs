// Loaded before anything else, so it may use only what every Node since 12 understands.
const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
if (major < 20 || (major === 20 && minor < 19)) {
  console.error(`Featherbeam needs Node 20.19 or newer; this is Node ${process.versions.node}.`);
  process.exit(1);
}
