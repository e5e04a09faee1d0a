import { BenchDrawing } from "@/components/shell/bench-drawing";
import { OuterFrame } from "@/components/shell/outer-frame";
import { ButtonLink, Notice } from "@/components/ui";

const STEPS = [
  { title: "Say what you have", words: "An entry of the catalogue, or only what you can see: the connector, the wires, what it senses." },
  { title: "Take one reading at a time", words: "Each screen says where the two leads go, what the meter is set to and what can hurt." },
  { title: "Leave with a verdict", words: "Which pin is which, what is at fault and where, how sure that is, and a report for the work order." },
] as const;

function Steps() {
  return (
    <ol className="mt-10 grid gap-x-10 gap-y-6 md:grid-cols-3">
      {STEPS.map(({ title, words }, index) => (
        <li key={title} className="flex gap-4 border-t-2 border-rule pt-3">
          <span aria-hidden="true" className="font-mono text-4xl leading-none font-bold text-copper">{index + 1}</span>
          <div>
            <h2 className="text-xl leading-tight font-bold">{title}</h2>
            <p className="mt-1">{words}</p>
          </div>
        </li>
      ))}
    </ol>
  );
}

/** What a stranger sees: what this is, and the way in. */
export default function FrontPage() {
  return (
    <OuterFrame>
      <div className="grid gap-8 md:grid-cols-[1.1fr_1fr] md:items-center md:gap-12">
        <div>
          <h1 className="text-4xl leading-tight font-extrabold sm:text-5xl">Three wires, no schematic, one meter</h1>
          <p className="mt-4 text-lg text-quiet sm:text-xl">Pinwright tells you where to put the leads, what the readings mean, which pin is supply, ground and signal, and whether device, connector, wire or controller is at fault.</p>
          <ButtonLink href="/sign-in" tone="main" size="glove" className="mt-6 w-full text-2xl! sm:w-auto sm:px-16">Sign in</ButtonLink>
        </div>
        <BenchDrawing className="mx-auto max-w-md md:max-w-none" />
      </div>
      <Steps />
      <div className="mt-10">
        <Notice tone="ask" title="Before you touch anything">
          Follow the site&rsquo;s rules, the maker&rsquo;s instructions and local law. A licensed person decides.
          Above 30&nbsp;V&nbsp;a.c. or 60&nbsp;V&nbsp;d.c., orange cable, airbag or belt-tensioner circuits, gas areas: not with this tool.
        </Notice>
      </div>
    </OuterFrame>
  );
}
