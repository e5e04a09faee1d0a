import { ROLE_TAG } from "@/components/connector/role-tag";
import type { Role } from "@/lib/diagnosis";
import { WireSwatch } from "./wire-swatch";

const ROLE_WORDS: Readonly<Record<Role, string>> = { supply: "supply", ground: "ground", signal: "signal" };

interface PinStripProps { readonly pins: readonly { readonly role: Role; readonly cavity: string; readonly colour: string }[] }

/** The three pins side by side in cavity order: cavity, tag, wire colour in IEC 60757 letters. */
export function PinStrip({ pins }: PinStripProps) {
  return (
    <ul aria-label="Pins by cavity" className="inline-flex border-2 border-rule bg-paper">
      {pins.map((pin) => (
        <li key={pin.cavity} className="grid w-[5.25rem] justify-items-center border-r-2 border-rule px-1 py-1 last:border-r-0">
          <span className="inline-flex gap-2 font-mono">
            <span><span className="sr-only">Cavity </span>{pin.cavity}</span>
            <span className="font-bold">{ROLE_TAG[pin.role]}<span className="sr-only"> {ROLE_WORDS[pin.role]}</span></span>
          </span>
          <span className="inline-flex items-center gap-1.5 font-mono"><WireSwatch letters={pin.colour} />{pin.colour}</span>
        </li>
      ))}
    </ul>
  );
}
