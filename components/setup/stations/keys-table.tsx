'use client';

import { Button } from '@/components/ui/button';
import { Table } from '@/components/ui/table';
import { formatDateTime } from '@/lib/time/format';
import { type ListedKey } from './listed-station';

export type KeysTableProps = Readonly<{
  keys: readonly ListedKey[];
  zone: string;
  onRevoke: (key: ListedKey) => void;
}>;

export function KeysTable({ keys, zone, onRevoke }: KeysTableProps) {
  return (
    <Table
      caption="Keys of this station"
      rows={keys}
      rowKey={(key) => key.id}
      rowClassName={(key) => (key.revokedAt ? 'text-soft' : undefined)}
      columns={[
        {
          key: 'hint',
          head: 'Key ends in',
          isRowHead: true,
          cell: (key) => <span className="font-mono">{key.hint}</span>,
        },
        {
          key: 'issued',
          head: 'Issued',
          className: 'whitespace-nowrap',
          cell: (key) => `${formatDateTime(new Date(key.issuedAt), zone)}, ${key.issuedByName}`,
        },
        {
          key: 'used',
          head: 'Last used',
          className: 'whitespace-nowrap',
          cell: (key) => (key.lastUsedAt ? formatDateTime(new Date(key.lastUsedAt), zone) : 'never'),
        },
        {
          key: 'revoke',
          head: <span className="sr-only">Revoke</span>,
          className: 'text-right whitespace-nowrap print:hidden',
          cell: (key) =>
            key.revokedAt ? (
              `revoked ${formatDateTime(new Date(key.revokedAt), zone)}`
            ) : (
              <Button
                size="small"
                variant="quiet"
                aria-label={`Revoke the key that ends in ${key.hint}`}
                onClick={() => onRevoke(key)}
              >
                Revoke
              </Button>
            ),
        },
      ]}
    />
  );
}
