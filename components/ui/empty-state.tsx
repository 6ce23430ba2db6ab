import type { ReactNode } from "react";

interface EmptyStateProps {
  title: string;
  /** What the page will hold. */
  children: ReactNode;
  /** The one thing to do. */
  action: ReactNode;
  /** A drawing of what will stand here. */
  picture?: ReactNode;
}

export function EmptyState({ title, children, action, picture }: EmptyStateProps) {
  return (
    <div className="flex flex-col items-start gap-3 border-y border-rule py-10">
      {picture}
      <h2 className="title-wide text-lg">{title}</h2>
      <p className="max-w-prose text-ink-2">{children}</p>
      <div className="mt-1">{action}</div>
    </div>
  );
}
