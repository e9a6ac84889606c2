import { Stop } from './say.mjs';

/** The range of package.json's `engines`, said in words before anything else can fail over it. */
export function checkNodeVersion(version = process.versions.node) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  const isServed = (major === 20 && minor >= 19) || (major === 22 && minor >= 12) || major > 22;
  if (!isServed)
    throw new Stop(`Rimewright needs Node 20.19 or later (20.x), or 22.12 or later. This is Node ${version}.`, 3);
  return version;
}
