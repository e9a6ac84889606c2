/**
 * Every refusal a person can meet: its HTTP status, and what happened, what was kept, what to do.
 * `{name}` stands for a value of `details`.
 */
const problems = {
  'not-signed-in': {
    status: 401,
    happened: 'You are not signed in.',
    kept: 'Nothing was changed.',
    todo: 'Sign in and try again.',
  },
  'key-unknown': {
    status: 401,
    happened: 'This station key is not known, or it was revoked.',
    kept: 'Nothing was changed.',
    todo: 'Ask for a new key in Set-up, Stations.',
  },
  'not-allowed': {
    status: 403,
    happened: '{reason}',
    kept: 'Nothing was changed.',
    todo: 'Ask someone whose role allows it.',
  },
  'not-found': {
    status: 404,
    happened: 'There is no such {what}.',
    kept: 'Nothing was changed.',
    todo: 'Go back to the list and choose again.',
  },
  'invalid-input': {
    status: 400,
    happened: 'Some of what was sent cannot be used.',
    kept: 'Nothing was changed.',
    todo: 'Mend the fields named and send again.',
  },
  'too-large': {
    status: 413,
    happened: 'The file or request is larger than {limit}.',
    kept: 'Nothing was changed.',
    todo: 'Send it in smaller parts.',
  },
  'too-many-attempts': {
    status: 429,
    happened: 'Too many sign-in attempts.',
    kept: 'Your account is unchanged.',
    todo: 'Wait {minutes} minutes and try again.',
  },
  'already-exists': {
    status: 409,
    happened: 'There already is {what}.',
    kept: 'What was there before is unchanged.',
    todo: 'Choose another, or change the one that is there.',
  },
  'still-used': {
    status: 409,
    happened: 'It cannot be removed: {what} still uses it.',
    kept: 'Nothing was changed.',
    todo: 'Take it out of use instead.',
  },
  'out-of-range': {
    status: 422,
    happened: '{what} is outside what is possible.',
    kept: 'Nothing was changed.',
    todo: 'Check the value and its unit.',
  },
  'changed-meanwhile': {
    status: 409,
    happened: '{what} was changed by someone else meanwhile.',
    kept: 'Their change stands; yours was not saved.',
    todo: 'Look at it again, then repeat your change.',
  },
  'plan-published': {
    status: 409,
    happened: 'This plan is published and never changes.',
    kept: 'The published plan stands.',
    todo: 'Work the pass out again: that makes a new version.',
  },
  'never-changed': {
    status: 409,
    happened: 'Records of what was done are never changed or removed.',
    kept: 'The record stands.',
    todo: 'Add an amendment beside it.',
  },
  'not-possible-now': { status: 409, happened: '{reason}', kept: 'Nothing was changed.', todo: '{todo}' },
  busy: {
    status: 503,
    happened: 'The database is busy or just starting.',
    kept: 'Nothing was changed.',
    todo: 'Try again in a moment.',
  },
  'unreadable-file': { status: 422, happened: '{reason}', kept: 'Nothing was changed.', todo: '{todo}' },
  unexpected: {
    status: 500,
    happened: 'Something went wrong that should not have (reference {reference}).',
    kept: 'Nothing was half done.',
    todo: 'Try again; if it stays, give the reference to whoever runs this server.',
  },
} as const;

export type ProblemCode = keyof typeof problems;
export type ProblemDetails = Readonly<Record<string, string | number>>;
/** Name of a field → what is wrong with it, in a sentence. */
export type ProblemFields = Readonly<Record<string, string>>;

/** The one thing thrown on purpose. */
export class Problem extends Error {
  readonly code: ProblemCode;
  readonly details: ProblemDetails;
  readonly fields: ProblemFields;

  constructor(code: ProblemCode, details: ProblemDetails = {}, fields: ProblemFields = {}) {
    super(fill(problems[code].happened, details));
    this.name = 'Problem';
    this.code = code;
    this.details = details;
    this.fields = fields;
  }
}

/** A problem as it crosses the wire (RFC 9457, `application/problem+json`). */
export interface ProblemView {
  code: ProblemCode;
  status: number;
  /** what happened */
  title: string;
  /** what was kept, and what to do */
  detail: string;
  fields: ProblemFields;
}

/** What a server action answers. */
export type ActionResult<T> = { ok: true; data: T } | { ok: false; problem: ProblemView };

function fill(sentence: string, details: ProblemDetails): string {
  return sentence.replace(/\{(\w+)\}/g, (_, name: string) => String(details[name] ?? 'it'));
}

export function presentProblem(problem: Problem): ProblemView {
  const { status, kept, todo } = problems[problem.code];
  return {
    code: problem.code,
    status,
    title: problem.message,
    detail: `${fill(kept, problem.details)} ${fill(todo, problem.details)}`,
    fields: problem.fields,
  };
}
