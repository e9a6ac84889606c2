import { describe, expect, it } from 'vitest';
import { assessBrine } from './assess-brine';
import { curveOf } from './curves';
import { writeFormula } from './solid-name';

const question = { salt: 'NaCl', by: 'strength', strength: 0.1, sg: 1.17, brineC: 15.56 } as const;

describe('a brine on the bench', () => {
  it('freezes at −6.6 °C at 10 %, with ice first and nothing read', () => {
    const brine = assessBrine(question);
    expect(brine).toMatchObject({ ok: true, strengthError: 0, isPastEutectic: false, freezing: { solid: 'ice' } });
    expect(brine.ok && brine.freezing.freezingPointC).toBeCloseTo(-6.607, 2);
  });

  it('is 22.3 % and 84.5 degrees salometer when a hydrometer reads 1.170 at 60 °F', () => {
    const brine = assessBrine({ ...question, by: 'reading' });
    expect(brine.ok && brine.massFraction).toBeCloseTo(0.223, 3);
    expect(brine.ok && brine.salometer).toBeCloseTo(84.5, 1);
    expect(brine.ok && brine.strengthError).toBeGreaterThan(0);
  });

  it('is past the eutectic at 25 % and sheds dihydrate', () => {
    expect(assessBrine({ ...question, strength: 0.25 })).toMatchObject({
      ok: true,
      isPastEutectic: true,
      freezing: { solid: 'NaCl·2H2O' },
    });
  });

  it('is refused with the limit: too strong, lighter than water, read below the eutectic', () => {
    expect(assessBrine({ ...question, strength: 0.4 })).toMatchObject({ ok: false, reason: 'too-strong' });
    expect(assessBrine({ ...question, by: 'reading', sg: 0.9 })).toMatchObject({ ok: false, reason: 'below-water' });
    expect(assessBrine({ ...question, by: 'reading', brineC: -30 })).toMatchObject({
      ok: false,
      reason: 'reading-too-cold',
    });
  });
});

describe('the curves', () => {
  it('start at water, meet at the eutectic, and rise beyond it', () => {
    for (const salt of ['NaCl', 'CaCl2', 'MgCl2', 'KCl'] as const) {
      const { ice, salts, eutectic } = curveOf(salt);
      expect(ice[0]).toEqual({ massFraction: 0, tempC: 0 });
      expect(ice.at(-1)?.tempC).toBe(eutectic.tempC);
      expect(salts[0]).toEqual(ice.at(-1));
      expect(salts.at(-1)?.tempC).toBeGreaterThan(-1);
    }
  });

  it('write formulas with low digits but for the count of waters', () => {
    expect(writeFormula('MgCl2·12H2O')).toBe('MgCl₂\u202F\u22C5\u202F12H₂O');
  });
});
