/**
 * The four figures that decide: tuning, air speed, rings (or length), net volume. As plain data,
 * for the strip on the Bench, the list of designs and the texts.
 */
import type { Answer } from "@/lib/acoustics/answer";
import type { AirwayVent, Design } from "@/lib/document/schema";

export interface KeyFigures {
  tuning_hz: number | null;
  target_hz: number | null;
  /** Of the vent that runs fastest. */
  air_speed_m_s: number | null;
  air_speed_hz: number | null;
  air_speed_limit_m_s: number | null;
  /** Rings of the vent shown, by thickness, in order. */
  rings: { count: number; thickness_m: number }[];
  rings_length_m: number;
  overall_length_m: number | null;
  net_volume_m3: number;
  gross_volume_m3: number | null;
  vents_volume_m3: number;
}

export function keyFiguresOf(design: Design, answer: Answer | null, ventIndex = 0): KeyFigures {
  const fastest = (answer?.vents ?? []).reduce<{ speed_m_s: number; frequency_hz: number } | null>(
    (best, { peak_air_speed: peak }) =>
      peak && (!best || peak.speed_m_s > best.speed_m_s) ? peak : best,
    null,
  );
  const vent = design.vents[ventIndex];
  const stacks =
    vent && !("lumped" in vent)
      ? vent.pieces.filter((piece) => piece.kind === "rings" && piece.count > 0)
      : [];
  const rings = stacks.filter((piece): piece is RingStack => piece.kind === "rings");
  const inside = design.enclosure.inside_m;
  return {
    tuning_hz: answer?.tuning_hz ?? null,
    target_hz: design.target.tuning_hz,
    air_speed_m_s: fastest?.speed_m_s ?? null,
    air_speed_hz: fastest?.frequency_hz ?? null,
    air_speed_limit_m_s: design.target.air_speed_limit_m_s,
    rings: rings.map(({ count, thickness_m }) => ({ count, thickness_m })),
    rings_length_m: rings.reduce(
      (sum, piece) => sum + piece.count * (piece.thickness_m + piece.glue_line_m),
      0,
    ),
    overall_length_m: answer?.vents[ventIndex]?.overall_length_m ?? null,
    net_volume_m3: design.enclosure.net_volume_m3,
    gross_volume_m3: inside ? inside.width * inside.height * inside.depth : null,
    vents_volume_m3: (answer?.vents ?? []).reduce((sum, figures, index) => {
      const count = design.vents[index]?.count ?? 1;
      return sum + count * figures.displaced_volume_m3;
    }, 0),
  };
}

type RingStack = Extract<AirwayVent["pieces"][number], { kind: "rings" }>;
