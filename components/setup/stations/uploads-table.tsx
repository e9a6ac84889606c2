import { Table } from '@/components/ui/table';
import { formatDateTime } from '@/lib/time/format';
import { formatNumber } from '@/lib/units/format';
import { type ListedUpload } from './listed-station';

export type UploadsTableProps = Readonly<{ uploads: readonly ListedUpload[]; zone: string }>;

const figure = (count: number) => (count > 0 ? formatNumber(count, 0) : <span className="text-faint">0</span>);

export function UploadsTable({ uploads, zone }: UploadsTableProps) {
  const count = (key: 'rowsRead' | 'rowsAdded' | 'rowsFilled' | 'rowsUnchanged' | 'rowsFlagged', head: string) => ({
    key,
    head,
    isNumber: true,
    cell: (upload: ListedUpload) => figure(upload[key]),
  });
  return (
    <Table
      caption="Files read, newest first"
      rows={uploads}
      rowKey={(upload) => upload.id}
      columns={[
        {
          key: 'file',
          head: 'File',
          isRowHead: true,
          className: 'min-w-40 wrap-anywhere',
          cell: (upload) => upload.fileName,
        },
        {
          key: 'when',
          head: 'Read',
          className: 'whitespace-nowrap',
          cell: (upload) => `${formatDateTime(new Date(upload.finishedAt), zone)}, ${upload.sentBy}`,
        },
        count('rowsRead', 'Rows'),
        count('rowsAdded', 'Readings added'),
        count('rowsFilled', 'Filled'),
        count('rowsUnchanged', 'Already there'),
        count('rowsFlagged', 'Flagged rows'),
        {
          key: 'rejected',
          head: 'Rejected',
          isNumber: true,
          cell: (upload) =>
            upload.rowsRejected > 0 ? (
              <a
                href={`/api/uploads/${upload.id}/rejects.csv`}
                download
                className="link"
                aria-label={`Download the ${upload.rowsRejected} rejected rows of ${upload.fileName}`}
              >
                {formatNumber(upload.rowsRejected, 0)}
              </a>
            ) : (
              figure(0)
            ),
        },
      ]}
    />
  );
}
