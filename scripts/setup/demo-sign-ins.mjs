import { inData, readIfThere } from './place.mjs';
import { say } from './say.mjs';

const file = inData('demo-sign-ins.json');

/**
 * Whether the people of this database are the demo's: an agency's own must not be announced with its passwords.
 * @param {string} databaseUrl
 */
async function isDemo(databaseUrl) {
  const { default: pg } = await import('pg');
  const client = new pg.Client({ connectionString: databaseUrl, connectionTimeoutMillis: 5000 });
  client.on('error', () => undefined);
  try {
    await client.connect();
    const { rows } = await client.query('select is_demo from agency');
    return rows[0]?.is_demo === true;
  } catch {
    return false;
  } finally {
    await client.end().catch(() => undefined);
  }
}

/**
 * Prints one person of each role who can sign in to the demo. The seed wrote them down: the database keeps only hashes.
 * @param {string} databaseUrl
 */
export async function showDemoSignIns(databaseUrl) {
  const text = readIfThere(file);
  if (!text || !(await isDemo(databaseUrl))) return;
  /** @type {{ name: string, role: string, email: string, password: string }[]} */
  const people = JSON.parse(text);
  const firsts = people.filter(({ role }, index) => people.findIndex((other) => other.role === role) === index);
  const width = Math.max(...firsts.map(({ email }) => email.length));
  say('\n  Sign in to the demo as');
  for (const { email, role, name, password } of firsts) {
    say(`    ${email.padEnd(width)}  ${password}   ${role}, ${name}`);
  }
}
