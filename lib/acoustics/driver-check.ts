/** Whether the figures of a driver's data sheet agree with one another. */
import { midBandLevel, referenceEfficiency, totalQ, type Mechanical } from "./driver";
import type { AirProperties } from "./vent-model";

/** What a data sheet may hold; nothing is required. */
export interface DriverFigures {
  fs_hz: number;
  qes: number;
  qms: number;
  qts: number;
  vas_m3: number;
  re_ohm: number;
  sd_m2: number;
  mms_kg: number;
  cms_m_n: number;
  rms_kg_s: number;
  bl_t_m: number;
  /** Reference efficiency as a share, not in percent. */
  efficiency: number;
  /** Level at 2.83 V, 1 m, half space. */
  sensitivity_db: number;
}

export type DriverFigure = keyof DriverFigures;

export interface DriverCheck {
  /** The figure that is compared, as given and as the others give it. */
  figure: DriverFigure;
  from: DriverFigure[];
  given: number;
  expected: number;
  /** given / expected − 1; for the sensitivity, that of the pressure. */
  deviation: number;
  agrees: boolean;
}

export interface DriverCheckResult {
  checks: DriverCheck[];
  /** Figures that every disagreement has in common and no agreement uses; the likely culprits. */
  suspects: DriverFigure[];
}

interface Relation {
  figure: DriverFigure;
  from: DriverFigure[];
  expect(figures: DriverFigures, air: AirProperties): number;
}

const omega = (figures: DriverFigures) => 2 * Math.PI * figures.fs_hz;
const mechanical = (figures: DriverFigures): Mechanical => figures;

/** The identities of the dossier's section 3.2, each with the figures it needs. */
const relations: readonly Relation[] = [
  { figure: "qts", from: ["qes", "qms"], expect: (d) => totalQ(d.qes, d.qms) },
  {
    figure: "fs_hz",
    from: ["mms_kg", "cms_m_n"],
    expect: (d) => 1 / (2 * Math.PI * Math.sqrt(d.mms_kg * d.cms_m_n)),
  },
  {
    figure: "vas_m3",
    from: ["cms_m_n", "sd_m2"],
    expect: (d, air) => air.density * air.speedOfSound ** 2 * d.sd_m2 ** 2 * d.cms_m_n,
  },
  {
    figure: "mms_kg",
    from: ["fs_hz", "vas_m3", "sd_m2"],
    expect: (d, air) =>
      (air.density * air.speedOfSound ** 2 * d.sd_m2 ** 2) / (omega(d) ** 2 * d.vas_m3),
  },
  {
    figure: "qes",
    from: ["fs_hz", "mms_kg", "re_ohm", "bl_t_m"],
    expect: (d) => (omega(d) * d.mms_kg * d.re_ohm) / d.bl_t_m ** 2,
  },
  {
    figure: "qms",
    from: ["fs_hz", "mms_kg", "rms_kg_s"],
    expect: (d) => (omega(d) * d.mms_kg) / d.rms_kg_s,
  },
  {
    figure: "efficiency",
    from: ["fs_hz", "vas_m3", "qes"],
    expect: (d, air) =>
      ((4 * Math.PI ** 2) / air.speedOfSound ** 3) * d.fs_hz ** 3 * (d.vas_m3 / d.qes),
  },
  {
    figure: "efficiency",
    from: ["bl_t_m", "sd_m2", "re_ohm", "mms_kg"],
    expect: (d, air) => referenceEfficiency(mechanical(d), air),
  },
  {
    figure: "sensitivity_db",
    from: ["bl_t_m", "sd_m2", "re_ohm", "mms_kg"],
    expect: (d, air) => midBandLevel(mechanical(d), air, 2.83),
  },
];

/**
 * Compares every figure that the others also determine.
 *
 * @param air - the air that V_AS refers to
 * @param tolerance - largest deviation that is put down to rounding, default 3 %; for a level 0.5 dB
 * @returns the checks that could be made, and which figures are the likely culprits
 * @remarks V_AS goes with S_D², so a nominal cone diameter shows as a suspect S_D.
 * @source identities: vented-box dossier 3.2
 */
export function checkDriver(
  figures: Partial<DriverFigures>,
  air: AirProperties,
  tolerance = 0.03,
): DriverCheckResult {
  const isGiven = (name: DriverFigure) => {
    const value = figures[name];
    return (
      value !== undefined && Number.isFinite(value) && (value > 0 || name === "sensitivity_db")
    );
  };
  const checks = relations
    .filter(({ figure, from }) => [figure, ...from].every(isGiven))
    .map(({ figure, from, expect }) => {
      const given = figures[figure]!;
      const expected = expect(figures as DriverFigures, air);
      const level = figure === "sensitivity_db";
      const deviation = level ? 10 ** ((given - expected) / 20) - 1 : given / expected - 1;
      const limit = level ? 10 ** (0.5 / 20) - 1 : tolerance;
      return { figure, from, given, expected, deviation, agrees: Math.abs(deviation) <= limit };
    });
  return { checks, suspects: suspectsOf(checks) };
}

function suspectsOf(checks: DriverCheck[]): DriverFigure[] {
  const failing = checks.filter((check) => !check.agrees);
  if (failing.length === 0) return [];
  const used = (check: DriverCheck) => [check.figure, ...check.from];
  const cleared = new Set(checks.filter((check) => check.agrees).flatMap(used));
  const common = used(failing[0]!).filter((name) =>
    failing.every((check) => used(check).includes(name)),
  );
  const likely = common.filter((name) => !cleared.has(name));
  return likely.length > 0 ? likely : common;
}
