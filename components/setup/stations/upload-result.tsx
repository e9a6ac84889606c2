import { DownloadLink } from '@/components/ui/link-button';
import { Notice } from '@/components/ui/notice';
import { type ImportReadingsReply } from '@/lib/contracts/readings';

export type UploadResultProps = Readonly<{ fileName: string; reply: ImportReadingsReply }>;

/** What became of a file, and its first rejected rows with their reasons. */
export function UploadResult({ fileName, reply }: UploadResultProps) {
  const { rowsRejected, firstRejects } = reply;
  const isNothing = reply.alreadyReadAt === null && rowsRejected === reply.rowsRead;
  return (
    <Notice
      tone={isNothing ? 'problem' : rowsRejected > 0 ? 'caution' : 'done'}
      title={isNothing ? `No row of ${fileName} could be read.` : `${fileName} is read.`}
      todo={reply.summary}
      action={
        rowsRejected > 0 ? (
          <DownloadLink href={`/api/uploads/${reply.uploadId}/rejects.csv`} size="small">
            Download the rejected rows
          </DownloadLink>
        ) : null
      }
    >
      {firstRejects.length > 0 ? (
        <ul className="mt-2 grid gap-1">
          {firstRejects.map(({ line, columnName, reason }) => (
            <li key={`${line} ${columnName}`}>
              Line {line}
              {columnName ? `, ${columnName}` : ''}: {reason}
            </li>
          ))}
          {rowsRejected > firstRejects.length ? <li>and {rowsRejected - firstRejects.length} more.</li> : null}
        </ul>
      ) : null}
    </Notice>
  );
}
