/** The lines a design's curves are held against. */
import type { Answer } from "@/lib/acoustics/answer";
import type { CurveLimits } from "@/lib/charts/strips";
import type { Design } from "@/lib/document/schema";

export function limitsOf(design: Design, answer: Answer | null): CurveLimits {
  return {
    air_speed_m_s: design.target.air_speed_limit_m_s,
    xmax_m: design.driver?.xmax_m ?? null,
    minimum_load_ohm: design.amplifier?.minimum_load_ohm ?? null,
    tuning_hz: answer?.tuning_hz ?? null,
  };
}
