import { describe, expect, it } from "vitest";
import type { Design } from "@/lib/document/schema";
import { drawingText } from "@/lib/drawing/drawing-text";
import { HANDLE_SPACING, placeHandles } from "@/lib/drawing/handle-places";
import { handlesOf, type Handle } from "@/lib/drawing/handles";
import { sectionOf } from "@/lib/drawing/section";
import { airway, designWith, stackedVent } from "./designs";

const metric = drawingText({ system: "metric", tape: 32 });

function handle(design: Design, id: Handle["id"], text = metric): Handle {
  const section = sectionOf(airway(design), design.enclosure);
  const found = handlesOf(design, 0, section, text).find((one) => one.id === id);
  if (!found) throw new Error(`No handle ${id}.`);
  return found;
}

describe("handles", () => {
  const design = designWith(stackedVent);

  it("lengthens the tube, as far as the wall", () => {
    const tube = handle(design, "tube");
    expect(tube.value).toBeCloseTo(0.2, 12);
    // 177.4 mm stand clear
    expect(tube.max).toBeCloseTo(0.3774, 9);
    expect(airway(tube.edit(0.25)).pieces[0]).toMatchObject({ kind: "tube", length_m: 0.25 });
    expect(tube.say(0.25)).toBe("250.0 mm");
  });

  it("adds and takes whole rings", () => {
    const stack = handle(design, "stack");
    expect(stack.value).toBe(5);
    // 177.4 mm of room hold nine more of 18.1 mm
    expect(stack.max).toBe(14);
    expect(stack.snap(6.4)).toBe(6);
    expect(airway(stack.edit(6)).pieces[1]).toMatchObject({ kind: "rings", count: 6 });
    expect(airway(stack.edit(0)).pieces.some(({ kind }) => kind === "rings")).toBe(false);
  });

  it("begins a stack on a vent without one", () => {
    const bare = designWith({
      ...stackedVent,
      inner_end: {},
      pieces: [{ kind: "tube", length_m: 0.2 }],
    });
    const stack = handle(bare, "stack");
    expect(stack.value).toBe(0);
    expect(airway(stack.edit(2)).pieces[1]).toMatchObject({ kind: "rings", count: 2 });
  });

  it("leaves wood outside a cut inner flare, and says why it stops", () => {
    const flare = handle(design, "inner-flare");
    // plate of 240 on a bore of 100: 70 mm of wood, one of them to stay
    expect(flare.max).toBeCloseTo(0.069, 9);
    expect(flare.maxReason).toContain("wood");
  });

  it("lets an outer flare be as deep as the vent is long", () => {
    expect(handle(design, "outer-flare").max).toBeCloseTo(0.3086, 9);
  });

  it("moves the wall by the inside depth, no nearer than the inner end", () => {
    const wall = handle(design, "wall");
    expect(wall.min).toBeCloseTo(0.45 - 0.1774, 9);
    expect(wall.edit(0.5).enclosure.inside_m?.depth).toBe(0.5);
  });

  it("moves a stated clearance instead where there is one", () => {
    const stated = designWith({ ...stackedVent, clearance_m: 0.08 });
    const wall = handle(stated, "wall");
    expect(wall.value).toBe(0.08);
    expect(airway(wall.edit(0.1)).clearance_m).toBe(0.1);
  });

  it("snaps to a tenth of a millimetre, or to the tape", () => {
    expect(handle(design, "tube").snap(0.20004)).toBeCloseTo(0.2, 12);
    const inches = drawingText({ system: "imperial", tape: 16 });
    expect(handle(design, "tube", inches).snap(0.2)).toBeCloseTo((126 / 16) * 0.0254, 7);
  });

  it("stands apart from its neighbours", () => {
    const pin = designWith({
      bore: { shape: "round", diameter_m: 0.005 },
      pieces: [{ kind: "tube", length_m: 0.05 }],
    });
    const section = sectionOf(airway(pin), pin.enclosure);
    const places = placeHandles(handlesOf(pin, 0, section, metric), {
      scale: 1,
      x: (x) => x,
      axis: 100,
    });
    places.forEach((one, i) =>
      places
        .slice(i + 1)
        .forEach((other) =>
          expect(Math.hypot(one.x - other.x, one.y - other.y)).toBeGreaterThanOrEqual(
            HANDLE_SPACING,
          ),
        ),
    );
  });
});
