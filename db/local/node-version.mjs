/* Imported before anything else, so that an old Node gets a sentence instead of a stack trace. */
const NEEDED = [20, 19];

const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);

if (major < NEEDED[0] || (major === NEEDED[0] && minor < NEEDED[1])) {
  process.stderr.write(
    `Tepidarium needs Node ${NEEDED.join('.')} or newer; this is Node ${process.versions.node}. Install a newer Node, then try again.\n`,
  );
  process.exit(1);
}
