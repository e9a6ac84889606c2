/** What must be said beside a rate, by code; `practice` of the trade and published warnings. */
export const cautionWords = {
  advice: 'Rates are advice. A qualified person decides.',
  'pavement-not-air': 'Check the pavement temperature, not the air.',
  'near-freezing': 'Near 0 °C a forecast error of a degree changes everything: the thermometer is not that good.',
  'below-limit': 'Salt will not work usefully in time; refreeze danger. Plough, abrasives or another chemical.',
  'liquid-rain': 'Liquid may wash off or freeze. Not advised.',
  'liquid-bonded': 'No liquid on bonded or packed snow.',
  'blowing-snow': 'Chemical may catch blowing snow and make ice that would not have formed.',
  'slippery-residue': 'Residue of calcium or magnesium chloride may be slippery without precipitation.',
  'residual-estimate': 'Salt counted as still on the road is an estimate, not a measurement.',
  'bridges-first': 'Bridges and shade freeze first.',
  'stale-reading': 'The newest reading is over 30 min old.',
  'no-reading': 'No current reading. Do not treat as clear.',
  'flagged-reading': 'A reading failed its checks: confirm it before using this rate.',
  'abrasive-dust': 'Abrasives melt nothing and are washed into drains: sweep up afterwards.',
  'sensitive-ground': 'Salt-sensitive ground: the material with the least chloride was taken.',
  'shorter-cycle': 'Holds only with the shorter cycle named.',
} as const;
export type Caution = keyof typeof cautionWords;
