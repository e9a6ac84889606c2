export interface ListedYard {
  id: number;
  name: string;
  longitudeDeg: number;
  latitudeDeg: number;
  solidCapacityKg: number;
  brineCapacityL: number;
  isActive: boolean;
}

export interface ListedTruck {
  id: number;
  number: number;
  name: string;
  yardId: number;
  yardName: string;
  ploughWidthM: number | null;
  isActive: boolean;
}

export interface ListedSpreader {
  id: number;
  truckId: number;
  name: string;
  hopperKg: number;
  tankL: number;
  minRateGPerM2: number;
  maxRateGPerM2: number;
  maxLiquidRateMlPerM2: number | null;
  calibratedOn: string | null;
}

/** What the sheet beside the lists is about. */
export type FleetChoice =
  | { kind: 'yard'; id: number | null }
  | { kind: 'truck'; id: number | null }
  | { kind: 'spreader'; id: number | null; truckId: number | null };
