import { VisitorBench } from "@/components/bench/visitor-bench";
import { currentSession } from "@/lib/accounts/session";
import { denSub } from "@/lib/document/samples";
import { designSchema } from "@/lib/document/schema";
import { may } from "@/lib/shops/policy";

/** The Bench, with a sample design until there is one of the person's own. */
export default async function FrontPage() {
  const session = await currentSession();
  return (
    <main id="main">
      <VisitorBench
        sample={designSchema.parse(denSub)}
        shop={session?.shop.name ?? null}
        canSave={session !== null && may(session.role, "designs.write")}
        drawn={new Date().toISOString().slice(0, 10)}
      />
    </main>
  );
}
