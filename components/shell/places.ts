import type { Route } from "next";

export interface Place { readonly href: Route; readonly label: string; readonly icon: string }

/** The places of the workshop; icons are paths on a 24 by 24 grid. */
export const PLACES = {
  today: { href: "/today", label: "Today", icon: "M4 3h12l4 4v14H4ZM8 12h8M8 16h5" },
  catalogue: { href: "/catalogue", label: "Catalogue", icon: "M4 5h4v4H4ZM4 15h4v4H4ZM11 7h9M11 17h9" },
  checks: { href: "/checks", label: "Checks", icon: "M6 3v9M6 16v5M18 3v5M18 12v9M4 12h4v4H4ZM16 8h4v4h-4Z" },
  machines: { href: "/machines", label: "Machines", icon: "M3 17h18M5 17V9h8l4 8M5 21h.1M11 21h.1M18 21h.1M8 9V5h3" },
  workshop: { href: "/workshop", label: "Workshop", icon: "M3 10 12 4l9 6v10H3ZM9 20v-6h6v6" },
} as const satisfies Record<string, Place>;
