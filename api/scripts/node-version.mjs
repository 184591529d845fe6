// Imported first by every entry, so that an old Node.js is told so before anything else can fail on it.
const OLDEST_MAJOR = 20;
const OLDEST_MINOR = 19;

const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);

if (major < OLDEST_MAJOR || (major === OLDEST_MAJOR && minor < OLDEST_MINOR)) {
  console.error(`Brimgate needs Node.js ${OLDEST_MAJOR}.${OLDEST_MINOR} or newer; this is ${process.versions.node}.`);
  process.exit(1);
}
