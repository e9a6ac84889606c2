'use server';

import { changePassword } from '@/db/commands/change-password';
import { changePreferences } from '@/db/commands/change-preferences';
import { ChangePasswordInput, PreferencesInput } from '@/lib/contracts/account';
import { action } from '@/lib/server/action';

const own = async ({ actor }: { actor: { id: number } }) => ({ personId: actor.id });

export const savePreferences = action(
  { action: 'account.edit', input: PreferencesInput, subject: own },
  async ({ actor, input }) => {
    await changePreferences({ input, by: actor.id, now: new Date() });
    return input;
  },
);

export const savePassword = action(
  { action: 'account.edit', input: ChangePasswordInput, subject: own },
  async ({ actor, input }) => {
    await changePassword({ input, by: actor.id, now: new Date() });
    return { isChanged: true };
  },
);
