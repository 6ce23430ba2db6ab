"use client";

import Link from "next/link";
import { useSyncExternalStore, type ReactNode } from "react";
import { Button } from "@/components/ui/button";

interface FaultPageProps {
  title: string;
  children: ReactNode;
  /** Told to whoever looks after the server. */
  reference?: string;
  onRetry?: () => void;
}

const never = () => () => undefined;

/** The id under which the server has written this request down. */
function useRequestId(): string | null {
  return useSyncExternalStore(
    never,
    () => document.querySelector<HTMLMetaElement>('meta[name="request-id"]')?.content ?? null,
    () => null,
  );
}

/** A page that could not be shown: what happened, what to do, and what to quote. */
export function FaultPage({ title, children, reference, onRetry }: FaultPageProps) {
  const requestId = useRequestId();
  const quoted = [requestId && `request ${requestId}`, reference && `error ${reference}`];
  return (
    <main id="main" className="page">
      <h1 className="title-wide text-xl">{title}</h1>
      <p className="mt-3 max-w-prose text-ink-2">{children}</p>
      <p className="mt-5 flex flex-wrap gap-2">
        {onRetry && (
          <Button tone="primary" onClick={onRetry}>
            Try again
          </Button>
        )}
        <Link href="/" className="button-quiet">
          To the Bench
        </Link>
      </p>
      <p className="lettering mt-6 text-sm text-ink-2">{quoted.filter(Boolean).join(", ")}</p>
    </main>
  );
}
