"use client";

import { type ReactNode, useState } from "react";
import { Field, TextInput } from "@/components/ui";
import { convertTyped, type ConvertedSide, tableQuantity } from "@/lib/catalogue/convert-typed";
import type { TransferTable } from "@/lib/catalogue/entry-data";
import { TransferCurve } from "./transfer-curve";

interface Typed { readonly side: ConvertedSide; readonly text: string }

/** The curve with a field for each of its axes: type either, read the other, see the place on the curve; children stand below the fields. */
export function ValueConverter({ table, children }: { readonly table: TransferTable; readonly children?: ReactNode }) {
  const [typed, setTyped] = useState<Typed>({ side: "signal", text: "" });
  const result = convertTyped(table, typed.side, typed.text);
  const middle = table.points[Math.floor(table.points.length / 2)];
  const field = (side: ConvertedSide) => {
    const own = typed.side === side;
    const other = result.state === "converted" ? result.other : "";
    const example = middle ? `for example ${tableQuantity(table, side, middle[side])}` : undefined;
    return (
      <Field label={table[side].name} hint={example} error={own && result.state === "refused" ? result.message : undefined}>
        <TextInput
          value={own ? typed.text : other} onChange={(event) => setTyped({ side, text: event.target.value })}
          autoComplete="off" autoCapitalize="none" spellCheck={false} maxLength={40} className="min-h-14 font-mono text-2xl"
        />
      </Field>
    );
  };
  return (
    <div className="grid items-start gap-x-10 gap-y-4 md:grid-cols-[minmax(0,28rem)_1fr]">
      <TransferCurve table={table} at={result.state === "converted" ? result.pair : null} />
      <div className="grid gap-6">
        <div className="grid gap-4 print:hidden">
          <h3 className="text-lg font-bold">Convert, either way</h3>
          {field("signal")}
          {field("value")}
        </div>
        {children}
      </div>
    </div>
  );
}
