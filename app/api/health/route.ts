import { checkDatabase } from '@/db/queries/health';
import { Health } from '@/lib/contracts/health';
import { handle } from '@/lib/server/handle';

export const dynamic = 'force-dynamic';

export const GET = handle({ action: 'public', reply: Health }, async () => {
  await checkDatabase();
  return { status: 'ready' as const };
});
