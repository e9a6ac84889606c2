export type ServiceClass = 'A' | 'B' | 'C' | 'D';
export type Surface = 'asphalt' | 'concrete' | 'open-graded';
export type Exposure = 'open' | 'sheltered' | 'shaded' | 'ridge' | 'shore';

export const routeNames = [
  'Quay and High Street',
  'Skail bridges',
  'Toll loop',
  'Ridge',
  'West shore',
  'Moss and Sound',
  'Brannoch town',
  'East shore',
] as const;
export type RouteName = (typeof routeNames)[number];
