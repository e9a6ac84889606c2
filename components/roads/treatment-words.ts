export type TreatmentAction = 'nothing' | 'plough' | 'anti-ice' | 'pre-wet' | 'solid' | 'abrasives' | 'undecided';

export const actionWords: Readonly<Record<TreatmentAction, string>> = {
  nothing: 'Leave it',
  plough: 'Plough only',
  'anti-ice': 'Anti-ice with liquid',
  'pre-wet': 'Pre-wetted salt',
  solid: 'Dry salt',
  abrasives: 'Abrasives',
  undecided: 'Decide by hand',
};

/** What a plan says of a road. Rates are of product. */
export interface Treatment {
  readonly action: TreatmentAction;
  /** the plough goes before the spreader */
  readonly isPloughed: boolean;
  readonly materialName: string | null;
  readonly rateGPerM2: number | null;
  readonly rateMlPerM2: number | null;
  readonly reason: string;
  readonly isPublished: boolean;
  readonly passNumber: number;
}

export interface LastTreatment {
  readonly at: number;
  readonly outcome: 'spread' | 'ploughed' | 'skipped';
  readonly materialName: string | null;
  readonly rateGPerM2: number | null;
  readonly truckNumber: number;
}
