/** The working behind a figure: the formula, the values put in, the source. */
import type { Answer } from "@/lib/acoustics/answer";
import type { Design } from "@/lib/document/schema";
import { formatQuantity } from "@/lib/units/format";
import type { QuantityKind, UnitPreferences } from "@/lib/units/preferences";

export interface Working {
  title: string;
  formula: string;
  lines: { symbol: string; meaning: string; value: string }[];
  result: string;
  source: string;
  note?: string;
}

export type WorkingFigure = "tuning" | "air-speed" | "effective-length" | "net-volume";

/** Null where the figure has nothing to work from. */
export function workingOf(
  figure: string,
  design: Design,
  answer: Answer,
  preferences: UnitPreferences,
  ventIndex: number,
): Working | null {
  const told = (value: number, kind: QuantityKind, digits?: number) =>
    formatQuantity(value, kind, preferences, digits === undefined ? {} : { digits }).text;
  const subject = { design, answer, ventIndex, told };
  if (figure === "tuning") return tuningWorking(subject);
  if (figure === "air-speed") return airSpeedWorking(subject);
  if (figure === "effective-length") return lengthWorking(subject);
  if (figure === "net-volume") return volumeWorking(subject);
  return null;
}

interface Subject {
  design: Design;
  answer: Answer;
  ventIndex: number;
  told: (value: number, kind: QuantityKind, digits?: number) => string;
}

/** The lumped tuning of all vents together, from which the full model departs a little [Hz]. */
export function lumpedTuning(design: Design, answer: Answer): number {
  const { density_kg_m3: rho, speed_of_sound_m_s: c } = answer.air;
  const perMass = answer.vents.reduce(
    (sum, vent, index) => sum + (design.vents[index]?.count ?? 1) / vent.inertance_kg_m4,
    0,
  );
  const compliance = design.enclosure.net_volume_m3 / (rho * c * c);
  return Math.sqrt(perMass / compliance) / (2 * Math.PI);
}

function tuningWorking({ design, answer, told }: Subject): Working | null {
  if (answer.tuning_hz === null) return null;
  const { density_kg_m3: rho, speed_of_sound_m_s: c } = answer.air;
  const lumped = lumpedTuning(design, answer);
  const share = (100 * (answer.tuning_hz / lumped - 1)).toFixed(2);
  return {
    title: "Tuning",
    formula: "f_B = 1 / (2π √(M_A C_A)),  C_A = V_B / (ρ c²),  1/M_A = Σ n S / (ρ L')",
    lines: [
      {
        symbol: "V_B",
        meaning: "net volume",
        value: told(design.enclosure.net_volume_m3, "volume"),
      },
      { symbol: "ρ", meaning: "density of the air", value: `${rho.toFixed(4)} kg/m³` },
      { symbol: "c", meaning: "speed of sound", value: told(c, "speed", 2) },
      ...answer.vents.map((vent, index) => ({
        symbol: answer.vents.length > 1 ? `L' ${index + 1}` : "L'",
        meaning: `effective length, ${design.vents[index]?.count ?? 1} × ${told(vent.bore_area_m2, "area")}`,
        value: told(vent.effective_length_m, "length"),
      })),
      { symbol: "f", meaning: "all air lumped, no losses", value: told(lumped, "frequency", 2) },
    ],
    result: `f_B = ${told(answer.tuning_hz, "frequency", 2)}, ${share} % from the lumped value: the vent's air is compressible, and its boundary layer adds mass.`,
    source:
      "Helmholtz resonator with the vent as a lossy line (Kirchhoff's boundary layers in the wide-tube form), own composition, within 0.1 % of four field-solved resonators.",
  };
}

function airSpeedWorking({ design, answer, ventIndex, told }: Subject): Working | null {
  const vent = answer.vents[ventIndex];
  const peak = vent?.peak_air_speed;
  if (!vent || !peak) return null;
  const flow = peak.speed_m_s * vent.bore_area_m2;
  const stroke = (2 * peak.speed_m_s) / (2 * Math.PI * peak.frequency_hz);
  return {
    title: "Air speed",
    formula: "v = √2 |U| / S at the frequency where it is largest",
    lines: [
      {
        symbol: "e",
        meaning: "drive voltage, rms",
        value: told(design.drive.voltage_v, "voltage"),
      },
      {
        symbol: "√2 |U|",
        meaning: "peak flow of one vent",
        value: `${(flow * 1000).toFixed(2)} L/s`,
      },
      { symbol: "S", meaning: "bore area", value: told(vent.bore_area_m2, "area") },
      { symbol: "2 v/ω", meaning: "air stroke, peak to peak", value: told(stroke, "length") },
    ],
    result: `v = ${told(peak.speed_m_s, "speed")} peak at ${told(peak.frequency_hz, "frequency")}`,
    source:
      "Small 1973, the vented-box circuit, solved with all of the system's elements. Linear: at high level the vent's own loss makes it less.",
    note: "A limit on air speed is a choice. 5 % of the speed of sound is the bookwork's usual one; no source fixes what is heard.",
  };
}

function lengthWorking({ answer, ventIndex, told }: Subject): Working | null {
  const vent = answer.vents[ventIndex];
  if (!vent) return null;
  const ends = vent.end_corrections_m;
  const lines = [
    { symbol: "L", meaning: "overall, face to face", value: told(vent.overall_length_m, "length") },
    {
      symbol: "δ outer",
      meaning: "end air beyond the outer mouth",
      value: told(ends.outer, "length"),
    },
    {
      symbol: "δ inner",
      meaning: "end air beyond the inner mouth",
      value: told(ends.inner, "length"),
    },
    {
      symbol: "δ box",
      meaning: "the enclosure air's own mass",
      value: told(ends.enclosure_air, "length"),
    },
  ];
  if (ends.bore_steps !== 0)
    lines.push({
      symbol: "δ steps",
      meaning: "steps and bends of the bore",
      value: told(ends.bore_steps, "length"),
    });
  return {
    title: "Vent length",
    formula: "L' = L + δ outer + δ inner + δ box + δ steps",
    lines,
    result: `L' = ${told(vent.effective_length_m, "length")}, referred to the bore`,
    source:
      "End corrections: own fits to field solutions of flanged, free, thick-walled, flared and confined ends, within 0.01 of the bore radius; counted from the mouth planes.",
    note: "The correction of a widely flared end can be negative: its own air moves slowly.",
  };
}

function volumeWorking({ design, answer, told }: Subject): Working {
  const { net_volume_m3: net, inside_m: inside } = design.enclosure;
  const vents = answer.vents.reduce(
    (sum, vent, index) => sum + vent.displaced_volume_m3 * (design.vents[index]?.count ?? 1),
    0,
  );
  const driver = (design.driver?.displacement_m3 ?? 0) * (design.driver?.count ?? 1);
  const gross = inside ? inside.width * inside.height * inside.depth : null;
  return {
    title: "Net volume",
    formula: "gross inside − vents − drivers − braces = net",
    lines: [
      ...(gross === null
        ? []
        : [
            {
              symbol: "gross",
              meaning: "inside width × height × depth",
              value: told(gross, "volume"),
            },
          ]),
      { symbol: "vents", meaning: "bore and wall, inside the panel", value: told(vents, "volume") },
      { symbol: "drivers", meaning: "magnet and basket", value: told(driver, "volume") },
      ...(gross === null
        ? []
        : [
            {
              symbol: "left",
              meaning: "before braces and lining",
              value: told(gross - vents - driver, "volume"),
            },
          ]),
    ],
    result: `${told(net, "volume")} net is what the design counts with`,
    source: "Bookkeeping; common practice, no source.",
  };
}
