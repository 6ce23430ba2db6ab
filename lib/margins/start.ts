/** A design to begin with, from three answers: which driver, what for, how much room. */
import { lengthForTuning } from "@/lib/acoustics/length";
import { evaluate } from "@/lib/acoustics";
import { InputError } from "@/lib/acoustics/input-error";
import { setTubeLength } from "@/lib/bench/edits";
import { designSchema, type Design, type Driver } from "@/lib/document/schema";

export type DriverSize = "none" | "6" | "8" | "10" | "12" | "15";
export type Use = "music" | "film" | "car";

export interface StartAnswers {
  driver: DriverSize;
  use: Use;
  /** Net volume there is room for [m³]. */
  net_volume_m3: number;
}

/** Generic drivers of our own invention, by nominal size in inches, to be overtyped. */
const drivers: Record<Exclude<DriverSize, "none">, Driver> = {
  "6": {
    count: 1,
    wiring: "parallel",
    fs_hz: 42,
    qes: 0.42,
    qms: 5,
    vas_m3: 0.016,
    re_ohm: 5.6,
    sd_m2: 0.0136,
    xmax_m: 0.006,
    power_w: 80,
    displacement_m3: 0.0006,
  },
  "8": {
    count: 1,
    wiring: "parallel",
    fs_hz: 32,
    qes: 0.42,
    qms: 6.5,
    vas_m3: 0.038,
    re_ohm: 3.4,
    sd_m2: 0.0214,
    le_h: 0.0011,
    xmax_m: 0.009,
    power_w: 200,
    displacement_m3: 0.0015,
  },
  "10": {
    count: 1,
    wiring: "parallel",
    fs_hz: 28,
    qes: 0.45,
    qms: 7.2,
    vas_m3: 0.062,
    re_ohm: 3.6,
    sd_m2: 0.0346,
    le_h: 0.0016,
    xmax_m: 0.012,
    power_w: 300,
    displacement_m3: 0.0025,
  },
  "12": {
    count: 1,
    wiring: "parallel",
    fs_hz: 24.5,
    qes: 0.4,
    qms: 8,
    vas_m3: 0.11,
    re_ohm: 3.3,
    sd_m2: 0.052,
    le_h: 0.0022,
    xmax_m: 0.014,
    power_w: 400,
    displacement_m3: 0.0035,
  },
  "15": {
    count: 1,
    wiring: "parallel",
    fs_hz: 22,
    qes: 0.38,
    qms: 7,
    vas_m3: 0.2,
    re_ohm: 3.2,
    sd_m2: 0.0855,
    le_h: 0.0025,
    xmax_m: 0.014,
    power_w: 500,
    displacement_m3: 0.006,
  },
};

/** Tunings met in the trade for each use [Hz]: common practice, no source. */
const tunings: Record<Use, number> = { music: 35, film: 24, car: 34 };

/** Bores that are sold [m]; the smallest quiet one that fits is taken. */
const bores_m = [0.05, 0.068, 0.076, 0.101, 0.125, 0.151, 0.2];

/** Sheet the rings and the panel are cut from [m]. */
const SHEET_M = 0.0177;

const AIR_SPEED_M_S = 17;

/**
 * A design whose vent is tuned, has room behind it, and stays inside the usual air speed where any
 * stock bore does; else the drive is turned down until it does.
 */
export function startFromAnswers(answers: StartAnswers): Design {
  const driver = answers.driver === "none" ? null : drivers[answers.driver];
  const small = Math.cbrt(answers.net_volume_m3 / 0.04);
  const tuning = Math.round(tunings[answers.use] * Math.min(1.6, Math.max(0.85, 1 / small ** 0.5)));
  const choices = bores_m.flatMap((bore) => {
    const design = withBore(answers, driver, tuning, bore);
    return design ? [design] : [];
  });
  const quiet = choices.find((design) => speedOf(design) <= AIR_SPEED_M_S);
  if (quiet) return quiet;
  const widest = choices.at(-1) ?? basis(answers, driver, tuning, bores_m[1]!);
  const speed = speedOf(widest);
  const voltage_v =
    Math.floor(10 * widest.drive.voltage_v * Math.min(1, AIR_SPEED_M_S / speed)) / 10;
  return { ...widest, drive: { ...widest.drive, voltage_v: Math.max(1, voltage_v) } };
}

function speedOf(design: Design): number {
  return evaluate(design).vents[0]?.peak_air_speed?.speed_m_s ?? 0;
}

function basis(answers: StartAnswers, driver: Driver | null, tuning: number, bore: number): Design {
  // Room for driver, vent and braces besides the net volume; deeper than wide, as the vent likes it.
  const side = Math.cbrt(answers.net_volume_m3 * 1.16 + (driver?.displacement_m3 ?? 0));
  const centimetre = (value: number) => Math.round(value * 200) / 200;
  const inside_m = {
    width: centimetre(side * 0.86),
    height: centimetre(side * 0.96),
    depth: centimetre(side * 1.22),
  };
  const power = driver ? Math.min(driver.power_w ?? 100, 150) : 0;
  return designSchema.parse({
    format: 1,
    name: "New design",
    driver,
    enclosure: {
      net_volume_m3: answers.net_volume_m3,
      inside_m,
      panel_thickness_m: driver && driver.sd_m2 > 0.03 ? 2 * SHEET_M : SHEET_M,
      ql: 7,
    },
    vents: [
      {
        name: "Port",
        bore: { shape: "round", diameter_m: bore },
        outer_end: { flare_radius_m: Math.min(0.019, bore / 4) },
        pieces: [
          {
            kind: "tube",
            length_m: 0.15,
            outer_diameter_m: Math.round((bore + 0.006) * 1e4) / 1e4,
          },
          {
            kind: "rings",
            count: 3,
            thickness_m: SHEET_M,
            outer_diameter_m: Math.round((bore + 0.056) * 1000) / 1000,
            glue_line_m: 0.0001,
          },
        ],
        inner_end: { flare_radius_m: Math.min(0.0127, bore / 5) },
      },
    ],
    drive: { voltage_v: driver ? Math.round(Math.sqrt(power * driver.re_ohm)) : 2.83 },
    filters: driver
      ? [
          {
            kind: "highpass",
            family: "butterworth",
            order: 4,
            frequency_hz: Math.round(tuning * 0.78),
          },
          { kind: "lowpass", family: "linkwitz-riley", order: 4, frequency_hz: 90 },
        ]
      : [],
    target: { tuning_hz: tuning, air_speed_limit_m_s: AIR_SPEED_M_S },
  });
}

/** The basis with its tube solved for the tuning, rings given up one by one where the vent would be too long for them. */
function withBore(
  answers: StartAnswers,
  driver: Driver | null,
  tuning: number,
  bore: number,
): Design | null {
  const design = basis(answers, driver, tuning, bore);
  try {
    const { tube_length_m, overall_length_m } = lengthForTuning(design, 0, tuning);
    const inside = design.enclosure.inside_m;
    const room = (inside?.depth ?? 0) + design.enclosure.panel_thickness_m - bore;
    if (tube_length_m < 0.03 || overall_length_m > room) return null;
    return setTubeLength(design, 0, Math.round(tube_length_m * 1e4) / 1e4);
  } catch (error) {
    if (error instanceof InputError) return null;
    throw error;
  }
}
