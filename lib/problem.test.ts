import { describe, expect, it } from 'vitest';
import { Problem, presentProblem } from './problem';

describe('problem', () => {
  it('says what happened, what was kept and what to do, with its values filled in', () => {
    expect(presentProblem(new Problem('too-many-attempts', { minutes: 15 }))).toEqual({
      code: 'too-many-attempts',
      status: 429,
      title: 'Too many sign-in attempts.',
      detail: 'Your account is unchanged. Wait 15 minutes and try again.',
      fields: {},
    });
  });

  it('carries what is wrong with each field', () => {
    const view = presentProblem(new Problem('invalid-input', {}, { rateGPerM2: 'The rate cannot be negative.' }));
    expect(view.status).toBe(400);
    expect(view.fields).toEqual({ rateGPerM2: 'The rate cannot be negative.' });
  });
});
