import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { SlidingRegion } from './sliding-region.tsx';
import { cellClass, headClass, numberClass } from './table-cells.ts';

export interface DataColumn {
  key: string;
  label: string;
  numeric?: boolean;
  /** Sorting is by address, so that it works without scripts. */
  sort?: { href: string; direction: 'ascending' | 'descending' | null };
}

export interface DataRow {
  key: string;
  /** One per column, in order; the first heads the row. */
  cells: ReactNode[];
}

export interface DataTableProps {
  caption: string;
  /** The caption is read out only, where a heading above says it already. */
  captionHidden?: boolean;
  columns: DataColumn[];
  rows: DataRow[];
  foot?: ReactNode[];
  /**
   * On a phone: rows become slips, the first column stays and the rest slides, or the table stays as it is.
   * Left out, more than three columns are stacked.
   */
  phone?: 'stack' | 'slide' | 'keep';
}

/** Anything countable. Explicit roles keep it a table to a screen reader when rows are stacked. */
export function DataTable(props: DataTableProps) {
  const phone = props.phone ?? (props.columns.length > 3 ? 'stack' : 'keep');
  const table = <PlainTable {...props} phone={phone} />;
  return phone === 'slide' ? <SlidingRegion label={props.caption}>{table}</SlidingRegion> : table;
}

function PlainTable({ caption, captionHidden = false, columns, rows, foot, phone }: DataTableProps) {
  return (
    <table role="table" data-phone={phone} className="data-table num w-full border-collapse text-control">
      <caption className={captionHidden ? 'sr-only' : 'px-3 py-2 text-left text-small text-ink-soft'}>{caption}</caption>
      <thead role="rowgroup" className="wide:sticky wide:top-0 wide:z-10">
        <tr role="row">{columns.map((column) => <Heading key={column.key} column={column} />)}</tr>
      </thead>
      <tbody role="rowgroup">
        {rows.map((row) => (
          <tr role="row" key={row.key} className="hover:bg-hover">
            <Cells columns={columns} cells={row.cells} look={cellClass} head="font-normal" />
          </tr>
        ))}
      </tbody>
      {foot && (
        <tfoot role="rowgroup">
          <tr role="row" className="border-t-2 border-ink font-[680]">
            <Cells columns={columns} cells={foot} look="px-1.5 py-[11px] wide:px-3 align-top" head="font-[680]" />
          </tr>
        </tfoot>
      )}
    </table>
  );
}

function Heading({ column }: { column: DataColumn }) {
  const look = `${headClass} bg-[var(--table-ground,var(--color-sheet))] ${column.numeric ? numberClass : ''}`;
  if (!column.sort) return <th role="columnheader" scope="col" className={look}>{column.label}</th>;
  const { href, direction } = column.sort;
  return (
    <th role="columnheader" scope="col" aria-sort={direction ?? 'none'} className={look}>
      <Link to={href} preventScrollReset className="-my-1 inline-block py-1 text-inherit no-underline hover:underline">
        {column.label}
        {direction && <span aria-hidden="true"> {direction === 'ascending' ? '▴' : '▾'}</span>}
      </Link>
    </th>
  );
}

function Cells({ columns, cells, look, head }: { columns: DataColumn[]; cells: ReactNode[]; look: string; head: string }) {
  return columns.map((column, index) => {
    const content = cells[index];
    const className = `${look} ${column.numeric ? numberClass : 'text-left'}`;
    return index === 0 ? (
      <th role="rowheader" scope="row" key={column.key} className={`${className} ${head}`}>{content}</th>
    ) : (
      <td role="cell" key={column.key} data-label={column.label} className={className}>{content}</td>
    );
  });
}
