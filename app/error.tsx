"use client";

import { FaultPage } from "@/components/shell/fault-page";

interface ErrorProps {
  error: Error & { digest?: string };
  reset: () => void;
}

export default function ErrorPage({ error, reset }: ErrorProps) {
  return (
    <FaultPage title="Something went wrong here" reference={error.digest} onRetry={reset}>
      What you saved is safe, and what stood on the Bench without an account is still in this
      browser. Try again; if it keeps happening, pass on the line below.
    </FaultPage>
  );
}
