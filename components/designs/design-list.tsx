"use client";

import { useInfiniteQuery } from "@tanstack/react-query";
import Link from "next/link";
import { Button } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/empty-state";
import { StatusMark } from "@/components/ui/status-mark";
import type { DesignPage } from "@/lib/designs/contract";
import { designsQuery } from "@/lib/designs/query-options";
import { DesignTable } from "./design-table";
import { ListSkeleton } from "./list-skeleton";

interface DesignListProps {
  /** What the server has already read. */
  first: DesignPage;
  canEdit: boolean;
}

/** The shop's saved designs, or what stands in their place. */
export function DesignList({ first, canEdit }: DesignListProps) {
  const query = useInfiniteQuery({
    ...designsQuery(),
    initialData: { pages: [first], pageParams: [null] },
  });
  const designs = query.data?.pages.flatMap((page) => page.designs) ?? [];
  if (query.isPending) return <ListSkeleton />;
  return (
    <>
      {query.isError && (
        <div
          role="alert"
          className="mb-4 flex flex-wrap items-center gap-3 border-y border-rule py-3"
        >
          <StatusMark status="over" label="Not loaded" />
          <p className="flex-1">{query.error.message}</p>
          <Button busy={query.isFetching} onClick={() => void query.refetch()}>
            Try again
          </Button>
        </div>
      )}
      {designs.length === 0 && !query.isError ? (
        <NoDesigns canEdit={canEdit} />
      ) : (
        <DesignTable designs={designs} canEdit={canEdit} complete={!query.hasNextPage} />
      )}
      {query.hasNextPage && (
        <p className="mt-4">
          <Button busy={query.isFetchingNextPage} onClick={() => void query.fetchNextPage()}>
            {query.isFetchingNextPage ? "Loading more …" : "Load more"}
          </Button>
        </p>
      )}
    </>
  );
}

function NoDesigns({ canEdit }: { canEdit: boolean }) {
  return (
    <EmptyState
      title="No designs yet"
      action={
        <Link href="/" className="button-primary">
          {canEdit ? "Start on the Bench" : "Look at the Bench"}
        </Link>
      }
    >
      Each design stands here with its tuning, its air speed, its rings and its net volume, as soon
      as one is saved from the Bench.
    </EmptyState>
  );
}
