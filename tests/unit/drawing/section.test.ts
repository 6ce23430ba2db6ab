import { describe, expect, it } from "vitest";
import {
  innerFlareAt,
  innerFlareRadius,
  outerFlareAt,
  solidOutline,
} from "@/lib/drawing/bore-profile";
import { plyCount } from "@/lib/drawing/plies";
import { ringSheets } from "@/lib/drawing/ring-stack";
import { insideAbove, panelHole, sectionOf } from "@/lib/drawing/section";
import { sectionParts } from "@/lib/drawing/section-parts";
import { airway, designWith, stackedVent } from "./designs";

const cut = (vent: object, enclosure: object = {}) => {
  const design = designWith(vent, enclosure);
  return sectionOf(airway(design), design.enclosure);
};

describe("the bore's profile", () => {
  const profile = {
    mouth: 0,
    end: 100,
    mouthRadius: 50,
    endRadius: 50,
    outerFlare: 10,
    innerFlare: 20,
  };

  it("widens along a quarter circle", () => {
    // 45° round the arc: 20 · (1 − √½) outside the bore, 20 · √½ behind its foot
    expect(innerFlareRadius(profile, 80 + 20 * Math.SQRT1_2)).toBeCloseTo(
      50 + 20 * (1 - Math.SQRT1_2),
      9,
    );
    expect(innerFlareRadius(profile, 100)).toBeCloseTo(70, 9);
    expect(innerFlareRadius(profile, 79)).toBe(0);
  });

  it("finds where a flare has a radius", () => {
    expect(innerFlareAt(profile, 50)).toBeCloseTo(80, 9);
    expect(innerFlareAt(profile, 50 + 20 * (1 - Math.SQRT1_2))).toBeCloseTo(
      80 + 20 * Math.SQRT1_2,
      9,
    );
    expect(outerFlareAt(profile, 50)).toBeCloseTo(10, 9);
    expect(outerFlareAt(profile, 60)).toBeCloseTo(0, 9);
  });

  it("leaves nothing of a part that the flare takes whole", () => {
    expect(solidOutline(profile, { x0: 95, x1: 100, own: 50, outer: 51 })).toEqual([]);
    const wall = solidOutline(profile, { x0: 20, x1: 70, own: 50, outer: 53 });
    expect(wall.map(({ x, y }) => [x, y])).toEqual([
      [20, 53],
      [70, 53],
      [70, 50],
      [20, 50],
    ]);
  });
});

describe("the section", () => {
  it("lays each ring after its own glue line", () => {
    const rings = cut(stackedVent).pieces[1];
    expect(rings?.sheets).toHaveLength(5);
    expect(rings?.glue).toHaveLength(5);
    expect(rings?.glue[0]?.x0).toBeCloseTo(200, 9);
    expect(rings?.sheets[0]?.x0).toBeCloseTo(200.1, 9);
    expect(rings?.sheets[4]?.x1).toBeCloseTo(290.5, 9);
  });

  it("puts the mouth before the panel's face where it stands proud", () => {
    const section = cut({ ...stackedVent, outer_end: { flare_radius_m: 0.016, proud_m: 0.006 } });
    expect(section.profile.mouth).toBeCloseTo(-6, 9);
    expect(section.profile.end).toBeCloseTo(302.6, 9);
  });

  it("takes a baffle over 25 mm for two layers unless told", () => {
    expect(cut(stackedVent).layers).toHaveLength(2);
    expect(cut(stackedVent, { panel_thickness_m: 0.018 }).layers).toHaveLength(1);
  });

  it("follows a flare deeper than the panel with a moulded wall", () => {
    const tube = { pieces: [{ kind: "tube", length_m: 0.2, outer_diameter_m: 0.106 }] };
    const outer_end = { flare_radius_m: 0.05 };
    expect(cut({ ...stackedVent, ...tube, outer_end }).mouldedWall).toBeCloseTo(3, 9);
    expect(cut(stackedVent).mouldedWall).toBeNull();
  });

  it("rounds the panel's own wood along the flare", () => {
    const section = cut(stackedVent);
    expect(panelHole(section, 0)).toBeCloseTo(70, 9);
    expect(panelHole(section, 30)).toBeCloseTo(53, 9);
  });

  it("opens a recess behind a vent that ends inside its panel", () => {
    const section = cut({
      ...stackedVent,
      inner_end: {},
      outer_end: {},
      pieces: [{ kind: "tube", length_m: 0.003, outer_diameter_m: 0.106 }],
    });
    expect(section.profile.end).toBeCloseTo(3, 9);
    expect(panelHole(section, 20)).toBeGreaterThan(53);
    expect(section.reach).toBeGreaterThan(panelHole(section, 20));
  });

  it("stands a slot that shares the floor on it", () => {
    const bore = { shape: "slot", width_m: 0.3, height_m: 0.03, shared_walls: 3 };
    const section = cut({ bore, pieces: [{ kind: "tube", length_m: 0.3 }] });
    // 500 inside height less half the slot
    expect(insideAbove(section)).toBeCloseTo(485, 9);
    const parts = sectionParts(section, 200, 3);
    expect(parts.map(({ id }) => id)).toContain("side-floor");
    expect(parts.find(({ id }) => id === "panel")?.side).toBe("above");
  });
});

describe("plies", () => {
  it("draws an odd number of them, fewer when small, none when tiny", () => {
    expect(plyCount(18, 4)).toBe(13);
    expect(plyCount(18, 0.5)).toBe(7);
    expect(plyCount(18, 0.1)).toBe(1);
  });
});

describe("a bare stack", () => {
  it("lays rings end to end", () => {
    const { sheets, length } = ringSheets([0.018, 0.018, 0.012], 40);
    expect(length).toBeCloseTo(48, 9);
    expect(sheets[2]?.x0).toBeCloseTo(36, 9);
  });
});
