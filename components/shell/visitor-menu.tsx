"use client";

import Link from "next/link";
import { usePathname } from "next/navigation";
import { Icon } from "@/components/ui/icons";
import { Menu } from "@/components/ui/menu";
import { NavLinks } from "./nav-links";

/** The ways in, for someone without an account; folded into one menu on a phone. */
export function VisitorMenu() {
  const path = usePathname();
  const inside = path.startsWith("/sign-");
  const query = inside || path === "/" ? undefined : { next: path };
  return (
    <>
      <span className="hidden items-center sm:flex">
        <Link className="header-item" href={{ pathname: "/sign-in", query }}>
          Sign in
        </Link>
        <Link className="header-item" href={{ pathname: "/sign-up", query }}>
          Sign up
        </Link>
      </span>
      <span className="sm:hidden">
        <Menu label="Menu" face={<Icon name="menu" />}>
          {(close) => (
            <nav aria-label="Places" className="flex w-48 flex-col py-2">
              <NavLinks className="menu-item" onFollow={close} />
              <Link
                className="menu-item border-t border-rule"
                href={{ pathname: "/sign-in", query }}
                onClick={close}
              >
                Sign in
              </Link>
              <Link className="menu-item" href={{ pathname: "/sign-up", query }} onClick={close}>
                Sign up
              </Link>
            </nav>
          )}
        </Menu>
      </span>
    </>
  );
}
