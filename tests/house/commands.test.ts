import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { checkNodeVersion } from '../../scripts/setup/node-version.mjs';
import { anyFreePort, freePortFrom, isFree } from '../../scripts/setup/ports.mjs';
import { addCounts, countsOf, lastLine } from '../../scripts/setup/test-counts.mjs';
import { startOf, worksIn } from '../../scripts/setup/processes.mjs';
import { createServer } from 'node:net';

describe('the Node version', () => {
  it.each(['20.19.0', '20.20.2', '22.12.0', '23.0.0', '24.1.0'])('%s is served', (version) => {
    expect(checkNodeVersion(version)).toBe(version);
  });
  it.each(['18.20.4', '20.18.3', '21.7.0', '22.11.0'])('%s is refused in a sentence', (version) => {
    expect(() => checkNodeVersion(version)).toThrow(`This is Node ${version}.`);
  });
});

describe('the counts of a test run', () => {
  let folder = '';
  beforeEach(() => {
    folder = mkdtempSync(path.join(os.tmpdir(), 'counts-'));
    vi.spyOn(process.stdout, 'write').mockReturnValue(true);
  });
  afterEach(() => {
    vi.restoreAllMocks();
    rmSync(folder, { recursive: true });
  });
  const report = (testResults: unknown[], counts: Partial<Record<string, number>> = {}) => {
    const file = path.join(folder, 'report.json');
    const none = { numPassedTests: 0, numFailedTests: 0, numPendingTests: 0, numTodoTests: 0 };
    writeFileSync(file, JSON.stringify({ testResults, ...none, ...counts }));
    return file;
  };

  it('are those of the report', () => {
    const file = report([], { numPassedTests: 7, numFailedTests: 2, numPendingTests: 1, numTodoTests: 1 });
    expect(countsOf(file, 1)).toEqual({ passed: 7, failed: 2, skipped: 2 });
  });
  it('have a failure for a file that could not be loaded', () => {
    const broken = { name: 'a.test.ts', status: 'failed', assertionResults: [] };
    expect(countsOf(report([broken], { numPassedTests: 3 }), 1)).toEqual({ passed: 3, failed: 1, skipped: 0 });
  });
  it('do not count a file beside its own failed tests', () => {
    const file = { name: 'a.test.ts', status: 'failed', assertionResults: [{ status: 'failed' }] };
    expect(countsOf(report([file], { numFailedTests: 1 }), 1).failed).toBe(1);
  });
  it('have a failure when the run ended badly though no test failed', () => {
    expect(countsOf(report([], { numPassedTests: 3 }), 1).failed).toBe(1);
  });
  it('have a failure when there is no report at all', () => {
    expect(countsOf(path.join(folder, 'none.json'), 0).failed).toBe(1);
  });
  it('end in one plain line, which names what was skipped only when something was', () => {
    const sum = addCounts({ passed: 3, failed: 0, skipped: 0 }, { passed: 4, failed: 1, skipped: 0 });
    expect(lastLine(sum)).toBe('7 passed, 1 failed');
    expect(lastLine({ passed: 7, failed: 0, skipped: 2 })).toBe('7 passed, 0 failed, 2 skipped');
  });
});

describe('ports and processes', () => {
  it('a taken port is passed over for the next free one', async () => {
    const port = await anyFreePort();
    const holder = createServer();
    await new Promise<void>((resolve) => holder.listen(port, '127.0.0.1', resolve));
    try {
      expect(await isFree(port)).toBe(false);
      expect(await freePortFrom(port)).toBeGreaterThan(port);
    } finally {
      holder.close();
    }
  });
  it('a process that is no database server is never taken for one, wherever it works', () => {
    expect(startOf(process.pid)).toMatch(/^\d+$/);
    expect(worksIn(process.pid, process.cwd())).toBe(false);
  });
});
