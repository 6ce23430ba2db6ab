import type { Metadata } from "next";
import { notFound, redirect } from "next/navigation";
import { SavedBench } from "@/components/bench/saved-bench";
import { currentSession, requireShop } from "@/lib/accounts/session";
import { getDesign } from "@/lib/designs/data";
import { AppError } from "@/lib/platform/errors";
import { may } from "@/lib/shops/policy";

interface PageProps {
  params: Promise<{ id: string }>;
}

export const metadata: Metadata = { title: "Bench" };

/** One saved design. */
export default async function BenchPage({ params }: PageProps) {
  const { id } = await params;
  const session = await currentSession();
  if (!session) redirect(`/sign-in?next=/bench/${encodeURIComponent(id)}`);
  const saved = await found(id);
  return (
    <main id="main">
      <SavedBench
        key={`${saved.id} ${saved.version}`}
        saved={saved}
        canEdit={may(session.role, "designs.write")}
        drawn={saved.updated_at.slice(0, 10)}
      />
    </main>
  );
}

async function found(id: string) {
  const { shop } = await requireShop("designs.read");
  try {
    return await getDesign(shop, id);
  } catch (error) {
    if (error instanceof AppError && error.code === "not_found") notFound();
    throw error;
  }
}
