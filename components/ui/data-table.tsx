import { useId, type ReactNode } from "react";

export interface Column {
  readonly key: string;
  readonly header: ReactNode;
  /** Right-aligned in the reading's type. */
  readonly numeric?: boolean;
}

export interface Row {
  readonly key: string;
  readonly cells: Readonly<Record<string, ReactNode>>;
}

interface DataTableProps {
  readonly caption: ReactNode;
  readonly columns: readonly Column[];
  readonly rows: readonly Row[];
  /** The caption is read aloud but not shown, where a heading already says it. */
  readonly captionHidden?: boolean;
}

const cellClass = (column: Column) => (column.numeric ? "text-right font-mono whitespace-nowrap" : "text-left");

/** A table whose first column names the row; wide ones scroll sideways on their own, by keyboard too. */
export function DataTable({ caption, columns, rows, captionHidden = false }: DataTableProps) {
  const captionId = useId();
  return (
    <div role="region" aria-labelledby={captionId} tabIndex={0} className="overflow-x-auto print:overflow-visible">
      <table className="w-full border-collapse">
        <caption id={captionId} className={captionHidden ? "sr-only" : "pb-2 text-left font-bold"}>{caption}</caption>
        <thead>
          <tr className="border-b-2 border-rule">
            {columns.map((column) => (
              <th key={column.key} scope="col" className={`px-2 py-2 align-bottom font-bold first:pl-0 last:pr-0 ${column.numeric ? "text-right" : "text-left"}`}>{column.header}</th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => <BodyRow key={row.key} row={row} columns={columns} />)}
        </tbody>
      </table>
    </div>
  );
}

function BodyRow({ row, columns }: { readonly row: Row; readonly columns: readonly Column[] }) {
  return (
    <tr className="border-b border-quiet align-top">
      {columns.map((column, index) => index === 0
        ? <th key={column.key} scope="row" className={`px-2 py-2.5 pl-0 font-bold ${cellClass(column)}`}>{row.cells[column.key]}</th>
        : <td key={column.key} className={`px-2 py-2.5 last:pr-0 ${cellClass(column)}`}>{row.cells[column.key]}</td>)}
    </tr>
  );
}
