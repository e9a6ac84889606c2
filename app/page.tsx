import { redirect } from 'next/navigation';
import { mayEver } from '@/lib/permissions';
import { getActor } from '@/lib/server/session';

export default async function Home() {
  const actor = await getActor();
  if (!actor) redirect('/sign-in');
  redirect(mayEver(actor.role, 'roads.view') ? '/roads' : '/cab');
}
