/** Room left above what is brought up, CSS pixels. */
const AIR = 8;

/** Height of the standing where it lies over the page, else 0. */
function covered(): number {
  const strip = document.querySelector<HTMLElement>("[data-standing-strip]");
  return strip && getComputedStyle(strip).position === "sticky" ? strip.offsetHeight : 0;
}

/** Brings an element to just below the standing, however high that is with the names it carries now. */
export function bringUp(element: HTMLElement): void {
  const cover = covered();
  if (cover === 0) element.scrollIntoView({ block: "start" });
  else window.scrollBy({ top: element.getBoundingClientRect().top - cover - AIR });
}

/** The same, but only where the standing hides it. */
export function uncover(element: HTMLElement): void {
  if (element.getBoundingClientRect().top < covered()) bringUp(element);
}
