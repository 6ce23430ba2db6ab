/** The plain C computation of one answer's formulas, built and run beside the library's. */
import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { airProperties } from "@/lib/acoustics/air";
import { mechanicalFrom, referenceAir } from "@/lib/acoustics/driver";
import { arrangement, driverArray } from "@/lib/acoustics/driver-array";
import { filterSections } from "@/lib/acoustics/filters";
import { enclosureCompliance } from "@/lib/acoustics/system";
import { tuningOf } from "@/lib/acoustics/tuning";
import { ventParts } from "@/lib/acoustics/vent-parts";
import type { Design, Vent } from "@/lib/document/schema";

export interface PlainAnswer {
  median_ms: number;
  tuning_hz: number;
  spl_db: number[];
}

/** Runs bench/c/evaluate.c on a design; null where there is no compiler. */
export function plainEvaluate(design: Design): PlainAnswer | null {
  if (spawnSync("cc", ["--version"]).status !== 0) return null;
  const folder = mkdtempSync(join(tmpdir(), "ventwright-bench-"));
  try {
    const program = join(folder, "evaluate");
    const built = spawnSync("cc", ["-O2", "-o", program, "bench/c/evaluate.c", "-lm"]);
    if (built.status !== 0) throw new Error(`The C did not compile.\n${built.stderr}`);
    const ran = spawnSync(program, { input: numbersOf(design).join(" "), encoding: "utf8" });
    if (ran.status !== 0) throw new Error(`The C ended with ${ran.status}.`);
    const [median_ms, tuning_hz, ...spl_db] = ran.stdout.trim().split(" ").map(Number);
    return { median_ms: median_ms!, tuning_hz: tuning_hz!, spl_db };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** The design as the C reads it: air, array, enclosure, drive, limits, filters, vents. */
function numbersOf(design: Design): number[] {
  const { driver, enclosure, drive, amplifier, target } = design;
  const tuning_hz = tuningOf(design);
  if (!driver || tuning_hz === null) throw new Error("The design lacks a driver or a vent.");
  const air = airProperties(design.air);
  const wiring = arrangement(driver);
  const array = driverArray(mechanicalFrom(driver, referenceAir(design.air)), wiring);
  const compliance = enclosureCompliance(enclosure.net_volume_m3, air);
  const loss = 2 * Math.PI * tuning_hz * compliance;
  const scale = wiring.series / wiring.parallel;
  const far = 1e300;
  const thermal = driver.power_w
    ? Math.sqrt(driver.power_w * driver.re_ohm * scale * driver.count)
    : far;
  const sections = design.filters.flatMap((filter) => {
    const { q, firstOrder } = filterSections(filter);
    const high = filter.kind === "highpass" ? 1 : 0;
    const corner = 2 * Math.PI * filter.frequency_hz;
    const second = q.map((value) => [high, 2, corner, value]);
    return firstOrder ? [...second, [high, 1, corner, 0]] : second;
  });
  return [
    ...[air.density, air.speedOfSound, air.kinematicViscosity, air.heatCapacityRatio, air.prandtl],
    ...[array.mms_kg, array.cms_m_n, array.rms_kg_s, array.bl_t_m, array.sd_m2, array.re_ohm],
    scale * (driver.le_h ?? 0),
    ...[compliance, enclosure.ql ? loss / enclosure.ql : 0],
    enclosure.qa ? 1 / (enclosure.qa * loss) : 0,
    ...[drive.source_resistance_ohm, drive.voltage_v],
    ...[driver.xmax_m ?? far, target.air_speed_limit_m_s ?? far, thermal],
    ...[amplifier?.voltage_limit_v ?? far, amplifier?.minimum_load_ohm ?? 0],
    ...[sections.length, ...sections.flat()],
    ...[design.vents.length, ...design.vents.flatMap((vent) => ventNumbers(vent, design))],
  ];
}

function ventNumbers(vent: Vent, { enclosure }: Design): number[] {
  if ("lumped" in vent) throw new Error("The C knows no lumped vent.");
  const parts = ventParts(vent, enclosure, "design.vents");
  const { boreArea_m2, boreRadius_m } = parts.airway;
  return [
    ...[vent.count, boreArea_m2, boreRadius_m, parts.outerLump, parts.innerLump + parts.plane],
    parts.lines.length,
    ...parts.lines.flatMap(({ length, radius, perimeterRadius }) => [
      length,
      radius,
      perimeterRadius,
    ]),
  ];
}
