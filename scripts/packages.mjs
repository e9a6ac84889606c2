import { checkNodeVersion } from './setup/node-version.mjs';
import { ensurePackages } from './setup/packages.mjs';
import { explain, step } from './setup/say.mjs';

try {
  await step(`Node ${checkNodeVersion()}`, () => undefined);
  await step('Packages', async (note) => note(await ensurePackages()));
} catch (error) {
  process.exitCode = explain(error);
}
