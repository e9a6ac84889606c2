import { z } from 'zod';

const At = z.union([z.date().transform((date) => date.toISOString()), z.string()]);

export const CrewView = z.object({
  trucks: z.array(
    z.object({
      truckId: z.int(),
      truckNumber: z.int(),
      truckName: z.string(),
      yardName: z.string(),
      runId: z.string().nullable(),
      driverName: z.string().nullable(),
      routeName: z.string().nullable(),
      startedAt: At.nullable(),
      roadsTotal: z.int(),
      roadsDone: z.int(),
      lastRoad: z.string().nullable(),
      lastLoggedAt: At.nullable(),
      lastLoadAt: At.nullable(),
    }),
  ),
  drivers: z.array(z.object({ id: z.int(), name: z.string(), outSince: At.nullable() })),
});
export type CrewView = z.output<typeof CrewView>;
