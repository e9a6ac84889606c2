import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { type BrineContent, strengthAt } from './brine-content';
import { BrineChart } from './brine-chart';
import { brineFrame, brineLabels, brineScales } from './brine-scales';
import { placeLabels } from './place-labels';

afterEach(cleanup);

const at = Date.UTC(2026, 11, 1, 3, 10);
const iceBranch = [0, 5, 10, 15, 20, 23.3].map((percent, index) => ({
  massFraction: percent / 100,
  tempC: [0, -3.05, -6.56, -10.89, -16.46, -21.1][index] ?? 0,
}));

function content(pavementTempC: number, massFraction: number | null): BrineContent {
  const state = (shift: number) => ({
    at: at + shift * 60_000,
    massFraction: (massFraction ?? 0.1) - shift / 3000,
    tempC: pavementTempC,
  });
  return {
    saltName: 'sodium chloride',
    iceBranch,
    saltBranch: [],
    pavementTempC,
    pavementAt: at,
    promisedMassFraction: massFraction === null ? null : 0.014,
    now: massFraction === null ? null : state(0),
    past: [state(-30)],
    future: [state(30)],
  };
}

const words = {
  pavement: 'pavement −6.2 °C at 04:10',
  refreezes: 'refreezes at 9.6 %',
  promise: 'promise kept from 1.4 %',
  brine: 'all brine',
  ice: 'ice + brine',
};

describe('the strength at which a brine freezes', () => {
  it('lies on the straight line between two points of the curve', () => {
    expect(strengthAt(iceBranch, -6.56)).toBeCloseTo(0.1, 9);
    expect(strengthAt(iceBranch, -4.805)).toBeCloseTo(0.075, 3);
  });

  it('is none above 0 °C and below the eutectic', () => {
    expect(strengthAt(iceBranch, 0.5)).toBeNull();
    expect(strengthAt(iceBranch, -21.2)).toBeNull();
  });
});

describe('labels', () => {
  it('never cover one another, whatever the pavement and the brine', () => {
    for (const widthPx of [280, 400, 560]) {
      for (let tempC = 1; tempC > -24; tempC -= 0.7) {
        for (const massFraction of [0.005, 0.06, 0.12, 0.22]) {
          const frame = brineFrame(widthPx, 172);
          const one = content(tempC, massFraction);
          const placed = brineLabels(one, words, { frame, scales: brineScales(one, frame, 'metric') });
          for (const [index, a] of placed.entries()) {
            for (const b of placed.slice(index + 1)) {
              const isApart =
                a.x + a.width <= b.x || b.x + b.width <= a.x || a.y + a.height <= b.y || b.y + b.height <= a.y;
              expect(isApart, `${a.key} and ${b.key} at ${tempC} °C, ${massFraction}, ${widthPx} px`).toBe(true);
            }
          }
          expect(placed.map((label) => label.key)).toContain('pavement');
        }
      }
    }
  });

  it('one for which no place is free is left out', () => {
    const frame = { x: 0, y: 0, width: 100, height: 20 };
    const label = (key: string) => ({ key, widthPx: 80, heightPx: 15, candidates: [{ x: 5, y: 2 }] });
    expect(placeLabels([label('first'), label('second')], frame).map((placed) => placed.key)).toEqual(['first']);
    expect(placeLabels([label('first')], frame, [{ x: 50, y: 0, width: 4, height: 20 }])).toEqual([]);
  });
});

describe('the chart', () => {
  it('has a table of the same figures in order of time', () => {
    render(<BrineChart content={content(-6.56, 0.12)} zone="Europe/Oslo" />);
    const table = screen.getByRole('table', { name: /freezing curve of sodium chloride/ });
    expect(
      within(table)
        .getAllByRole('rowheader')
        .map((head) => head.textContent),
    ).toEqual(['Tue 03:40', 'Tue 04:10', 'Tue 04:40']);
    expect(within(table).getAllByRole('row')[2]?.textContent).toContain('12.0');
  });

  it('is drawn for a road without brine too', () => {
    render(<BrineChart content={content(-3, null)} zone="UTC" />);
    expect(screen.getAllByRole('row')).toHaveLength(3);
  });
});
