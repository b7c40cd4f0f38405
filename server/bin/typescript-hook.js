// Lets Node require the server's TypeScript; loaded with `node -r`. Needed in the main thread too:
// @swc/core loaded only in worker threads that restart has crashed the process.
const { readFileSync } = require('node:fs');
const { transformSync } = require('@swc/core');

require.extensions['.ts'] = (module, filename) => {
  const { code } = transformSync(readFileSync(filename, 'utf8'), { filename, configFile: `${__dirname}/../../.swcrc` });
  module._compile(code, filename);
};
