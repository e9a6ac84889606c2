import { describe, expect, it } from 'vitest';
import { passToDecide, workOutRefusal, type PlanVersion, type StormContent } from './storm-content';

const hourMs = 3_600_000;
const pass = (number: number) => ({ number, startsAt: number * 3 * hourMs, untilAt: (number + 1) * 3 * hourMs });
const published = (passNumber: number): PlanVersion => ({
  id: passNumber,
  passNumber,
  version: passNumber,
  policyVersion: 1,
  workedOutAt: 0,
  workedOutByName: 'Una',
  publishedAt: 1,
  publishedByName: 'Una',
  inputs: null,
  summary: null,
});
const content: StormContent = {
  storm: {
    id: 1,
    number: 7,
    name: 'Snow',
    fromAt: 0,
    untilAt: 20 * hourMs,
    openedByName: 'Una',
    closedAt: null,
    passes: 3,
    publishedPlans: 0,
    newestPublishedPass: null,
    runs: 0,
  },
  passes: [pass(1), pass(2), pass(3)],
  plans: [],
  classes: [{ serviceClass: 'A', promise: 'bare', roads: 4, laneKm: 3 }],
  forecast: { source: 'test', issuedAt: 0, untilAt: 30 * hourMs },
  policyVersion: 1,
  currency: 'EUR',
  zone: 'UTC',
  nowAt: 0,
};

describe('which pass is to be decided', () => {
  it('the first without a published plan that is not over', () => {
    expect(passToDecide(content, 0)?.number).toBe(1);
    expect(passToDecide({ ...content, plans: [published(1)] }, 0)?.number).toBe(2);
    expect(passToDecide(content, 6 * hourMs)?.number).toBe(2);
    expect(passToDecide(content, 19 * hourMs)).toBeNull();
  });

  it('a pass says why it cannot be worked out', () => {
    expect(workOutRefusal(pass(1), content, 0)).toBeNull();
    expect(workOutRefusal(pass(1), content, 6 * hourMs - 60_000)).toBe('Pass 1 is over.');
    expect(workOutRefusal(pass(1), { ...content, forecast: null }, 0)).toBe('No forecast has come in yet.');
    expect(
      workOutRefusal(pass(3), { ...content, forecast: { source: '', issuedAt: 0, untilAt: hourMs } }, 0),
    ).toContain('ends before');
    const closed = { ...content, storm: { ...content.storm, closedAt: 1 } };
    expect(workOutRefusal(pass(1), closed, 0)).toBe('The storm is closed.');
  });
});
