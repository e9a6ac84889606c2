import { interrupt } from './processes.mjs';
import { Stop } from './say.mjs';

/** Hears Ctrl-C, SIGTERM and a closed terminal: the first asks for an orderly end, the second insists. */
export function onStopSignal() {
  let isAsked = false;
  let insist = () => undefined;
  /** @type {(value?: unknown) => void} */
  let resolve = () => undefined;
  const promise = new Promise((done) => (resolve = done));
  let askedAt = 0;
  const hear = () => {
    // A terminal sends the signal to the whole group and npm passes it on once more: the echo is no second wish.
    if (isAsked && Date.now() - askedAt > 700) insist();
    if (isAsked) return;
    isAsked = true;
    askedAt = Date.now();
    interrupt();
    resolve();
  };
  const names = /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP']);
  for (const name of names) process.on(name, hear);
  // npm killed outright passes nothing on: whoever it had started would stay behind.
  const parent = process.ppid;
  const orphanWatch = setInterval(() => process.ppid !== parent && hear(), 1000);
  orphanWatch.unref();
  if (!process.env.npm_lifecycle_event) clearInterval(orphanWatch);
  // When the terminal is gone there is nobody to tell, and that must not end the orderly stop.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => undefined);
  return {
    promise,
    asked: () => isAsked,
    /** Ends the set-up between two steps. */
    check() {
      if (isAsked) throw new Stop('', 130);
    },
    /** @param {() => void} action */
    onInsist(action) {
      insist = () => void action();
    },
  };
}
