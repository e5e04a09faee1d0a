import { ButtonLink, Notice, PageHeading } from "@/components/ui";

/** What a stranger sees: what this is, and the way in. */
export default function FrontPage() {
  return (
    <main className="mx-auto max-w-3xl px-4 py-10 sm:px-6">
      <PageHeading
        title="Pinwright"
        lead="You have a three-wire device nobody can name, and a hand-held meter. Pinwright tells you where to put the leads, what the readings mean, which pin is which, and whether device, connector, wire or controller is at fault."
      />
      <ButtonLink href="/sign-in" tone="main" size="glove" className="mb-8 w-full sm:w-auto sm:px-12">Sign in</ButtonLink>
      <Notice tone="ask" title="Before you touch anything">
        Follow the site&rsquo;s rules, the maker&rsquo;s instructions and local law. A licensed person decides.
        Above 30 V a.c. or 60 V d.c., orange cable, airbag or belt-tensioner circuits, gas areas: not with this tool.
      </Notice>
    </main>
  );
}
