/** One plan worked out exactly: its trim, its tuning and the tuning's first-order spread. */
import type { Piece } from "@/lib/document/schema";
import { meet, type RingBench } from "./ring-reach";
import { stacksOf, type RingPlan, type RingRequest } from "./ring-request";
import type { RankedMix } from "./ring-mixes";

export interface PlanDraft extends RankedMix {
  /** Taken off the tube, from the solved length [m]; 0 for whole rings. */
  trim_m: number;
}

/** Step of the central difference d f / d length [m]: its error is of the order 1e-6 of the slope. */
const STEP_M = 2e-4;

/** The plan of a draft, or null where its vent cannot be built. The reason is for the planner to say. */
export function planOf(bench: RingBench, draft: PlanDraft): RingPlan | null {
  const { request } = bench;
  const stacks = stacksOf(request, draft.mix);
  const trim_m = draft.trim_m > 0 ? exactTrim(bench, stacks, draft.trim_m) : 0;
  const tuning_hz = bench.tuning(stacks, trim_m);
  if (tuning_hz === null) return null;
  const slope = draft.rings > 0 ? lengthSlope(bench, stacks, trim_m, tuning_hz) : 0;
  return {
    rings: request.sheets
      .map(({ name, thickness_m }, i) => ({ name, thickness_m, count: draft.mix[i] ?? 0 }))
      .filter(({ count }) => count > 0)
      .sort((a, b) => b.thickness_m - a.thickness_m)
      .map(({ name, count }) => ({ sheet: name, count })),
    added_length_m: draft.length_m,
    trim_tube_m: trim_m,
    overall_length_m: bench.restLength_m + draft.length_m - trim_m,
    tuning_hz,
    tuning_sd_hz: Math.abs(slope) * lengthSd(request, draft.mix),
    error_hz: tuning_hz - request.tuning_hz,
    reason: "",
  };
}

/** The solved trim, put right on the true stack within a tenth of a millimetre. */
function exactTrim(bench: RingBench, stacks: Piece[], guess_m: number): number {
  const most = Math.min(bench.mostTrim_m, guess_m + 1e-4);
  const least = Math.max(0, guess_m - 1e-4);
  // Less trim is a longer vent: in −trim the tuning falls.
  const met = meet((x) => bench.tuning(stacks, -x), bench.request.tuning_hz, -most, -least);
  return met === null ? guess_m : Math.max(-met, Math.min(guess_m, bench.request.trim_loss_m));
}

/**
 * Standard deviation of the stack's length [m]:
 *
 *     σ² = Σ_s (n_s σ_s)² + Σ_s n_s w_s² + n g²
 *
 * A sheet's mean is common to its n_s rings, so it adds linearly; the scatter w_s within the sheet
 * and the glue lines' g are independent from ring to ring.
 */
export function lengthSd(request: RingRequest, mix: readonly number[]): number {
  let variance = 0;
  request.sheets.forEach((sheet, i) => {
    const count = mix[i] ?? 0;
    variance += (count * sheet.thickness_sd_m) ** 2;
    variance += count * (sheet.within_sheet_sd_m ?? 0) ** 2;
    variance += count * request.glue_line_sd_m ** 2;
  });
  return Math.sqrt(variance);
}

/** d f / d length of the stack [Hz/m], clearance and all. */
function lengthSlope(bench: RingBench, stacks: Piece[], trim_m: number, tuning_hz: number): number {
  const [first, ...others] = stacks;
  if (first?.kind !== "rings") return 0;
  const stretched = (by: number) =>
    bench.tuning(
      [{ ...first, thickness_m: first.thickness_m + by / first.count }, ...others],
      trim_m,
    );
  const [longer, shorter] = [stretched(STEP_M), stretched(-STEP_M)];
  if (shorter === null) return 0;
  return longer === null ? (tuning_hz - shorter) / STEP_M : (longer - shorter) / (2 * STEP_M);
}
