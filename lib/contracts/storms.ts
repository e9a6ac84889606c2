import { z } from 'zod';

const At = z.iso.datetime({ offset: true, error: 'Give a day and a time.' }).transform((text) => new Date(text));
const RowId = z.int().positive();
const hourMs = 3_600_000;

/** A storm lasts days, not weeks; a pass comes at most this often. */
export const stormLimits = { longestH: 240, mostPasses: 60, leastBetweenPassesMin: 20 } as const;

export const StormParams = z.object({ id: z.coerce.number().int().positive() });

export const OpenStormInput = z
  .strictObject({
    name: z.string().trim().min(1, 'A storm needs a name.').max(80, 'A name has at most 80 characters.'),
    fromAt: At,
    untilAt: At,
    /** when trucks leave, in order */
    passStartsAt: z
      .array(At)
      .min(1, 'A storm needs at least one pass.')
      .max(stormLimits.mostPasses, `A storm has at most ${stormLimits.mostPasses} passes.`),
  })
  .superRefine(({ fromAt, untilAt, passStartsAt }, context) => {
    const complain = (path: string, message: string) => context.addIssue({ code: 'custom', path: [path], message });
    const lastsMs = untilAt.getTime() - fromAt.getTime();
    if (lastsMs <= 0) complain('untilAt', 'A storm ends after it begins.');
    if (lastsMs > stormLimits.longestH * hourMs) complain('untilAt', 'A storm lasts at most ten days: check the day.');
    passStartsAt.forEach((startsAt, index) => {
      const before = passStartsAt[index - 1];
      if (startsAt >= untilAt) complain('passStartsAt', 'Every pass begins before the storm ends.');
      const gapMs = before ? startsAt.getTime() - before.getTime() : Infinity;
      if (gapMs < stormLimits.leastBetweenPassesMin * 60_000) {
        complain('passStartsAt', `Passes are at least ${stormLimits.leastBetweenPassesMin} minutes apart, in order.`);
      }
    });
  });
export type OpenStormInput = z.output<typeof OpenStormInput>;

export const CloseStormInput = z.strictObject({ stormId: RowId });
