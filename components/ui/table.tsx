import { type ReactNode } from 'react';
import { classNames } from './class-names';

export interface Column<Row> {
  key: string;
  head: ReactNode;
  cell: (row: Row) => ReactNode;
  /** Numbers stand right and in the figure face, so that a column can be compared. */
  isNumber?: boolean;
  /** The column that names the row, for screen readers. */
  isRowHead?: boolean;
  className?: string;
}

export type TableProps<Row> = Readonly<{
  /** What the table is, for screen readers. */
  caption: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string | number;
  rowClassName?: (row: Row) => string | undefined;
  /** Totals, aligned with the columns. */
  footer?: ReactNode;
  /** Give a height (`max-h-96`) to let the head stick while the rows scroll. */
  className?: string;
  isCaptionShown?: boolean;
  /** What it lies on, so that the head can cover the rows under it. */
  surface?: 'ground' | 'panel';
}>;

const cellLook = (column: { isNumber?: boolean }) =>
  classNames('px-3 py-2 first:pl-0 last:pr-0', column.isNumber && 'text-right font-mono whitespace-nowrap');

/** Dense rows under a head that sticks, parted by hairlines. On a narrow screen it scrolls sideways by itself. */
export function Table<Row>({
  caption,
  columns,
  rows,
  rowKey,
  rowClassName,
  footer,
  className,
  isCaptionShown = false,
  surface = 'ground',
}: TableProps<Row>) {
  return (
    <div
      role="region"
      aria-label={caption}
      tabIndex={0}
      className={classNames('relative max-w-full overflow-auto print:overflow-visible', className)}
    >
      <table className="w-full border-collapse text-left">
        <caption className={isCaptionShown ? 'pb-2 text-left font-bold' : 'sr-only'}>{caption}</caption>
        <thead className={classNames('sticky top-0 z-10', surface === 'panel' ? 'bg-panel' : 'bg-ground')}>
          <tr className="border-b">
            {columns.map((column) => (
              <th
                key={column.key}
                scope="col"
                className={classNames(
                  cellLook(column),
                  'align-bottom font-sans text-sm font-semibold text-soft',
                  column.className,
                )}
              >
                {column.head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} className={classNames('border-b', rowClassName?.(row))}>
              {columns.map((column) =>
                column.isRowHead ? (
                  <th
                    key={column.key}
                    scope="row"
                    className={classNames(cellLook(column), 'font-semibold', column.className)}
                  >
                    {column.cell(row)}
                  </th>
                ) : (
                  <td key={column.key} className={classNames(cellLook(column), column.className)}>
                    {column.cell(row)}
                  </td>
                ),
              )}
            </tr>
          ))}
        </tbody>
        {footer ? <tfoot className="border-t border-faint font-semibold">{footer}</tfoot> : null}
      </table>
    </div>
  );
}
