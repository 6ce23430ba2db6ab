import type { SavedDesign } from "@/lib/designs/contract";

/** What designs can be ordered by, and how it is called. */
export const orderNames = {
  name: "Name",
  tuning_hz: "Tuning",
  air_speed_m_s: "Air speed",
  ring_count: "Rings",
  net_volume_m3: "Net volume",
  updated_at: "Changed",
} as const;

export type OrderKey = keyof typeof orderNames;

export interface DesignOrder {
  key: OrderKey;
  descending: boolean;
}

/** Designs in an order; what is not known stands last either way. */
export function sortDesigns(
  designs: readonly SavedDesign[],
  { key, descending }: DesignOrder,
): SavedDesign[] {
  const sign = descending ? -1 : 1;
  return [...designs].sort((one, two) => {
    const [a, b] = [one[key], two[key]];
    if (a === null || b === null) return a === b ? 0 : a === null ? 1 : -1;
    if (typeof a === "number" && typeof b === "number") return sign * (a - b);
    return sign * String(a).localeCompare(String(b), "en", { numeric: true });
  });
}
