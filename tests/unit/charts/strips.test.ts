import { describe, expect, it } from "vitest";
import { figuresTable } from "@/lib/charts/figures";
import { placeLabels } from "@/lib/charts/labels";
import { figure, hertz, reading, readingWithUnit } from "@/lib/charts/readings";
import {
  brokenAtWraps,
  chosenStrips,
  DEFAULT_STRIPS,
  movedStrip,
  stripDefinition,
  toggledStrip,
} from "@/lib/charts/strips";
import { bandsBeyond, stripSummary } from "@/lib/charts/summary";
import { plainCurves } from "./curves.data";

const metric = { system: "metric", tape: 32 } as const;
const imperial = { system: "imperial", tape: 32 } as const;

describe("readings", () => {
  it("writes a true minus and no negative nothing", () => {
    expect(figure(-3.14, 1)).toBe("−3.1");
    expect(figure(-0.01, 1)).toBe("0.0");
    expect(figure(null, 1)).toBe("–");
    expect(figure(NaN, 1)).toBe("–");
    expect(hertz(28.43)).toBe("28.4\u00a0Hz");
    expect(hertz(315)).toBe("315\u00a0Hz");
  });

  it("shows each strip in the person's unit", () => {
    const air = stripDefinition("air-speed");
    expect(reading(15.24, air.unit(metric))).toBe("15.2");
    // 15.24 m/s = 50 ft/s exactly.
    expect(readingWithUnit(15.24, air.unit(imperial))).toBe("50.0\u00a0ft/s");
    expect(reading(0.0254, stripDefinition("excursion").unit(imperial))).toBe("1.000");
    expect(readingWithUnit(-90, stripDefinition("phase").unit(metric))).toBe("−90°");
  });
});

describe("the choice of strips", () => {
  it("moves, adds and takes out, but keeps one", () => {
    expect(movedStrip(["response", "impedance"], "impedance", -1)).toEqual([
      "impedance",
      "response",
    ]);
    expect(movedStrip(["response"], "response", 1)).toEqual(["response"]);
    expect(toggledStrip(["response"], "level")).toEqual(["response", "level"]);
    expect(toggledStrip(["response", "level"], "response")).toEqual(["level"]);
    expect(toggledStrip(["level"], "level")).toEqual(["level"]);
  });

  it("reads a stored choice with care", () => {
    expect(chosenStrips(["phase", "nonsense", "phase"])).toEqual(["phase"]);
    expect(chosenStrips([])).toEqual(DEFAULT_STRIPS);
    expect(chosenStrips(null)).toEqual(DEFAULT_STRIPS);
  });
});

describe("phase", () => {
  it("turns into ±180° with a gap at the jump", () => {
    expect(brokenAtWraps([170, 175, 185, 190])).toEqual([170, 175, null, -170]);
    expect(brokenAtWraps([-350, -10])).toEqual([10, -10]);
  });
});

describe("summaries", () => {
  const curves = plainCurves();

  it("says where the cone leaves x max", () => {
    // 0.24 / f passes 12 mm at 20 Hz.
    const bands = bandsBeyond(curves.frequency_hz, curves.excursion_peak_m, {
      value: 0.012,
      name: "x max",
      side: "above",
    });
    expect(bands).toHaveLength(1);
    expect(bands[0]?.[0]).toBeCloseTo(10, 9);
    expect(Math.abs((bands[0]?.[1] ?? 0) - 20)).toBeLessThan(0.2);
    const text = stripSummary(stripDefinition("excursion"), curves, { xmax_m: 0.012 }, metric);
    expect(text).toMatch(
      /^Excursion: highest 24\.0\smm at 10\.0\sHz; over the x max \(12\.0\smm\)/,
    );
  });

  it("names vents and their highest air speed", () => {
    const two = plainCurves(401, 2);
    const text = stripSummary(stripDefinition("air-speed"), two, { air_speed_m_s: 17 }, metric, [
      "Front",
      "Rear",
    ]);
    expect(text).toMatch(/Front, highest 20\.0\sm\/s at (29\.9|30\.[01])\sHz; over the limit/);
    expect(text).toMatch(/Rear, highest 10\.0\sm\/s at (29\.9|30\.[01])\sHz; never over the limit/);
  });

  it("says what holds the level down", () => {
    const text = stripSummary(stripDefinition("level"), curves, {}, metric);
    expect(text).toMatch(/92\.0\sdB at 20 Hz, held by air speed/);
    expect(text).toMatch(/100\.0\sdB at 100 Hz, held by x max/);
  });

  it("tabulates every curve with what sets the level", () => {
    const table = figuresTable(curves, ["response", "level"], metric, [], [10, 100]);
    expect(table.columns.map((column) => column.name)).toEqual(["Response", "Clean level", "Held"]);
    expect(table.rows.map((row) => row.frequency_hz)).toContain(31.5);
    expect(table.rows.at(-1)?.cells).toEqual(["100.0", "100.0", "by x max"]);
  });
});

describe("direct labels", () => {
  it("stand where the curves are apart and inside the plot", () => {
    const x = [20, 60, 100, 140, 180];
    const together = [50, 50, 50, 50, 50];
    const parting = [50, 50, 50, 35, 20];
    const box = { top: 0, bottom: 100, left: 0, right: 200, letter: 5, line: 12 };
    const [label] = placeLabels(x, [{ text: "rear", y: parting }], [together], box);
    expect(label?.x).toBe(180);
    expect(placeLabels(x, [{ text: "x", y: [null, null, null, null, null] }], [], box)).toEqual([]);
  });
});
