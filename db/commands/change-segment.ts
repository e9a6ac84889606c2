import { type ChangeSegmentInput } from '@/lib/contracts/network';
import { classAssumption } from '@/lib/geo/assumed';
import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { inTransaction } from '../transaction';
import { recordAudit } from './audit';

/** Attributes of the form that a repeated import would otherwise overwrite. */
const kept = ['name', 'serviceClass', 'lanes', 'surface', 'exposure'] as const;

/** Changes one road by hand. What is changed is no longer assumed, and a repeated import of the file leaves it alone. */
export async function changeSegment(given: {
  input: ChangeSegmentInput;
  by: number;
  now: Date;
}): Promise<{ id: number }> {
  const { id, updatedAt, ...values } = given.input;
  return inTransaction(async (tx) => {
    const segment = await database().models.Segment.findByPk(id, { transaction: tx, lock: tx.LOCK.UPDATE });
    if (!segment || segment.retiredAt) throw new Problem('not-found', { what: 'road' });
    if (segment.updatedAt.toISOString() !== new Date(updatedAt).toISOString()) {
      throw new Problem('changed-meanwhile', { what: 'This road' });
    }
    const { name, serviceClass, lanes, surface, exposure, isSensitive } = segment;
    const before = { name, serviceClass, lanes, surface, exposure, isSensitive };
    const changed = kept.filter((attribute) => before[attribute] !== values[attribute]);
    const edited = [...new Set([...segment.edited, ...changed])];
    // a width that was only lanes times the lane width of the class goes with the lanes
    const isWidthGuessed = segment.assumed.includes('widthM') && values.lanes !== lanes;
    await segment.update(
      {
        ...values,
        edited,
        assumed: segment.assumed.filter((attribute) => !edited.includes(attribute)),
        ...(isWidthGuessed ? { widthM: values.lanes * classAssumption(segment.roadClass).laneWidthM } : {}),
        updatedAt: given.now,
      },
      { transaction: tx },
    );
    await recordAudit(tx, {
      personId: given.by,
      action: 'setup.roads.change',
      subjectKind: 'segment',
      subjectId: id,
      detail: { before, after: values },
    });
    return { id };
  });
}
