import { Skeleton } from "@/components/ui/skeleton";

/** The list's ruling before its lines are known. */
export function ListSkeleton() {
  return (
    <div role="status" className="divide-y divide-rule border-y border-rule">
      <span className="sr-only">Loading the designs</span>
      {[48, 36, 56, 40, 44].map((width, at) => (
        <div key={at} className="flex h-14 items-center justify-between gap-6">
          <span style={{ width: `${width}%` }}>
            <Skeleton className="h-4 w-full max-w-56" />
          </span>
          <Skeleton className="h-4 w-40" />
        </div>
      ))}
    </div>
  );
}
