"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { Icon } from "@/components/ui/icons";
import { Menu } from "@/components/ui/menu";
import { showToast } from "@/components/ui/toasts";
import { ask } from "@/lib/platform/ask";
import { NavLinks } from "./nav-links";
import type { SignedInAs } from "./header";

/** Who is signed in, in which shop, and the way out. On a phone the places to go stand here too. */
export function AccountMenu({ account }: { account: SignedInAs }) {
  const router = useRouter();
  const [leaving, setLeaving] = useState(false);
  const leave = async () => {
    setLeaving(true);
    try {
      await ask("/api/sign-out", { method: "POST", body: {} });
      router.replace("/");
      router.refresh();
    } catch (error) {
      setLeaving(false);
      const message = error instanceof Error ? error.message : "The server did not answer.";
      showToast({ message: `Not signed out. ${message}`, fault: true });
    }
  };
  return (
    <Menu
      label={`Account of ${account.person}`}
      face={
        <>
          <span className="hidden max-w-40 truncate sm:inline">{account.shop}</span>
          <Icon name="person" />
        </>
      }
    >
      {(close) => (
        <div className="flex w-60 flex-col py-2">
          <p className="border-b border-rule px-3 pb-2">
            <span className="block truncate font-semibold">{account.person}</span>
            <span className="block truncate text-sm text-ink-2">{account.shop}</span>
          </p>
          <nav aria-label="Places" className="contents sm:hidden">
            <NavLinks className="menu-item sm:hidden" onFollow={close} />
          </nav>
          <button type="button" className="menu-item" disabled={leaving} onClick={leave}>
            {leaving ? "Signing out …" : "Sign out"}
          </button>
        </div>
      )}
    </Menu>
  );
}
