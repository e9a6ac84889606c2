import { z } from 'zod';

export const Health = z.object({ status: z.literal('ready') });
export type Health = z.infer<typeof Health>;
