import { stopCluster, stopLeftOver } from './setup/cluster.mjs';
import { explain, say, Stop } from './setup/say.mjs';

try {
  const asked = (/** @type {string} */ flag) => process.argv.includes(flag);
  const outcome = asked('--left-over') ? await stopLeftOver() : await stopCluster({ evenIfUsed: asked('--force') });
  if (typeof outcome !== 'string') {
    throw new Stop(
      `The database is in use by ${outcome.usedBy.join(', ')}. Stop that first, or add --force: npm run db:stop -- --force`,
    );
  }
  say(`The database ${outcome === 'stopped' ? 'is stopped' : outcome}.`);
} catch (error) {
  process.exitCode = explain(error);
}
