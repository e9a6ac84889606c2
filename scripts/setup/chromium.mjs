import { accessSync, constants } from 'node:fs';
import { installDebianPackages } from './debian.mjs';
import { Stop } from './say.mjs';

const debian = '/usr/bin/chromium';

/** @param {string} file */
function canRun(file) {
  try {
    accessSync(file, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/** The browser that the browser tests drive; Debian's is installed where it is missing. */
export async function ensureChromium() {
  const wanted = process.env.CHROMIUM_PATH || debian;
  if (canRun(wanted)) return wanted;
  if (wanted !== debian) throw new Stop(`CHROMIUM_PATH is ${wanted}, and there is no program of that name.`, 3);
  await installDebianPackages(['chromium', 'fonts-liberation'], 'Chromium, which the browser tests drive,');
  if (!canRun(debian)) throw new Stop(`Debian's chromium was installed, but ${debian} is not there.`, 3);
  return debian;
}
