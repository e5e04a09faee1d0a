import { DataTable, PinTag, Quantity } from "@/components/ui";
import type { EntryData } from "@/lib/catalogue/entry-data";
import { pinsInOrder } from "@/lib/catalogue/expect-of-entry";
import { colourWords } from "@/lib/units";
import { WireSwatch } from "../wire-swatch";

const COLUMNS = [
  { key: "cavity", header: "Cavity" }, { key: "tag", header: "Pin" }, { key: "wire", header: "Wire" }, { key: "gauge", header: "Gauge", numeric: true },
] as const;

/** The pins in the order of the connector's cavities. */
export function PinTable({ data }: { readonly data: Pick<EntryData, "pins" | "connector"> }) {
  const rows = pinsInOrder(data).map((pin) => ({
    key: pin.cavity,
    cells: {
      cavity: <span className="font-mono text-xl">{pin.cavity}</span>,
      tag: <PinTag role={pin.role} />,
      wire: (
        <span className="flex flex-wrap items-center gap-x-2">
          <WireSwatch letters={pin.colour} /><span className="font-mono font-bold">{pin.colour}</span><span>{colourWords(pin.colour) ?? "unknown colour"}</span>
        </span>
      ),
      gauge: <Quantity value={pin.gaugeMm2} unit="mm²" />,
    },
  }));
  return <DataTable caption="Pins by cavity" captionHidden columns={COLUMNS} rows={rows} />;
}
