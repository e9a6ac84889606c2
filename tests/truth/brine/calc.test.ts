import { describe, expect, it } from 'vitest';
import { answerLine } from '../../../scripts/calc-answer';

const ask = (question: unknown) => answerLine(JSON.stringify(question));

describe('the pipe', () => {
  it('answers the two questions of its description', () => {
    expect(ask({ ask: 'freezing-point', solutes: [{ material: 'NaCl', massFraction: 0.1 }] })).toMatchObject({
      ok: true,
      freezingPointC: -6.6067,
      solid: 'ice',
    });
    expect(ask({ ask: 'mass-fraction-at', material: 'NaCl', tempC: -8 })).toEqual({ ok: true, massFraction: 0.11709 });
  });

  it('names the hydrate past the eutectic, and refuses what no water can hold', () => {
    const over = ask({ ask: 'freezing-point', solutes: [{ material: 'NaCl', massFraction: 0.25 }] });
    expect(over).toMatchObject({ ok: true, solid: 'NaCl·2H2O', freezingPointC: -8.418656 });
    const refused = ask({ ask: 'freezing-point', solutes: [{ material: 'NaCl', massFraction: 0.5 }] });
    expect(refused).toMatchObject({ ok: false, code: 'above-saturation', limitMassFraction: 0.264884 });
  });

  it('refuses below the eutectic with the limit and a sentence', () => {
    const refused = ask({ ask: 'mass-fraction-at', material: 'MgCl2', tempC: -40 });
    expect(refused).toEqual({
      ok: false,
      code: 'below-eutectic',
      reason: 'No MgCl2 brine is liquid below −33.20 °C, its eutectic.',
      limitC: -33.197241,
    });
  });

  it('answers blends by both methods', () => {
    const solutes = [
      { material: 'NaCl', massFraction: 0.2097 },
      { material: 'CaCl2', massFraction: 0.032 },
    ];
    expect(ask({ ask: 'blend-freezing-point', method: 'pitzer', solutes })).toMatchObject({
      ok: true,
      freezingPointC: -23.436416,
    });
    expect(ask({ ask: 'blend-freezing-point', method: 'zdanovskii', solutes })).toMatchObject({
      ok: true,
      freezingPointC: -23.473755,
    });
  });

  it('says in words what is wrong with a question, and never throws', () => {
    const lines = [
      '{',
      'null',
      '[]',
      '"x"',
      '{"ask":"what"}',
      '{"ask":"eutectic"}',
      '{"ask":"eutectic","material":"NaCl","more":1}',
    ];
    for (const line of lines) {
      const answer = answerLine(line);
      expect(answer, line).toMatchObject({ ok: false });
      expect(String(answer?.['reason']), line).toMatch(/^.{10,}\.$/);
    }
    expect(ask({ ask: 'freezing-point', solutes: [{ material: 'NaCl', massFraction: 10 }] })).toMatchObject({
      reason: 'solutes.0.massFraction: a mass fraction is below 1: 10 % is 0.1.',
    });
    expect(
      ask({
        ask: 'freezing-point',
        solutes: [
          { material: 'NaCl', massFraction: 0.5 },
          { material: 'KCl', massFraction: 0.5 },
        ],
      }),
    ).toMatchObject({
      code: 'bad-request',
    });
    expect(answerLine('')).toBeNull();
    expect(answerLine('   ')).toBeNull();
  });
});
