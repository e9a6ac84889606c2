import { chmod, mkdir, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { parseArgs } from 'node:util';
import { closeDatabase } from '@/db/connection';
import { type DemoSignIn, isEmptyDatabase, seedDemo } from '@/db/seeds/demo';
import { seedMinimal } from '@/db/seeds/minimal';
import { Problem } from '@/lib/problem';

const usage = 'tsx scripts/seed.ts demo|minimal [--if-empty] [--now 2026-12-01T02:40:00Z]';
const root = path.dirname(path.dirname(fileURLToPath(import.meta.url)));
const signInsFile = path.join(root, '.data', 'demo-sign-ins.json');

/** The database keeps only hashes: who can sign in to the demo is written here, for its owner's eyes. */
async function keepSignIns(signIns: readonly DemoSignIn[]): Promise<void> {
  await mkdir(path.dirname(signInsFile), { recursive: true });
  await writeFile(signInsFile, `${JSON.stringify(signIns, null, 2)}\n`, { mode: 0o600 });
  // The mode above counts for a new file only.
  await chmod(signInsFile, 0o600);
}

function printSignIns(signIns: readonly DemoSignIn[]): void {
  const width = Math.max(...signIns.map(({ email }) => email.length));
  for (const { name, role, email } of signIns) console.log(`  ${email.padEnd(width)}  ${role.padEnd(13)}  ${name}`);
  console.log(`  Password for all of them: ${signIns[0]?.password ?? ''}`);
}

function timeFrom(text: string | undefined): Date {
  const now = text === undefined ? new Date() : new Date(text);
  if (Number.isNaN(now.getTime())) throw new RangeError(`--now must be an ISO time, not ${text}`);
  return now;
}

async function seed(which: string | undefined, now: Date): Promise<string> {
  if (which === 'minimal') {
    await seedMinimal({ now });
    return 'A yard, four roads and one person of each role; nobody can sign in.';
  }
  const { anchorAt, signIns } = await seedDemo({ now });
  await keepSignIns(signIns);
  printSignIns(signIns);
  return `the Isle of Skerrow as of ${anchorAt.toISOString()}`;
}

async function main(): Promise<string> {
  const { positionals, values } = parseArgs({
    allowPositionals: true,
    options: { 'if-empty': { type: 'boolean', default: false }, now: { type: 'string' } },
  });
  const [which] = positionals;
  if (which !== 'demo' && which !== 'minimal') throw new RangeError(`Usage: ${usage}`);
  if (await isEmptyDatabase()) return seed(which, timeFrom(values.now));
  if (values['if-empty']) return 'there already';
  throw new RangeError('This database is in use: seeds are for an empty one.');
}

try {
  console.log(await main());
} catch (error) {
  const isExpected = error instanceof RangeError || error instanceof Problem;
  console.error(isExpected ? error.message : error);
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
