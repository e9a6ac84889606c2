import { existsSync, readdirSync } from 'node:fs';
import { installDebianPackages } from './debian.mjs';
import { Stop } from './say.mjs';

const oldest = 15;
const packages = ['postgresql-15', 'postgresql-15-postgis-3'];

const programFolder = (version) => `/usr/lib/postgresql/${version}/bin`;
const isComplete = (version) =>
  existsSync(`${programFolder(version)}/initdb`) &&
  existsSync(`/usr/share/postgresql/${version}/extension/postgis.control`);

function installedVersions() {
  if (!existsSync('/usr/lib/postgresql')) return [];
  return readdirSync('/usr/lib/postgresql')
    .map(Number)
    .filter((version) => version >= oldest && isComplete(version))
    .sort((a, b) => a - b);
}

/**
 * The folder of PostgreSQL's programs, with PostGIS beside them; installs them from Debian where they are missing.
 * @param {number | undefined} madeWith the version that made an existing data folder: only that one can read it
 * @returns {Promise<string>}
 */
export async function serverPrograms(madeWith) {
  if (process.platform !== 'linux') {
    throw new Stop(
      'The private database needs Linux. Elsewhere set DATABASE_URL to a PostgreSQL server with PostGIS.',
      3,
    );
  }
  const find = () => installedVersions().find((version) => madeWith === undefined || version === madeWith);
  let version = find();
  if (version === undefined && (madeWith === undefined || madeWith === 15)) {
    await installDebianPackages(packages, 'PostgreSQL 15 with PostGIS');
    version = find();
  }
  if (version === undefined) {
    throw new Stop(
      `PostgreSQL ${madeWith ?? 15} with PostGIS is not in ${programFolder(madeWith ?? 15)}. Please install it and start again.`,
      3,
    );
  }
  return programFolder(version);
}
