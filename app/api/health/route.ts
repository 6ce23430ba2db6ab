import { healthOf } from "@/lib/health/data";

export const dynamic = "force-dynamic";

/** Whether the database answers and stands at this build's migration. */
export async function GET() {
  const health = await healthOf();
  return Response.json(health, { status: health.ok ? 200 : 503 });
}
