import { selectRows } from '../transaction';

export async function checkDatabase(): Promise<void> {
  await selectRows('select 1 as one');
}
