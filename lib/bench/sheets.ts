/**
 * The sheets at hand on the Bench: what ring plans may be cut from. Kept in the browser. The
 * defaults are usual means of birch plywood, to be corrected with calipers.
 */
export interface Sheet {
  name: string;
  thickness_m: number;
  /** Uncertainty of the sheet's mean [m]. */
  thickness_sd_m: number;
  /** Scatter from ring to ring within the sheet [m]. */
  within_sheet_sd_m: number;
  use: boolean;
}

/** Typical means of sanded birch plywood, one merchant's data sheet; spreads from the low–high range. */
export const usualSheets: Sheet[] = [
  {
    name: "18 mm ply",
    thickness_m: 0.0177,
    thickness_sd_m: 0.00012,
    within_sheet_sd_m: 0.0001,
    use: true,
  },
  {
    name: "15 mm ply",
    thickness_m: 0.0149,
    thickness_sd_m: 0.00012,
    within_sheet_sd_m: 0.0001,
    use: false,
  },
  {
    name: "12 mm ply",
    thickness_m: 0.012,
    thickness_sd_m: 0.00012,
    within_sheet_sd_m: 0.0001,
    use: true,
  },
  {
    name: "9 mm ply",
    thickness_m: 0.0092,
    thickness_sd_m: 0.0001,
    within_sheet_sd_m: 0.0001,
    use: false,
  },
];

export interface RingHabits {
  sheets: Sheet[];
  mayTrimTube: boolean;
  /** Least the saw can take off [m]. */
  trimLoss_m: number;
  glueLine_m: number;
  glueLineSd_m: number;
  maxRings: number;
}

export const usualHabits: RingHabits = {
  sheets: usualSheets,
  mayTrimTube: true,
  trimLoss_m: 0.001,
  glueLine_m: 0.0001,
  glueLineSd_m: 0.00003,
  maxRings: 12,
};

const KEY = "ventwright.ring-habits";

export function readRingHabits(): RingHabits {
  try {
    const kept: unknown = JSON.parse(window.localStorage.getItem(KEY) ?? "null");
    return isHabits(kept) ? { ...usualHabits, ...kept } : usualHabits;
  } catch {
    return usualHabits;
  }
}

function isHabits(value: unknown): value is Partial<RingHabits> & Pick<RingHabits, "sheets"> {
  return (
    typeof value === "object" && value !== null && "sheets" in value && Array.isArray(value.sheets)
  );
}

export function keepRingHabits(habits: RingHabits): void {
  try {
    window.localStorage.setItem(KEY, JSON.stringify(habits));
  } catch {
    // Without storage the habits last as long as the page.
  }
}
