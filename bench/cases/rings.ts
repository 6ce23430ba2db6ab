/** One ring plan: four sheets, up to twelve rings, with trimming. */
import { denSub } from "@/lib/document/samples";
import { designSchema } from "@/lib/document/schema";
import { planRings, type RingRequest } from "@/lib/workshop/rings";

const RUNS = 40;

export async function bench() {
  const request: RingRequest = {
    design: designSchema.parse(denSub),
    vent: 0,
    tuning_hz: 32,
    sheets: [0.0177, 0.0149, 0.012, 0.0092].map((thickness_m) => ({
      name: `${(thickness_m * 1000).toFixed(1)} mm`,
      thickness_m,
      thickness_sd_m: 0.00012,
      within_sheet_sd_m: 0.0001,
    })),
    ring_outer_diameter_m: 0.16,
    glue_line_m: 0.0001,
    glue_line_sd_m: 0.00003,
    max_rings: 12,
    may_trim_tube: true,
    trim_loss_m: 0.001,
  };
  let plans = 0;
  const times: number[] = [];
  for (let run = 0; run < RUNS + 5; run++) {
    const began = performance.now();
    plans = planRings(request).plans.length;
    if (run >= 5) times.push(performance.now() - began);
  }
  times.sort((a, b) => a - b);
  return {
    name: "rings",
    median_ms: times[times.length >> 1]!,
    ratio_to_c: null,
    notes: [`${plans} plans from four sheets and up to twelve rings`],
  };
}
