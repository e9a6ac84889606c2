'use server';

import { addPerson } from '@/db/commands/add-person';
import { changePerson } from '@/db/commands/change-person';
import { disablePerson } from '@/db/commands/disable-person';
import { setPersonPassword } from '@/db/commands/set-person-password';
import { AddPersonInput, ChangePersonInput, DisablePersonInput, SetPersonPasswordInput } from '@/lib/contracts/people';
import { action } from '@/lib/server/action';

const revalidate = ['/setup/people'];

export const addPersonAction = action(
  { action: 'setup.people', input: AddPersonInput, revalidate },
  ({ actor, input }) => addPerson({ input, by: actor.id, now: new Date() }),
);

export const changePersonAction = action(
  { action: 'setup.people', input: ChangePersonInput, revalidate },
  ({ actor, input }) => changePerson({ input, by: actor.id, now: new Date() }),
);

export const setPersonPasswordAction = action(
  { action: 'setup.people', input: SetPersonPasswordInput, revalidate },
  ({ actor, input }) => setPersonPassword({ input, by: actor.id, now: new Date() }),
);

export const disablePersonAction = action(
  { action: 'setup.people', input: DisablePersonInput, revalidate },
  ({ actor, input }) => disablePerson({ input, by: actor.id, now: new Date() }),
);
