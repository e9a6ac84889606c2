import { type Metadata } from 'next';
import { listPeople } from '@/db/queries/people';
import { requirePage } from '@/lib/server/page';
import { PeopleScreen } from './people-screen';

export const metadata: Metadata = { title: 'People' };

export default async function PeoplePage() {
  const actor = await requirePage('setup.people');
  const people = await listPeople();
  const listed = people.map(({ id, name, email, role, isDisabled }) => ({ id, name, email, role, isDisabled }));
  return <PeopleScreen people={listed} ownId={actor.id} />;
}
