"use client";

import Link from "next/link";
import { usePathname } from "next/navigation";

const places = [
  { href: "/", label: "Bench" },
  { href: "/designs", label: "Designs" },
] as const;

/** Where one can go; the place one is at is marked, in weight and in words for screen readers. */
export function NavLinks({ className, onFollow }: { className: string; onFollow?: () => void }) {
  const path = usePathname();
  const here = (href: string) =>
    href === "/" ? path === "/" || path.startsWith("/bench") : path.startsWith(href);
  return places.map(({ href, label }) => (
    <Link
      key={href}
      href={href}
      className={className}
      aria-current={here(href) ? "page" : undefined}
      onClick={onFollow}
    >
      {label}
    </Link>
  ));
}
