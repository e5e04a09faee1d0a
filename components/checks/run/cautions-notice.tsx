import { Notice } from "@/components/ui";

/** Where this tool stops, said before anything is touched. */
export function CautionsNotice({ more = [] }: { readonly more?: readonly string[] }) {
  return (
    <Notice tone="stop" title="Stop here, not with this tool, if it is">
      <ul className="list-disc pl-5">
        <li>above 30 V a.c. or 60 V d.c., or behind orange cable</li>
        <li>an airbag or belt-tensioner circuit</li>
        <li>in a place where gas or dust can explode</li>
      </ul>
      {more.length > 0 ? <ul className="mt-2 list-disc pl-5">{more.map((caution) => <li key={caution}>{caution}</li>)}</ul> : null}
      <p className="mt-2">Never pierce insulation, never put ohms on a live circuit, never bridge a controller&rsquo;s supply to battery. Use a meter rated for the place. Follow the site&rsquo;s rules, the maker&rsquo;s instructions and local law; a licensed person decides.</p>
    </Notice>
  );
}
