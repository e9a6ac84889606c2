import { ensureCluster, ensureDatabase } from './cluster.mjs';
import { explain } from './say.mjs';

// node scripts/setup/cluster-url.mjs [database]: starts the cluster of this checkout, leaves it running, prints the address
try {
  const name = process.argv[2] ?? 'rimewright';
  const server = await ensureCluster();
  await ensureDatabase(server, name);
  process.stdout.write(`${server.urlOf(name)}\n`);
} catch (error) {
  process.exitCode = explain(error);
}
