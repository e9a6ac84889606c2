import { type ZodError } from 'zod';
import { translateDatabaseError } from '@/db/errors';
import { Problem, presentProblem, type ProblemView } from '@/lib/problem';
import { logUnexpected } from './log';

/** A sentence for each field that failed, keyed by its path. */
export function invalidInput(error: ZodError): Problem {
  const fields = Object.fromEntries(error.issues.map((issue) => [issue.path.join('.') || 'request', issue.message]));
  return new Problem('invalid-input', {}, fields);
}

/** Anything thrown, as what a person may see. */
export function viewOf(thrown: unknown, where: string): ProblemView {
  const error = translateDatabaseError(thrown);
  if (error instanceof Problem) return presentProblem(error);
  return presentProblem(new Problem('unexpected', { reference: logUnexpected(error, where) }));
}
