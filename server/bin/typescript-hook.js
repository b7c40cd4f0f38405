// Lets Node require the server's TypeScript; loaded with `node -r`. Needed in the main thread too:
// @swc/core loaded only in worker threads that restart has crashed the process.
const { createHash } = require('node:crypto');
const { mkdirSync, readFileSync, renameSync, writeFileSync } = require('node:fs');
const { join } = require('node:path');
const { transformSync, version } = require('@swc/core');

const ROOT = join(__dirname, '../..');
const SETTINGS = readFileSync(join(ROOT, '.swcrc'), 'utf8');
/** What was once compiled is kept by its content, so that a command starts in a fraction of a second. */
const KEPT = join(ROOT, 'node_modules/.cache/typescript-hook');

const compile = (source, filename) => transformSync(source, { filename, configFile: join(ROOT, '.swcrc') }).code;

const readKept = (path) => {
  try {
    return readFileSync(path, 'utf8');
  } catch {
    return null;
  }
};

/** Written aside and renamed: another process may start at the same moment. A folder that may not be written costs only time. */
const keep = (path, code) => {
  try {
    mkdirSync(KEPT, { recursive: true });
    const aside = `${path}.${process.pid}.${process.hrtime.bigint()}`;
    writeFileSync(aside, code);
    renameSync(aside, path);
  } catch {
    // Compiled again next time.
  }
  return code;
};

require.extensions['.ts'] = (module, filename) => {
  const source = readFileSync(filename, 'utf8');
  const path = join(KEPT, `${createHash('sha256').update(`${version}\0${SETTINGS}\0${filename}\0${source}`).digest('hex')}.js`);
  module._compile(readKept(path) || keep(path, compile(source, filename)), filename);
};
