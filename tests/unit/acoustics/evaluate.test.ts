import { describe, expect, it } from "vitest";
import { evaluate, InputError } from "@/lib/acoustics";
import { demoDesigns, denSub, ventOnly } from "@/lib/document/samples";
import { designSchema, type DesignInput } from "@/lib/document/schema";

const den = designSchema.parse(denSub);
const with_ = (changes: object) => designSchema.parse({ ...denSub, ...changes });
const close = (a: number[], b: number[]) =>
  a.forEach((value, i) => expect(Math.abs(value - b[i]!)).toBeLessThan(1e-9 * Math.abs(b[i]!)));

describe("what is answered", () => {
  it("400 logarithmic points from 10 to 500 Hz unless told otherwise", () => {
    const f = evaluate(den).curves!.frequency_hz;
    expect([f.length, f[0], f.at(-1)]).toEqual([400, 10, 500]);
    expect(f[1]! / f[0]!).toBeCloseTo(f[399]! / f[398]!, 12);
  });
  it("without a driver: tuning and vents, no curves", () => {
    const answer = evaluate(designSchema.parse(ventOnly));
    expect(answer.driver).toBeNull();
    expect(answer.curves).toBeNull();
    expect(answer.tuning_hz).toBeGreaterThan(20);
    expect(answer.vents[0]!.peak_air_speed).toBeNull();
  });
  it("without a vent: curves, no tuning", () => {
    const answer = evaluate(with_({ vents: [] }));
    expect(answer.tuning_hz).toBeNull();
    expect(answer.vents).toEqual([]);
    expect(answer.curves!.air_speed_peak_m_s).toEqual([]);
  });
  it("at 0 V: a note instead of a level", () => {
    const answer = evaluate(with_({ drive: { voltage_v: 0 } }));
    expect(answer.curves).toBeNull();
    expect(answer.notes.map((note) => note.code)).toContain("drive_is_zero");
    expect(answer.driver).not.toBeNull();
  });
  it("says what is not modelled yet", () => {
    const codes = (options: object) => evaluate(den, options).notes.map((note) => note.code);
    expect(codes({ level: "drive" })).toContain("level_not_modelled");
    expect(codes({ solver: "field" })).toContain("field_solver_not_landed");
    expect(codes({})).not.toContain("level_not_modelled");
  });
  it("only finite numbers, in every sample", () => {
    const numbers = (value: unknown): number[] =>
      typeof value === "number"
        ? [value]
        : typeof value === "object" && value !== null
          ? Object.values(value).flatMap(numbers)
          : [];
    for (const design of demoDesigns)
      expect(numbers(evaluate(designSchema.parse(design))).every(Number.isFinite)).toBe(true);
  });
  it("a vent that cannot be is refused with its place", () => {
    const long = { kind: "tube", length_m: 2, outer_diameter_m: 0.107 };
    const design = with_({ vents: [{ ...denSub.vents[0], pieces: [long] }] });
    expect(() => evaluate(design)).toThrow(InputError);
  });
});

describe("peak air speed", () => {
  it("does not depend on the frequencies that are asked for", () => {
    const usual = evaluate(den).vents[0]!.peak_air_speed!;
    const asked = evaluate(den, { frequency_hz: [100] }).vents[0]!.peak_air_speed!;
    expect(asked).toEqual(usual);
  });
  it("is the maximum: no finer grid finds more", () => {
    const peak = evaluate(den).vents[0]!.peak_air_speed!;
    const frequency_hz = Array.from({ length: 4000 }, (_, i) => 15 + 0.01 * i);
    const finest = Math.max(...evaluate(den, { frequency_hz }).curves!.air_speed_peak_m_s[0]!);
    expect(peak.speed_m_s / finest).toBeGreaterThan(1 - 1e-7);
    expect(peak.speed_m_s / finest).toBeLessThan(1 + 1e-5);
  });
  it("is found for a tuning far outside the usual frequencies", () => {
    const design = designSchema.parse({
      format: 1,
      driver: { fs_hz: 2, qes: 0.4, qms: 5, vas_m3: 2, re_ohm: 4, sd_m2: 0.1 },
      enclosure: { net_volume_m3: 2, panel_thickness_m: 0.02, ql: 7 },
      vents: [{ lumped: { inertance_kg_m4: 450, area_m2: 0.03 } }],
    });
    const answer = evaluate(design);
    expect(answer.tuning_hz).toBeLessThan(5);
    const { frequency_hz } = answer.vents[0]!.peak_air_speed!;
    expect(frequency_hz / answer.tuning_hz!).toBeGreaterThan(0.5);
    expect(frequency_hz / answer.tuning_hz!).toBeLessThan(1.2);
  });
});

describe("the same thing said in two ways", () => {
  const lumped = (inertance_kg_m4: number, area_m2: number) => ({
    lumped: { inertance_kg_m4, area_m2, resistance_pa_s_m3: 60 },
  });
  it("one vent of count 2 and two like vents", () => {
    const one = evaluate(with_({ vents: [{ ...lumped(120, 0.004), count: 2 }] }));
    const two = evaluate(with_({ vents: [lumped(120, 0.004), lumped(120, 0.004)] }));
    close(two.curves!.spl_db, one.curves!.spl_db);
    close(two.curves!.air_speed_peak_m_s[1]!, one.curves!.air_speed_peak_m_s[0]!);
  });
  it("two drivers in parallel and their one equivalent", () => {
    const driver = denSub.driver;
    const pair = evaluate(with_({ driver: { ...driver, count: 2 } })).curves!;
    const one = evaluate(
      with_({
        driver: {
          ...driver,
          re_ohm: driver.re_ohm / 2,
          le_h: driver.le_h / 2,
          sd_m2: 2 * driver.sd_m2,
          vas_m3: 2 * driver.vas_m3,
          power_w: 2 * driver.power_w,
        },
      }),
    ).curves!;
    close(pair.spl_db, one.spl_db);
    close(pair.impedance_ohm, one.impedance_ohm);
    close(pair.excursion_peak_m, one.excursion_peak_m);
    close(pair.max_spl_db as number[], one.max_spl_db as number[]);
  });
  it("four in series-parallel on four times the box: 6 dB more, the same impedance", () => {
    const driver = { ...denSub.driver, count: 4, wiring: "series-parallel" };
    const enclosure = { ...denSub.enclosure, net_volume_m3: 4 * denSub.enclosure.net_volume_m3 };
    const four = evaluate(with_({ driver, enclosure, vents: [lumped(30, 0.016)] }));
    const scaled = [{ lumped: { inertance_kg_m4: 120, area_m2: 0.004, resistance_pa_s_m3: 240 } }];
    const single = evaluate(with_({ vents: scaled })).curves!;
    close(four.curves!.impedance_ohm, single.impedance_ohm);
    close(
      four.curves!.spl_db,
      single.spl_db.map((level) => level + 20 * Math.log10(2)),
    );
  });
});

describe("the weather", () => {
  const at = (air: DesignInput["air"]) => evaluate(with_({ air }), { frequency_hz: [40] });
  it("does not change the driver", () => {
    const [warm, thin] = [
      at({ temperature_c: 35, pressure_pa: 101_325, relative_humidity: 0.9 }),
      at({ temperature_c: 20, pressure_pa: 80_000, relative_humidity: 0.5 }),
    ];
    expect(warm.driver).toEqual(thin.driver);
  });
  it("thin air is a softer spring: the closed box resonates lower", () => {
    const top = (air: DesignInput["air"]) => {
      const { curves } = evaluate(with_({ air, vents: [], driver: { ...denSub.driver, le_h: 0 } }));
      return curves!.frequency_hz[
        curves!.impedance_ohm.indexOf(Math.max(...curves!.impedance_ohm))
      ]!;
    };
    const low = top({ temperature_c: 20, pressure_pa: 70_000, relative_humidity: 0.5 });
    expect(low).toBeLessThan(
      top({ temperature_c: 20, pressure_pa: 101_325, relative_humidity: 0.5 }),
    );
  });
});

describe("a passive system", () => {
  it("impedance never falls below R_E in its real part", () => {
    for (const design of demoDesigns) {
      const parsed = designSchema.parse(design);
      if (!parsed.driver) continue;
      const { curves } = evaluate(parsed);
      const least = parsed.driver.re_ohm / parsed.driver.count;
      curves!.impedance_ohm.forEach((ohms, i) => {
        const real = ohms * Math.cos((curves!.impedance_phase_deg[i]! * Math.PI) / 180);
        expect(real).toBeGreaterThanOrEqual(least * (1 - 1e-9));
      });
    }
  });
  it("group delay is the slope of the phase", () => {
    const frequency_hz = [30, 30.003, 30.006];
    const { phase_deg, group_delay_s } = evaluate(den, { frequency_hz }).curves!;
    const slope = -(phase_deg[2]! - phase_deg[0]!) / 360 / (frequency_hz[2]! - frequency_hz[0]!);
    expect(group_delay_s[1]! / slope).toBeCloseTo(1, 5);
  });
});
