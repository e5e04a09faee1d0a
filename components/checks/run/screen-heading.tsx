"use client";

import { useEffect, useRef, type ReactNode } from "react";

/** Room left above the heading, CSS pixels. */
const AIR = 12;

/** Brings the heading to just below the standing, however high that is with the names it carries now. */
function bringUp(heading: HTMLElement): void {
  const strip = document.querySelector<HTMLElement>("[data-standing-strip]");
  const sticky = strip !== null && getComputedStyle(strip).position === "sticky";
  if (!sticky) heading.scrollIntoView({ block: "start" });
  else window.scrollBy({ top: heading.getBoundingClientRect().top - strip.offsetHeight - AIR });
}

/**
 * The heading of a screen of the check. It takes the focus when the screen changes, so that a screen reader says
 * where one is and the keyboard starts from there. A dialog that is open keeps the focus.
 */
export function ScreenHeading({ screen, children }: { readonly screen: string; readonly children: ReactNode }) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    const focused = document.activeElement;
    const elsewhere = focused instanceof HTMLElement && focused.closest("dialog[open]") !== null;
    if (!elsewhere) heading.current?.focus({ preventScroll: true });
    if (heading.current) bringUp(heading.current);
  }, [screen]);
  return <h1 ref={heading} tabIndex={-1} className="scroll-mt-3 text-2xl leading-tight font-bold outline-none!">{children}</h1>;
}
