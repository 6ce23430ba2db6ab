import type { Metadata } from "next";
import Link from "next/link";
import { DesignList } from "@/components/designs/design-list";
import { QueryProvider } from "@/components/designs/query-provider";
import { EmptyState } from "@/components/ui/empty-state";
import { currentSession, requireShop } from "@/lib/accounts/session";
import { listDesigns } from "@/lib/designs/data";
import { may } from "@/lib/shops/policy";

export const metadata: Metadata = { title: "Designs" };

export default async function DesignsPage() {
  const session = await currentSession();
  if (!session) return <SignedOut />;
  const { shop } = await requireShop("designs.read");
  const canEdit = may(session.role, "designs.write");
  return (
    <main id="main" className="page">
      <header className="mb-4 flex flex-wrap items-center justify-between gap-3">
        <h1 className="title-wide text-xl">Designs</h1>
        {canEdit && (
          <Link href="/" className="button-primary">
            New design
          </Link>
        )}
      </header>
      <QueryProvider>
        <DesignList first={await listDesigns(shop)} canEdit={canEdit} />
      </QueryProvider>
    </main>
  );
}

function SignedOut() {
  return (
    <main id="main" className="page">
      <h1 className="title-wide mb-4 text-xl">Designs</h1>
      <EmptyState
        title="A shop keeps its designs here"
        action={
          <span className="flex flex-wrap gap-2">
            <Link
              href={{ pathname: "/sign-in", query: { next: "/designs" } }}
              className="button-primary"
            >
              Sign in
            </Link>
            <Link href="/sign-up" className="button-quiet">
              Sign up
            </Link>
          </span>
        }
      >
        Sign in to open, copy and rename what you saved. Without an account, the design on the Bench
        stays in this browser; signing up brings it along.
      </EmptyState>
    </main>
  );
}
