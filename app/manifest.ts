import type { MetadataRoute } from "next";

/** Lets the phone keep Pinwright on its home screen, where the whole height belongs to the check. */
export default function manifest(): MetadataRoute.Manifest {
  return {
    id: "/today",
    name: "Pinwright",
    short_name: "Pinwright",
    description: "Identify a three-wire device and prove its wiring with the meter you carry.",
    lang: "en-GB",
    start_url: "/today",
    scope: "/",
    display: "standalone",
    background_color: "#fbfaf5",
    theme_color: "#fbfaf5",
    icons: [
      { src: "/icons/pinwright.svg", sizes: "any", type: "image/svg+xml" },
      { src: "/icons/pinwright-192.png", sizes: "192x192", type: "image/png" },
      { src: "/icons/pinwright-512.png", sizes: "512x512", type: "image/png" },
      { src: "/icons/pinwright-maskable-512.png", sizes: "512x512", type: "image/png", purpose: "maskable" },
    ],
    shortcuts: [
      { name: "Start a check", url: "/checks/new" },
      { name: "Search the catalogue", url: "/catalogue" },
    ],
  };
}
