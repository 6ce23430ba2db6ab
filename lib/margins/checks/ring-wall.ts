import type { Piece } from "@/lib/document/schema";
import { cuttingCaution } from "../cautions";
import { ofVent, statusOf, told, type Check, type Margin } from "../margin";

/** Least wall of a glued ring stack inside the box [m]: common practice, no source. */
export const LEAST_RING_WALL_M = 0.012;
/** Least wood left outside an inner flare [m]: common practice, no source. */
export const LEAST_LAND_M = 0.003;
/** Height on which a round-over bit's bearing runs below its arc [m]: assumed. */
const BEARING_CONTACT_M = 0.0064;

export const ringWall: Check = (subject) =>
  subject.design.vents.flatMap((vent, index): Margin[] => {
    if ("lumped" in vent || vent.bore.shape !== "round") return [];
    const bore = vent.bore.diameter_m;
    const wallOf = (piece: Piece) =>
      piece.outer_diameter_m === undefined
        ? null
        : (piece.outer_diameter_m - (piece.bore_m ?? bore)) / 2;
    const margins: Margin[] = [];
    const walls = vent.pieces
      .filter((piece) => piece.kind === "rings" && piece.count > 0)
      .map(wallOf)
      .filter((wall) => wall !== null);
    if (walls.length > 0) {
      const wall = Math.min(...walls);
      const left = wall - LEAST_RING_WALL_M;
      margins.push({
        id: `ring-wall-${index}`,
        title: `Ring wall${ofVent(subject.design, index)}`,
        status: statusOf(left, 0.002),
        value: told(subject, wall, "length"),
        limit: told(subject, LEAST_RING_WALL_M, "length"),
        left: told(subject, left, "length", { signed: true }),
        reason: `${told(subject, wall, "length")} of wood beside the bore; a glued stack wants ${told(subject, LEAST_RING_WALL_M, "length")} and more (common practice).`,
        ...(left < 0 ? { caution: cuttingCaution.text } : {}),
      });
    }
    const last = vent.pieces.at(-1);
    const flare = vent.inner_end.flare_radius_m;
    const lastWall = last ? wallOf(last) : null;
    if (flare > 0 && vent.inner_end.form === "cut" && last && lastWall !== null) {
      const land = lastWall - flare;
      const depth =
        last.kind === "rings"
          ? last.count * last.thickness_m
          : "thickness_m" in last
            ? last.thickness_m + before(vent.pieces)
            : Infinity;
      const needed = flare + BEARING_CONTACT_M;
      const bearing = depth - needed;
      const tight = Math.min(land - LEAST_LAND_M, bearing);
      margins.push({
        id: `inner-flare-${index}`,
        title: `Inner flare${ofVent(subject.design, index)}`,
        status: statusOf(tight, 0.001),
        value: told(subject, flare, "length"),
        limit: told(
          subject,
          Math.min(lastWall - LEAST_LAND_M, depth - BEARING_CONTACT_M),
          "length",
        ),
        left: told(subject, tight, "length", { signed: true }),
        reason:
          bearing < land - LEAST_LAND_M
            ? `A ${told(subject, flare, "length")} round-over wants ${told(subject, needed, "length")} of wood under its bearing; ${told(subject, depth, "length")} is there.`
            : `${told(subject, land, "length")} of wood is left outside the flare's lip; ${told(subject, LEAST_LAND_M, "length")} at least (common practice).`,
      });
    }
    return margins;
  });

/** Wood glued up under the last piece: the rings right before it. */
function before(pieces: readonly Piece[]): number {
  const piece = pieces.at(-2);
  return piece?.kind === "rings" ? piece.count * piece.thickness_m : 0;
}
