/** What the designs' routes take and give. */
import type { Design } from "@/lib/document/schema";

export interface DesignRow {
  id: string;
  name: string;
  tuning_hz: number | null;
  air_speed_m_s: number | null;
  ring_count: number;
  net_volume_m3: number;
  version: number;
  updated_at: string;
  updated_by: string | null;
}

export interface SavedDesign extends DesignRow {
  document: Design;
  created_at: string;
}

export interface DesignPage {
  designs: SavedDesign[];
  /** Pass as `after` for the next page; null at the end. */
  next: string | null;
}
