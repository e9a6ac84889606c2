import { type Migration } from '@/db/migrate';

/** Without these every node that is removed has the whole of the segments read, twice. */
export const up: Migration['up'] = async ({ sql }) => {
  await sql(`
    create index segments_by_from_node on segments (from_node_id);
    create index segments_by_to_node on segments (to_node_id);
  `);
};

export const down: Migration['down'] = async ({ sql }) => {
  await sql('drop index segments_by_from_node, segments_by_to_node');
};
