/**
 * How sure a tuning is: first-order, from habits of the shop where nothing else is known.
 *
 *     d ln f = −½ d ln V − ½ dL/L' + (1 − Σδ/(2L')) d ln a − ½ dδ/L'
 *
 * @source own derivation from f = (c/2π) √(S/(V L')); reference notes on sensitivity, section 11
 */
import type { Answer } from "@/lib/acoustics/answer";
import type { Design } from "@/lib/document/schema";

/** Standard uncertainties taken where the design carries none: habits of the trade, to be overruled by measurement. */
export const usualSpread = {
  /** Share of the net volume. */
  volume: 0.02,
  /** Of a calipered bore [m]. */
  bore_m: 0.0003,
  /** Of a cut tube's length [m]. */
  tube_m: 0.0005,
  /** Of one ring with its glue line [m]. */
  ring_m: 0.00012,
  /** Of both end corrections together, in bore radii. */
  ends: 0.07,
  /** Of the air's temperature [K]. */
  temperature_k: 2,
};

export interface TuningSpread {
  sd_hz: number;
  /** Largest first. */
  causes: { name: string; sd_hz: number }[];
}

export function tuningSpread(design: Design, answer: Answer): TuningSpread {
  const f = answer.tuning_hz ?? 0;
  // Several unlike vents: the one that carries most of the air decides.
  const weights = answer.vents.map(
    (vent, index) => (design.vents[index]?.count ?? 1) / vent.inertance_kg_m4,
  );
  const at = weights.indexOf(Math.max(...weights));
  const vent = answer.vents[at];
  const shape = design.vents[at];
  if (!vent || !shape) return { sd_hz: 0, causes: [] };
  const share = (weights[at] ?? 0) / weights.reduce((sum, weight) => sum + weight, 0);
  const effective = vent.effective_length_m;
  const radius = Math.sqrt(vent.bore_area_m2 / Math.PI);
  const rings =
    "lumped" in shape
      ? 0
      : shape.pieces.reduce((sum, piece) => sum + (piece.kind === "rings" ? piece.count : 0), 0);
  const ends = vent.end_corrections_m.outer + vent.end_corrections_m.inner;
  const causes = [
    { name: "net volume", sd_hz: 0.5 * f * usualSpread.volume },
    {
      name: "bore",
      sd_hz: share * f * Math.abs(1 - ends / (2 * effective)) * (usualSpread.bore_m / (2 * radius)),
    },
    { name: "end corrections", sd_hz: (share * 0.5 * f * usualSpread.ends * radius) / effective },
    { name: "tube length", sd_hz: (share * 0.5 * f * usualSpread.tube_m) / effective },
    { name: "rings", sd_hz: (share * 0.5 * f * usualSpread.ring_m * rings) / effective },
    { name: "temperature", sd_hz: (0.5 * f * usualSpread.temperature_k) / 293.15 },
  ].sort((a, b) => b.sd_hz - a.sd_hz);
  return { sd_hz: Math.hypot(...causes.map(({ sd_hz }) => sd_hz)), causes };
}
