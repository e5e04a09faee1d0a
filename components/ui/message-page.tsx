import type { ReactNode } from "react";

interface MessagePageProps {
  readonly title: string;
  readonly children: ReactNode;
  readonly actions: ReactNode;
}

/** A page that only says something went another way, and where to go from here. */
export function MessagePage({ title, children, actions }: MessagePageProps) {
  return (
    <div className="mx-auto max-w-2xl px-4 py-10">
      <h1 className="text-3xl leading-tight font-bold">{title}</h1>
      <div className="mt-3 text-lg text-quiet">{children}</div>
      <div className="mt-6 flex flex-wrap gap-3">{actions}</div>
    </div>
  );
}
