"use client";

import Link from "next/link";
import { usePathname } from "next/navigation";
import type { Place } from "./places";

interface PlaceLinksProps { readonly places: readonly Place[]; readonly label: string; readonly variant: "top" | "bottom" }

const isAt = (pathname: string, href: string) => pathname === href || pathname.startsWith(`${href}/`);

/** Navigation; the current place wears the cable tag, the others do not. */
export function PlaceLinks({ places, label, variant }: PlaceLinksProps) {
  const pathname = usePathname();
  const list = variant === "bottom" ? "flex flex-wrap" : "flex flex-wrap items-center gap-1";
  const shape = variant === "bottom" ? "w-full flex-col gap-0.5 px-1.5 py-1.5 text-base leading-tight" : "gap-2 px-3 py-1";
  return (
    <nav aria-label={label}>
      <ul className={list}>
        {places.map(({ href, label: text, icon }) => {
          const current = isAt(pathname, href);
          return (
            <li key={href} className={variant === "bottom" ? "grow" : undefined}>
              <Link href={href} aria-current={current ? "page" : undefined} className={`place ${current ? "tag-cut place-current" : "place-other"} ${shape}`}>
                <svg viewBox="0 0 24 24" aria-hidden="true" className="size-6" fill="none" stroke="currentColor" strokeWidth="2"><path d={icon} /></svg>
                {text}
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
