import { Notice } from "@/components/ui";

/** What the entry says of its own device; it does not stop the check. */
export function EntryCautions({ cautions }: { readonly cautions: readonly string[] }) {
  if (cautions.length === 0) return null;
  return (
    <Notice tone="ask" title="Take care with this device">
      <ul className="list-disc space-y-1 pl-5">{cautions.map((caution) => <li key={caution}>{caution}</li>)}</ul>
    </Notice>
  );
}

/** Where this tool stops, said before anything is touched. */
export function CautionsNotice() {
  return (
    <Notice tone="stop" title="Stop: this tool is not for">
      <ul className="list-disc space-y-1 pl-5">
        <li>anything above 30 V a.c. or 60 V d.c., or behind orange cable</li>
        <li>airbag and belt-tensioner circuits</li>
        <li>places where gas or dust can explode</li>
      </ul>
      <p className="mt-3">Never pierce insulation, never put ohms on a live circuit, never bridge a controller&rsquo;s supply to battery. Use a meter rated for the place. Follow the site&rsquo;s rules, the maker&rsquo;s instructions and local law; a licensed person decides.</p>
    </Notice>
  );
}
