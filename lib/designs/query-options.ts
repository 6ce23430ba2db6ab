/** How the client reads designs: TanStack Query options over the routes. */
import { infiniteQueryOptions } from "@tanstack/react-query";
import { ask } from "@/lib/platform/ask";
import type { DesignPage } from "./contract";

export const designsKey = ["designs"] as const;

export function designsQuery() {
  return infiniteQueryOptions({
    queryKey: designsKey,
    queryFn: ({ pageParam, signal }) =>
      ask<DesignPage>(`/api/designs${pageParam ? `?after=${encodeURIComponent(pageParam)}` : ""}`, {
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
  });
}
