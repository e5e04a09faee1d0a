"use client";

import { useEffect, useRef, type ReactNode } from "react";
import { bringUp } from "./bring-up";

/**
 * The heading of a screen of the check. It, or a banner that has to be read before it, is brought to the top; it takes the focus when the screen changes, so that a screen reader says
 * where one is and the keyboard starts from there. A dialog that is open keeps the focus.
 */
export function ScreenHeading({ screen, children }: { readonly screen: string; readonly children: ReactNode }) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    const focused = document.activeElement;
    const elsewhere = focused instanceof HTMLElement && focused.closest("dialog[open]") !== null;
    if (!elsewhere) heading.current?.focus({ preventScroll: true });
    const first = document.querySelector<HTMLElement>("[data-lead-in]") ?? heading.current;
    if (first) bringUp(first);
  }, [screen]);
  return <h1 ref={heading} tabIndex={-1} className="scroll-mt-3 text-[1.625rem] leading-tight font-bold outline-none!">{children}</h1>;
}
