import { loadLocalSettings } from './setup/environment.mjs';
import { checkNodeVersion } from './setup/node-version.mjs';
import { ensurePackages } from './setup/packages.mjs';
import { root } from './setup/place.mjs';
import { run } from './setup/processes.mjs';
import { openProductDatabase, prepareProductDatabase } from './setup/product-database.mjs';
import { explain, say, step } from './setup/say.mjs';

try {
  loadLocalSettings();
  await step(`Node ${checkNodeVersion()}`, () => undefined);
  await step('Packages', async (note) => note(await ensurePackages()));
  await prepareProductDatabase(await openProductDatabase());
  await step('Commit hooks', async (note) => {
    const done = await run(['git', 'config', 'core.hooksPath', 'scripts/hooks'], { cwd: root });
    note(done.code === 0 ? 'from scripts/hooks' : 'left alone: this folder is not a git checkout');
  });
  say('\nThe database stays running; `npm run db:stop` stops it.');
} catch (error) {
  process.exitCode = explain(error);
}
