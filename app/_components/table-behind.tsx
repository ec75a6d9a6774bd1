'use client';

import { useState, type ReactNode } from 'react';
import { numberIn, plainText, toCsv, toTabs } from './table-text';

export interface TableColumn {
  key: string;
  label: string;
  /** In the head, not in the cells. */
  unit?: string;
  align?: 'left' | 'right';
}

export type TableRow = Record<string, ReactNode>;

interface TableBehindProps {
  caption: string;
  columns: readonly TableColumn[];
  rows: readonly TableRow[];
  /** Words that open the table; without them it stands open. */
  opener?: string;
  /** How the rows stand before a head is pressed, such as "top to bottom". */
  order?: string;
  fileName?: string;
  /** A last row under an ink rule. */
  total?: TableRow;
}

type Sort = { key: string; down: boolean } | null;

/** The drawing as a real table: sortable, copyable, to be saved as CSV. */
export function TableBehind(props: TableBehindProps) {
  if (!props.opener) return <Table {...props} />;
  return (
    <details>
      <summary className="inline-flex min-h-6 touch-44 list-none items-center text-12 link-opens [&::-webkit-details-marker]:hidden">
        {props.opener}
      </summary>
      <div className="pt-3">
        <Table {...props} />
      </div>
    </details>
  );
}

function sorted(rows: readonly TableRow[], sort: Sort): readonly TableRow[] {
  if (!sort) return rows;
  const compare = (a: TableRow, b: TableRow) => {
    const [x, y] = [plainText(a[sort.key]), plainText(b[sort.key])];
    const [n, m] = [numberIn(x), numberIn(y)];
    return (n !== null && m !== null ? n - m : x.localeCompare(y)) * (sort.down ? -1 : 1);
  };
  return [...rows].sort(compare);
}

function Table({ caption, columns, rows, order, fileName, total }: TableBehindProps) {
  const [sort, setSort] = useState<Sort>(null);
  const shown = sorted(rows, sort);
  // The third press brings the natural order back.
  const press = (key: string) =>
    setSort((now) => (now?.key !== key ? { key, down: false } : now.down ? null : { key, down: true }));
  const cells = (row: TableRow) => columns.map((column) => plainText(row[column.key]));
  const all = () => [
    columns.map((column) => (column.unit ? `${column.label}, ${column.unit}` : column.label)),
    ...shown.map(cells),
    ...(total ? [cells(total)] : []),
  ];
  return (
    <div>
      <div className="max-w-full overflow-x-auto" tabIndex={0} role="region" aria-label={caption}>
        <table className="w-full border-collapse text-14">
          <caption className="sticky left-0 pb-2 text-left text-17">{caption}</caption>
          <thead>
            <tr className="border-b border-ink">
              {columns.map((column, at) => (
                <Head
                  key={column.key}
                  {...{ column, sort, press, first: at === 0 }}
                  order={at === 0 ? order : undefined}
                />
              ))}
            </tr>
          </thead>
          <tbody>
            {shown.map((row, at) => (
              <Row key={at} row={row} columns={columns} className="border-b border-line" />
            ))}
          </tbody>
          {total && (
            <tfoot>
              <Row row={total} columns={columns} className="border-t border-ink font-semibold" />
            </tfoot>
          )}
        </table>
      </div>
      <TableVerbs all={all} name={fileName ?? caption} />
    </div>
  );
}

interface HeadProps {
  column: TableColumn;
  first: boolean;
  sort: Sort;
  press: (key: string) => void;
  order: string | undefined;
}

function Head({ column, first, sort, press, order }: HeadProps) {
  const own = sort?.key === column.key ? sort : null;
  const right = column.align === 'right';
  return (
    <th
      scope="col"
      aria-sort={own ? (own.down ? 'descending' : 'ascending') : undefined}
      className={`pr-6 text-12 font-normal whitespace-nowrap last:pr-0 ${right ? 'text-right' : 'text-left'} ${first ? 'sticky left-0 bg-paper' : ''}`}
    >
      <button
        type="button"
        className={`min-h-6 touch-44 cursor-pointer ${first || own ? 'font-semibold text-ink' : 'text-ink-soft'}`}
        onClick={() => press(column.key)}
      >
        {column.label}
        {column.unit && <span className="font-normal text-ink-soft">, {column.unit}</span>}
        {own && <span className="font-normal text-ink-soft">, {own.down ? 'falling' : 'rising'}</span>}
      </button>
      {order && !sort && <span className="text-ink-soft"> {order}</span>}
    </th>
  );
}

function Row({ row, columns, className }: { row: TableRow; columns: readonly TableColumn[]; className: string }) {
  return (
    <tr className={className}>
      {columns.map((column, at) => {
        const align = column.align === 'right' ? 'text-right' : 'text-left';
        const content = row[column.key];
        return at === 0 ? (
          <th
            key={column.key}
            scope="row"
            className={`sticky left-0 bg-paper py-1.5 pr-6 font-semibold max-md:max-w-[45vw] ${align}`}
          >
            {content}
          </th>
        ) : (
          <td key={column.key} className={`py-1.5 pr-6 last:pr-0 ${align}`}>
            {content}
          </td>
        );
      })}
    </tr>
  );
}

function TableVerbs({ all, name }: { all: () => string[][]; name: string }) {
  const [said, setSaid] = useState('');
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(toTabs(all()));
      setSaid('Copied.');
    } catch {
      setSaid('This browser does not let a page copy. Select the table and copy it.');
    }
  };
  const save = () => {
    const address = URL.createObjectURL(new Blob([toCsv(all())], { type: 'text/csv;charset=utf-8' }));
    const link = document.createElement('a');
    link.href = address;
    link.download = `${name
      .toLowerCase()
      .replaceAll(/[^a-z0-9]+/g, '-')
      .replaceAll(/^-|-$/g, '')}.csv`;
    link.click();
    setTimeout(() => URL.revokeObjectURL(address), 10_000);
    setSaid('Saved as CSV.');
  };
  return (
    <p className="flex flex-wrap items-baseline gap-x-5 pt-3 text-12 print:hidden">
      <button type="button" className="min-h-6 touch-44 link-does" onClick={() => void copy()}>
        Copy
      </button>
      <button type="button" className="min-h-6 touch-44 link-does" onClick={save}>
        Save as CSV
      </button>
      <span aria-live="polite" className="text-ink-soft">
        {said}
      </span>
    </p>
  );
}
