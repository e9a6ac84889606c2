/** An end that was foreseen: one message for the person, no stack. */
export class Stop extends Error {
  /**
   * @param {string} message
   * @param {number} [exitCode]
   */
  constructor(message, exitCode = 1) {
    super(message);
    this.exitCode = exitCode;
  }
}

/** @param {number} ms */
export const seconds = (ms) => `${(ms / 1000).toFixed(1)} s`;

/** @param {string} text */
export function say(text) {
  process.stdout.write(`${text}\n`);
}

/**
 * Runs one step and prints it with the time it took; a step that takes a while is named when it begins.
 * @template T
 * @param {string} title
 * @param {(note: (text: string) => void) => Promise<T> | T} work
 * @returns {Promise<T>}
 */
export async function step(title, work) {
  const beganAt = performance.now();
  let note = '';
  const announce = setTimeout(() => say(`  … ${title}`), 400);
  try {
    const result = await work((text) => {
      note = ` — ${text}`;
    });
    say(`  ✓ ${title}${note} (${seconds(performance.now() - beganAt)})`);
    return result;
  } catch (error) {
    say(`  ✗ ${title} (${seconds(performance.now() - beganAt)})`);
    throw error;
  } finally {
    clearTimeout(announce);
  }
}

/**
 * @param {unknown} error
 * @returns {number} the exit code
 */
export function explain(error) {
  if (error instanceof Stop) {
    if (error.message) process.stderr.write(`\n${error.message}\n`);
    return error.exitCode;
  }
  process.stderr.write(`\n${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
  return 1;
}
