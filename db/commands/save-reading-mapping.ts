import { type SaveMappingInput } from '@/lib/contracts/readings';
import { Problem } from '@/lib/problem';
import { findStation } from '../queries/stations';
import { inTransaction, selectRows } from '../transaction';
import { recordAudit } from './audit';
import { type By } from './people-rules';

/** Remembers how a station's files are read, for the screen and for scripts. Answers since when it has been so. */
export async function saveReadingMapping({ input, by, now }: By<SaveMappingInput>): Promise<{ savedAt: string }> {
  const { stationId, mapping } = input;
  return inTransaction(async (tx) => {
    if (!(await findStation({ id: stationId }, tx))) throw new Problem('not-found', { what: 'station' });
    const [saved] = await selectRows<{ updatedAt: Date }>(
      `insert into station_mappings (station_id, mapping, updated_at, updated_by)
       values (:stationId, cast(:mapping as jsonb), :now, :by)
       on conflict (station_id) do update
          set mapping = excluded.mapping, updated_at = excluded.updated_at, updated_by = excluded.updated_by
        where station_mappings.mapping is distinct from excluded.mapping
       returning updated_at as "updatedAt"`,
      { stationId, mapping: JSON.stringify(mapping), now, by },
      tx,
    );
    if (saved) {
      await recordAudit(tx, {
        personId: by,
        action: 'setup.stations.mapping',
        subjectKind: 'station',
        subjectId: stationId,
        detail: { mapping },
      });
      return { savedAt: saved.updatedAt.toISOString() };
    }
    const [kept] = await selectRows<{ updatedAt: Date }>(
      'select updated_at as "updatedAt" from station_mappings where station_id = :stationId',
      { stationId },
      tx,
    );
    return { savedAt: (kept?.updatedAt ?? now).toISOString() };
  });
}
