"use client";

import "./globals.css";

/** When not even the frame could be made. */
export default function GlobalError({ reset }: { readonly reset: () => void }) {
  return (
    <html lang="en-GB">
      <body className="p-6">
        <title>Pinwright cannot be shown</title>
        <h1 className="text-3xl font-bold">Pinwright cannot be shown</h1>
        <p className="my-4">Something went wrong here. Wait a minute, then try again.</p>
        <button type="button" onClick={reset} className="tag-cut button button-plain min-h-touch">Try again</button>
      </body>
    </html>
  );
}
