import { existsSync } from 'node:fs';

import { installPackage } from '../../server/bin/launch/debian.mjs';

/** The browser that the screens are tried in; Debian's package where it is missing. */
export const ensureChromium = () => {
  if (!existsSync(process.env.CHROMIUM ?? '/usr/bin/chromium')) installPackage('chromium', 'The browser tests need Chromium.');
};
