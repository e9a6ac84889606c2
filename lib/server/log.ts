import { env } from './env';

/** One line of JSON to standard output: what happened, how long it took, never what was typed. */
export function log(level: 'error' | 'info', message: string, fields: Record<string, unknown> = {}): void {
  const wanted = env().LOG_LEVEL;
  if (wanted === 'silent' || (wanted === 'error' && level === 'info')) return;
  process.stdout.write(`${JSON.stringify({ at: new Date().toISOString(), level, message, ...fields })}\n`);
}

/** Logs an unforeseen error under a reference that the person is shown. */
export function logUnexpected(error: unknown, where: string): string {
  const reference = Math.random().toString(36).slice(2, 8);
  const { message, stack } = error instanceof Error ? error : { message: String(error), stack: undefined };
  log('error', message, { where, reference, stack });
  return reference;
}
