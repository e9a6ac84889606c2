import { redirect } from 'next/navigation';
import { getActor } from '@/lib/server/session';

export default async function Home() {
  const actor = await getActor();
  if (!actor) redirect('/sign-in');
  redirect(actor.role === 'driver' ? '/cab' : '/roads');
}
