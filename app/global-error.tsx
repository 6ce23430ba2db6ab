"use client";

import "./globals.css";

interface ErrorProps {
  error: Error & { digest?: string };
  reset: () => void;
}

/** Where even the frame around the pages could not be made. */
export default function GlobalError({ error, reset }: ErrorProps) {
  return (
    <html lang="en">
      <body>
        <title>Something went wrong · Ventwright</title>
        <main id="main" className="page">
          <h1 className="title-wide text-xl">Ventwright cannot be shown just now</h1>
          <p className="mt-3 mb-5 text-ink-2">The server did not answer as it should.</p>
          <button type="button" className="button-primary" onClick={reset}>
            Try again
          </button>
          {error.digest && <p className="mt-6 text-sm text-ink-2">error {error.digest}</p>}
        </main>
      </body>
    </html>
  );
}
