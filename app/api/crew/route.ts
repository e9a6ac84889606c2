import { listCrew, listDrivers } from '@/db/queries/crew';
import { CrewView } from '@/lib/contracts/crew';
import { handle } from '@/lib/server/handle';

export const GET = handle({ action: 'crew.view', reply: CrewView }, async () => ({
  trucks: await listCrew(),
  drivers: await listDrivers(),
}));
