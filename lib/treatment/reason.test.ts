import { describe, expect, it } from 'vitest';
import { plainFilm } from '../road/film';
import { chooseTreatment } from './choose-treatment';
import { defaultMaterials } from './default-materials';
import { defaultPolicy } from './policy';
import { reasonParts, reasonSentence, refusalSentence, type Wording } from './reason';

const metric: Wording = { zone: 'UTC', system: 'metric', startAt: Date.UTC(2026, 11, 1, 2, 40) };

describe('reasons in words', () => {
  it('a rate says water, temperature, until when, and what is lost', () => {
    const parts = [
      { kind: 'hold-water', waterMm: 0.18, tempC: -6.2, untilMin: 180 },
      { kind: 'loss', lossFraction: 0.22 },
    ] as const;
    expect(reasonSentence(parts, metric)).toBe(
      '0.18 mm of water to hold at −6.2 °C until 05:40; 22 % allowed for scatter and traffic.',
    );
    expect(reasonSentence(parts, { ...metric, system: 'us' })).toContain('0.007 in of water to hold at 20.8 °F');
  });

  it('a chosen treatment explains itself, the deciding part first', () => {
    const weather = {
      stepMin: 10,
      tempsC: Array.from({ length: 20 }, () => -3),
      precipitationMm: Array.from({ length: 20 }, () => 0.05),
      precipitationTypes: Array.from({ length: 20 }, () => 'snow' as const),
    };
    const input = {
      weather,
      untilMin: 90,
      promise: 'bare' as const,
      policy: defaultPolicy,
      materials: defaultMaterials,
    };
    const light = chooseTreatment({ ...input, film: plainFilm() });
    expect(reasonSentence(reasonParts(light, 90), metric)).toMatch(
      /^0\.\d\d mm of snow to keep loose at −3\.0 °C until 04:10; \d+ % allowed for scatter and traffic/,
    );
    const deep = { ...plainFilm({ frozenMm: 4 }), fellAsSnowMm: 4, sinceSnowMin: 0 };
    expect(reasonSentence(reasonParts(chooseTreatment({ ...input, film: deep }), 90), metric)).toContain(
      'plough first: 4.00 mm lie there, 0.30 mm stay',
    );
  });

  it('a refusal names the rate needed and the limit, or the temperature', () => {
    const over = { reason: 'over-policy-limit', neededRateGPerM2: 52, limit: 40 } as const;
    expect(refusalSentence(over, metric)).toBe('more than the policy allows: 52.0 g/m² needed, 40.0 g/m² at most');
    expect(refusalSentence({ reason: 'below-practical-limit', limit: -9.4 }, metric)).toBe(
      'too cold to work in time: its limit is −9.4 °C',
    );
  });
});
