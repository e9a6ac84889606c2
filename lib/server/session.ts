import 'server-only';
import { getServerSession } from 'next-auth';
import { cache } from 'react';
import { findPerson } from '@/db/queries/people';
import { type Actor } from '@/lib/permissions';
import { authOptions } from './auth';

export interface SignedIn extends Actor {
  email: string;
  unitSystem: 'metric' | 'us';
  theme: 'system' | 'dark' | 'light';
}

/** Who is asking, as the database says now; null when signed out, disabled, or signed in before a change of role. */
export const getActor = cache(async (): Promise<SignedIn | null> => {
  const session = await getServerSession(authOptions());
  if (!session?.personId) return null;
  const person = await findPerson({ id: session.personId });
  if (!person || person.isDisabled || person.sessionVersion !== session.sessionVersion) return null;
  const { id, name, role, email, unitSystem, theme } = person;
  return { id, name, role, email, unitSystem, theme };
});
