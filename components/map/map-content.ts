/** Latitude and longitude, degrees, WGS 84. */
export type LatLon = readonly [latDeg: number, lonDeg: number];

export interface MapSegment {
  readonly id: number;
  readonly name: string;
  readonly serviceClass: string;
  readonly lanes: number;
  readonly path: readonly LatLon[];
}

export type BaseFeatureKind = 'coast' | 'river' | 'lake' | 'contour' | 'town' | 'water-name';

/** What lies under the roads. A place (`town`, `water-name`) is a part of one point. */
export interface MapBaseFeature {
  readonly kind: BaseFeatureKind;
  readonly name: string;
  readonly parts: readonly (readonly LatLon[])[];
}

export interface MapTruck {
  readonly id: number;
  readonly number: number;
  readonly position: LatLon;
  /** In words: "Truck 4, last logged on Ridge Road at 02:31". */
  readonly label: string;
}
