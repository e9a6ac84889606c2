import { afterEach, beforeEach, expect, vi } from 'vitest';

/** A `console.error` nobody expected fails the test that caused it. */
let spy: ReturnType<typeof vi.spyOn> | undefined;
beforeEach(() => {
  spy = vi.spyOn(console, 'error');
});
afterEach(() => {
  const calls = spy?.mock.calls ?? [];
  spy?.mockRestore();
  expect(calls, 'console.error was called').toEqual([]);
});
