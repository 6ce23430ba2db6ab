import type { Metadata } from "next";
import { FaultPage } from "@/components/shell/fault-page";

export const metadata: Metadata = { title: "Not found" };

export default function NotFound() {
  return (
    <FaultPage title="Nothing stands here">
      The address may be mistyped, or the design was deleted, or it belongs to another shop.
    </FaultPage>
  );
}
