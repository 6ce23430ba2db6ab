import { describe } from "vitest";
import {
  FLANGED,
  FREE,
  boxReduction,
  enclosedFlangeShare,
  enclosedWallIncrement,
  flangeShare,
  flareInBody,
  flushFlare,
  flushReduction,
  planeAir,
  rectangle,
  thickWall,
  wallIncrement,
} from "@/lib/acoustics/end-corrections";
import { check, checkRows } from "../check";
import * as field from "./field.data";

const source = "finite-element solution, static, two independent chains";
const shared = { source, mark: "computed" as const };
/** The aim of the library: a hundredth of the bore radius. */
const hundredth = { absolute: 0.01 };

const inside = (xi: number, p: number, wall: number) => {
  const free = thickWall(1 + wall);
  const share = enclosedFlangeShare(p, wall, p * xi);
  return free + (FLANGED - free) * share - boxReduction(xi, p * xi);
};

describe("end corrections against field solutions", () => {
  check({
    ...shared,
    topic: "ends, free",
    name: "zero wall",
    source: "Wiener-Hopf integral, re-evaluated to 1e-8",
    actual: () => FREE,
    expected: 0.612701036,
    tolerance: { absolute: 1e-6 },
  });
  check({
    ...shared,
    topic: "ends, flanged",
    name: "infinite flange",
    actual: () => FLANGED,
    expected: 0.821674,
    tolerance: { absolute: 7e-6 },
  });
  checkRows({ ...shared, topic: "ends, thick wall", tolerance: { absolute: 0.001 } }, [
    ...field.unflangedWall.map(([t, d]) => ({
      name: `wall ${t} a`,
      actual: () => thickWall(1 + t),
      expected: d,
    })),
    ...field.thickWall.map(([b, d]) => ({
      name: `outer radius ${b} a`,
      actual: () => thickWall(b),
      expected: d,
    })),
  ]);
  checkRows(
    { ...shared, topic: "ends, thin disc", tolerance: hundredth },
    field.thinDisc.map(([b, d]) => ({
      name: `disc ${b} a`,
      actual: () => thickWall(b),
      expected: d,
    })),
  );
  checkRows(
    { ...shared, topic: "flares, flush", tolerance: { absolute: 0.002 } },
    field.flushFlare.map(([r, d]) => ({
      name: `r ${r} a`,
      actual: () => flushFlare(r),
      expected: d,
    })),
  );
  checkRows(
    { ...shared, topic: "flares, free trumpet", tolerance: hundredth },
    field.freeTrumpet.map(([r, t, d]) => ({
      name: `r ${r} a, shell ${t} a`,
      actual: () => flareInBody(r, 1 + r + 0.3 * t),
      expected: d,
    })),
  );
  checkRows(
    { ...shared, topic: "interior, flush", tolerance: { absolute: 0.0015 } },
    field.stepIntoDuct.map(([xi, d]) => ({
      name: `a/R ${xi}`,
      actual: () => FLANGED * (1 - flushReduction(xi)),
      expected: d,
    })),
  );
  checkRows(
    { ...shared, topic: "interior, protruding", tolerance: hundredth },
    field.reentrantDuct.map(([xi, p, d]) => ({
      name: `a/R ${xi}, p ${p} a`,
      actual: () => inside(xi, p, 0.06),
      expected: d,
    })),
  );
  checkRows(
    { ...shared, topic: "interior, finite cavity", tolerance: hundredth },
    field.reentrantCavity.map(([xi, p, d]) => ({
      name: `a/R ${xi}, p ${p} a, depth 4 R`,
      actual: () =>
        inside(xi, p, 0.06) +
        enclosedWallIncrement(4 / xi - p, 1 / xi, 0, 1.06) +
        planeAir(1 / xi, 4 / xi - p, p, 1.06),
      expected: d,
    })),
  );
  checkRows({ ...shared, topic: "wall clearance", tolerance: hundredth }, [
    ...field.clearance.map(([t, h, d]) => ({
      name: `wall ${t} a, ${h} a away`,
      actual: () => thickWall(1 + t) + wallIncrement(h, 0, 1 + t),
      expected: d,
    })),
    ...field.clearanceFlared.map(([t, h, d]) => ({
      name: `flare 0.5 a, shell ${t} a, ${h} a away`,
      actual: () => flareInBody(0.5, 1.5 + 0.3 * t) + wallIncrement(h, 0.5, 1.5 + 0.3 * t),
      expected: d,
    })),
  ]);
  checkRows(
    { ...shared, topic: "slots, flanged", tolerance: { absolute: 0.002 } },
    field.rectangle.map(([aspect, d]) => ({
      name: `${aspect}:1, over √S`,
      actual: () => rectangle(aspect),
      expected: d,
    })),
  );
  check({
    topic: "slots, flanged",
    name: "6:1 on a wall is 3:1 of double area",
    source: "image source, panel method",
    mark: "computed",
    actual: () => rectangle(3) * Math.SQRT2,
    expected: 0.6049,
    tolerance: { absolute: 0.0007 },
  });
  checkRows(
    {
      topic: "rings, projecting",
      source: "finite-volume solution, own calculation, ± 0.0005 a",
      mark: "computed",
      tolerance: { absolute: 0.002 },
    },
    [
      [0.1, 0.1, 0.795],
      [0.5, 0.2, 0.762],
      [1, 0.1, 0.722],
      [2, 0.05, 0.684],
      [5, 0.5, 0.734],
    ].map(([p, t, d]) => ({
      name: `p ${p} a, wall ${t} a`,
      actual: () => thickWall(1 + t!) + (FLANGED - thickWall(1 + t!)) * flangeShare(p!, t!),
      expected: d!,
    })),
  );
});
