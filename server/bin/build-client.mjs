import { ensureClient } from './launch/client-build.mjs';
import { ensurePackages } from './launch/npm-packages.mjs';
import { Halt } from './launch/say.mjs';

try {
  await ensurePackages();
  await ensureClient();
} catch (error) {
  console.error(error instanceof Halt ? error.message : error);
  process.exit(1);
}
