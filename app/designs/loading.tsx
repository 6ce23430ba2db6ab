import { ListSkeleton } from "@/components/designs/list-skeleton";

export default function Loading() {
  return (
    <main id="main" className="page">
      <h1 className="title-wide mb-4 text-xl">Designs</h1>
      <ListSkeleton />
    </main>
  );
}
