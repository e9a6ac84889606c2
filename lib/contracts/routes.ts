import { z } from 'zod';

const RowId = z.int().positive();

export const SaveRouteInput = z.strictObject({
  /** null makes a new route */
  id: RowId.nullable(),
  name: z.string().trim().min(1, 'A route needs a name.').max(80, 'A name has at most 80 characters.'),
  yardId: RowId,
  truckId: RowId.nullable(),
  segmentIds: z.array(RowId).min(1, 'A route needs at least one road.').max(2000, 'A route has at most 2,000 roads.'),
});
export type SaveRouteInput = z.output<typeof SaveRouteInput>;

export const RetireRouteInput = z.strictObject({ id: RowId });
