import { z } from 'zod';

/** Bits of `flags`. */
export const roadFlags = { bridge: 1, tunnel: 2, sensitive: 4, oneWay: 8 } as const;

export const surfaces = ['asphalt', 'concrete', 'open-graded', 'gravel', 'paving'] as const;
export const exposures = ['open', 'sheltered', 'shaded', 'ridge', 'shore'] as const;

export const BaseFeatureKind = z.enum(['coast', 'river', 'lake', 'contour', 'town', 'water-name']);

/**
 * The network as columns, so that 5,000 roads are a few arrays: entry i of each is road i. Paths are encoded polylines
 * (1e-5 degrees; five digits a number at most), words are indexes into their lists.
 */
export const RoadMapView = z.object({
  version: z.string(),
  attribution: z.string(),
  ids: z.array(z.int()),
  names: z.array(z.string()),
  nameOf: z.array(z.int()),
  /** A, B, C or D a road */
  serviceClasses: z.string(),
  lanes: z.array(z.int()),
  lengthsM: z.array(z.number()),
  surfaceOf: z.array(z.int()),
  exposureOf: z.array(z.int()),
  flags: z.array(z.int()),
  paths: z.array(z.string()),
  baseFeatures: z.array(z.object({ kind: BaseFeatureKind, name: z.string(), parts: z.array(z.string()) })),
});
export type RoadMapView = z.output<typeof RoadMapView>;
