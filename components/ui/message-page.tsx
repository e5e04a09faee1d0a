import type { ReactNode } from "react";

interface MessagePageProps {
  readonly title: string;
  readonly children: ReactNode;
  readonly actions: ReactNode;
}

/** Two halves that do not meet. */
function PartedConnector() {
  return (
    <svg viewBox="0 0 240 72" aria-hidden="true" className="h-auto w-60 fill-sheet stroke-ink [stroke-width:3]">
      <path d="M0 24H20M0 36H20M0 48H20M220 24H240M220 36H240M220 48H240" />
      <path d="M20 6H78L90 18V66H20Z" />
      <path d="M220 6H162L150 18V66H220Z" />
      <path d="M90 24H106M90 36H106M90 48H106" className="stroke-copper [stroke-width:5]" />
      <path d="M150 19H140V29H150M150 31H140V41H150M150 43H140V53H150" className="fill-none" />
    </svg>
  );
}

/** A page that only says something went another way, and where to go from here. */
export function MessagePage({ title, children, actions }: MessagePageProps) {
  return (
    <div className="max-w-2xl py-4 sm:py-8">
      <PartedConnector />
      <h1 className="mt-6 text-3xl leading-tight font-bold sm:text-4xl">{title}</h1>
      <div className="mt-3 text-lg text-quiet">{children}</div>
      <div className="mt-6 flex flex-wrap gap-3">{actions}</div>
    </div>
  );
}
