import type { ReactNode } from "react";
import { Icon } from "./icons";

interface DisclosureProps {
  title: ReactNode;
  open?: boolean;
  children: ReactNode;
}

/** Something that can be folded away; works before any script has arrived. */
export function Disclosure({ title, open = false, children }: DisclosureProps) {
  return (
    <details className="group" open={open}>
      <summary className="thumb flex list-none items-center gap-1.5 py-1 font-semibold">
        <Icon name="chevron" className="-rotate-90 transition-transform group-open:rotate-0" />
        {title}
      </summary>
      <div className="pb-2">{children}</div>
    </details>
  );
}
