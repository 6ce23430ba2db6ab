"use client";

import type { ReactNode } from "react";

interface NumbersPartProps {
  id: string;
  title: string;
  /** Folded away until asked for. */
  closed?: boolean;
  action?: ReactNode;
  children: ReactNode;
}

/** A part of the numbers column; it folds, and remembers nothing: the page opens as drawn. */
export function NumbersPart({ id, title, closed = false, action, children }: NumbersPartProps) {
  return (
    <details className="numbers-part" open={!closed} data-part={id}>
      <summary className="part-head">
        <h2 className="text-base font-semibold">{title}</h2>
        {action}
      </summary>
      <div className="divide-y divide-rule">{children}</div>
    </details>
  );
}
