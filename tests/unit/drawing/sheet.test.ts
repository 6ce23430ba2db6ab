import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { VentAnswer } from "@/lib/acoustics/answer";
import type { Design } from "@/lib/document/schema";
import { drawingText } from "@/lib/drawing/drawing-text";
import { boxesOverlap, crosses } from "@/lib/drawing/place-labels";
import { airStroke, layOutSheet, type Sheet } from "@/lib/drawing/sheet";
import { scaleName } from "@/lib/drawing/sheet-frame";
import { airway, anyDesign, designWith, stackedVent } from "./designs";

const metric = drawingText({ system: "metric", tape: 32 });
const imperial = drawingText({ system: "imperial", tape: 64 });
const figures: VentAnswer = {
  overall_length_m: 0.3,
  effective_length_m: 0.36,
  end_corrections_m: { outer: 0.034, inner: 0.027, enclosure_air: 0, bore_steps: 0 },
  inertance_kg_m4: 50,
  pipe_resonances_hz: [500],
  bore_area_m2: 0.00785,
  displaced_volume_m3: 0.004,
  peak_air_speed: { speed_m_s: 15, frequency_hz: 30 },
};

function sheetOf(design: Design, width = 812, height = 400, text = metric): Sheet {
  const { enclosure } = design;
  return layOutSheet({ vent: airway(design), enclosure, figures, text, width, height });
}

function lettering(sheet: Sheet) {
  return [...sheet.dimensions.labels, ...sheet.annotations];
}

describe("the sheet", () => {
  it("draws to one scale: lengths on the sheet are lengths of the vent", () => {
    const sheet = sheetOf(designWith(stackedVent));
    const { x, scale } = sheet.frame.transform;
    // 200 tube + 5 × 18.1 rings + 18.1 plate = 308.6 mm, face to face
    expect(x(308.6) - x(0)).toBeCloseTo(308.6 * scale, 9);
    expect(sheet.section.profile.end).toBeCloseTo(308.6, 9);
    // 450 inside depth + 36 panel − 308.6 vent
    expect(sheet.section.clearance).toBeCloseTo(177.4, 9);
    expect((sheet.bore.y1 - sheet.bore.y0) / scale).toBeCloseTo(100, 9);
  });

  it("letters the chain and the overall length from the datum face", () => {
    const texts = sheetOf(designWith(stackedVent)).dimensions.labels.map(({ text }) => text);
    expect(texts).toContain("tube 200.0");
    expect(texts).toContain("5 × 18.0 + glue = 90.5");
    expect(texts).toContain("plate 18.1");
    expect(texts).toContain("clear 177.4 (1.77 Ø)");
    expect(texts).toContain("overall 308.6 from the outer face A");
  });

  it("says by how much a vent is too long, and still draws it", () => {
    const vent = { ...stackedVent, clearance_m: null, pieces: [{ kind: "tube", length_m: 0.6 }] };
    const sheet = sheetOf(designWith(vent));
    // 600 − (450 + 36)
    expect(sheet.dimensions.labels.map(({ text }) => text)).toContain("114.0 too long");
    expect(sheet.dimensions.warn).toBe(true);
  });

  it("breaks off a clearance much longer than the vent", () => {
    const sheet = sheetOf(designWith(stackedVent, { inside_m: { width: 2, height: 2, depth: 3 } }));
    const { x } = sheet.frame.transform;
    expect(sheet.frame.gap).not.toBeNull();
    expect(x(3036)).toBeLessThanOrEqual(812);
    expect(sheet.dimensions.labels.some(({ text }) => text.startsWith("clear 2727.4"))).toBe(true);
  });

  it("ends the inner ghost air at the wall", () => {
    const sheet = sheetOf(designWith({ ...stackedVent, clearance_m: 0.01 }));
    const inner = sheet.ghosts.find(({ end }) => end === "inner");
    const { x } = sheet.frame.transform;
    expect(inner?.to).toBeCloseTo(x(308.6 + 10), 6);
    expect(inner?.correction_m).toBe(0.027);
  });

  it("keeps its frame while a hand holds it", () => {
    const before = sheetOf(designWith(stackedVent));
    const longer = designWith({ ...stackedVent, pieces: [{ kind: "tube", length_m: 0.4 }] });
    const { enclosure } = longer;
    const held = layOutSheet({
      vent: airway(longer),
      enclosure,
      figures,
      text: metric,
      width: 812,
      height: 400,
      hold: before.frame.hold,
    });
    expect(held.frame.transform.scale).toBe(before.frame.transform.scale);
    expect(held.frame.transform.x(0)).toBe(before.frame.transform.x(0));
  });

  it("never letters over lettering, in any room and either system", () => {
    fc.assert(
      fc.property(
        anyDesign,
        fc.constantFrom([812, 400], [390, 340], [1100, 520]),
        fc.constantFrom(metric, imperial),
        (design, [width, height], text) => {
          const labels = lettering(sheetOf(design, width, height, text));
          labels.forEach((label, i) =>
            labels
              .slice(i + 1)
              .forEach((other) => expect(boxesOverlap(label.box, other.box)).toBe(false)),
          );
        },
      ),
      { numRuns: 300, seed: 20261201 },
    );
  });

  it("keeps every path finite for any design", () => {
    fc.assert(
      fc.property(anyDesign, (design) => {
        const sheet = sheetOf(design);
        const paths = [
          sheet.air,
          sheet.leaders,
          sheet.breaks,
          sheet.dimensions.lines,
          ...sheet.parts.flatMap(({ outline, plies, glue }) => [outline, plies, glue]),
        ];
        for (const path of paths) expect(path).not.toMatch(/NaN|Infinity/);
        expect(sheet.frame.transform.scale).toBeGreaterThan(0);
      }),
      { numRuns: 300, seed: 7 },
    );
  });

  it("keeps dimension leaders clear of the dimensions' texts", () => {
    fc.assert(
      fc.property(anyDesign, (design) => {
        const labels = sheetOf(design).dimensions.labels.filter(({ leader }) => leader);
        for (const { id, leader } of labels)
          for (const other of labels)
            if (leader && other.id !== id) expect(crosses(leader, other.box)).toBe(false);
      }),
      { numRuns: 200, seed: 11 },
    );
  });
});

describe("scale and stroke", () => {
  it("names the scale for the CSS pixel of 1/96 inch", () => {
    expect(scaleName(96 / 25.4)).toBe("1 : 1");
    expect(scaleName(96 / 25.4 / 2)).toBe("1 : 2");
    expect(scaleName((96 / 25.4) * 2)).toBe("2 : 1");
    expect(scaleName(96 / 25.4 / 16.4)).toBe("1 : 16");
  });

  it("turns a peak speed into a peak-to-peak stroke", () => {
    // 2 · 15 m/s ÷ (2π · 30 Hz) = 0.15915 m
    expect(airStroke(15, 30)).toBeCloseTo(0.159155, 6);
    expect(airStroke(1, 0)).toBe(0);
  });
});
