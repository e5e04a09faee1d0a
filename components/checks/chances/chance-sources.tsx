/** The sources, each once, under the letters that the rows carry. */
export function ChanceSources({ sources }: { readonly sources: readonly { readonly letter: string; readonly text: string }[] }) {
  return (
    <dl className="grid gap-2">
      {sources.map(({ letter, text }) => (
        <div key={letter} className="grid grid-cols-[1.5rem_1fr]">
          <dt className="font-bold">{letter}</dt>
          <dd className="max-w-prose first-letter:uppercase">{text}.</dd>
        </div>
      ))}
    </dl>
  );
}
