import { DataTable, Quantity } from "@/components/ui";
import type { TransferTable } from "@/lib/catalogue/entry-data";
import { formatQuantity } from "@/lib/units";

/** The table behind the curve, for those who would rather read numbers and for print. */
export function TransferPoints({ table }: { readonly table: TransferTable }) {
  const columns = [{ key: "signal", header: table.signal.name, numeric: true }, { key: "value", header: table.value.name, numeric: true }];
  const rows = table.points.map((point) => ({
    key: String(point.signal),
    cells: { signal: <Quantity value={formatQuantity(point.signal, table.signal.unit)} />, value: <Quantity value={formatQuantity(point.value, table.value.unit)} /> },
  }));
  return <DataTable caption="Points of the table" columns={columns} rows={rows} />;
}
