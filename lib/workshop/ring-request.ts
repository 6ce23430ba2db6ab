/** What a ring plan is asked for and answers, and the finished vent a plan makes. */
import { InputError } from "@/lib/acoustics/input-error";
import type { AirwayVent, Design, Piece } from "@/lib/document/schema";

export interface Sheet {
  name: string;
  thickness_m: number;
  /** Uncertainty of the sheet's mean thickness, common to all rings cut from it [m]. */
  thickness_sd_m: number;
  /** Scatter from ring to ring within the sheet, independent [m]. */
  within_sheet_sd_m?: number | null;
}

export interface RingRequest {
  design: Design;
  vent: number;
  tuning_hz: number;
  sheets: Sheet[];
  ring_outer_diameter_m: number;
  /** One per ring: each is glued to the piece before it. */
  glue_line_m: number;
  glue_line_sd_m: number;
  max_rings: number;
  may_trim_tube: boolean;
  /** The least the saw can take off [m]. */
  trim_loss_m: number;
  vent_losses?: boolean;
}

export interface RingPlan {
  rings: { sheet: string; count: number }[];
  /** Rings and their glue lines. */
  added_length_m: number;
  /** What comes off the first tube. */
  trim_tube_m: number;
  overall_length_m: number;
  tuning_hz: number;
  tuning_sd_hz: number;
  error_hz: number;
  reason: string;
}

/** How many rings of each sheet, in the order of the request's sheets. */
export type Mix = readonly number[];

/** The vent of the request without its rings, and where new ones go. */
export interface BareVent {
  vent: AirwayVent;
  /** Index before which new rings stand: after the last tube, before any plate. */
  ringsAt: number;
  /** Index of the tube that may be trimmed; -1 where there is none. */
  tubeAt: number;
  tubeLength_m: number;
  /** Length of all that stays, tube untrimmed [m]. */
  path: string;
}

/** Takes the rings out of the vent and refuses what no ring can be planned for. */
export function bareVent(request: RingRequest): BareVent {
  const path = `design.vents[${request.vent}]`;
  const vent = request.design.vents[request.vent];
  if (!vent)
    throw new InputError(
      "no_such_vent",
      "vent",
      `There is no vent ${request.vent}.`,
      request.design.vents.length > 0
        ? `0 to ${request.design.vents.length - 1}`
        : "a design with a vent",
    );
  if ("lumped" in vent)
    throw new InputError("vent_is_lumped", path, "A vent given as bare elements takes no rings.");
  if (vent.bore.shape !== "round")
    throw new InputError("bore_not_round", `${path}.bore`, "Rings are planned for a round bore.");
  if (!(request.ring_outer_diameter_m > vent.bore.diameter_m))
    throw new InputError(
      "ring_without_wall",
      "ring_outer_diameter_m",
      "The rings would be no wider than the bore.",
      `more than ${(vent.bore.diameter_m * 1000).toFixed(1)} mm`,
    );
  const pieces = vent.pieces.filter((piece) => piece.kind !== "rings");
  const lastTube = pieces.findLastIndex((piece) => piece.kind === "tube");
  const firstPlate = pieces.findIndex((piece) => piece.kind === "plate");
  const tubeAt = pieces.findIndex((piece) => piece.kind === "tube");
  const tube = pieces[tubeAt];
  return {
    vent: { ...vent, pieces },
    ringsAt: lastTube >= 0 ? lastTube + 1 : firstPlate >= 0 ? firstPlate : pieces.length,
    tubeAt,
    tubeLength_m: tube?.kind === "tube" ? tube.length_m : 0,
    path,
  };
}

/** The rings pieces of a mix: one stack per sheet that is used, thickest first. */
export function stacksOf(request: RingRequest, mix: Mix): Extract<Piece, { kind: "rings" }>[] {
  return request.sheets
    .map((sheet, i) => ({ sheet, count: mix[i] ?? 0 }))
    .filter(({ count }) => count > 0)
    .sort((a, b) => b.sheet.thickness_m - a.sheet.thickness_m)
    .map(({ sheet, count }) => ({
      kind: "rings",
      count,
      thickness_m: sheet.thickness_m,
      outer_diameter_m: request.ring_outer_diameter_m,
      glue_line_m: request.glue_line_m,
    }));
}

/** The design with the bare vent, the tube trimmed and the given stacks in their place. */
export function withStacks(
  design: Design,
  ventIndex: number,
  bare: BareVent,
  stacks: Piece[],
  trim_m: number,
): Design {
  const pieces = bare.vent.pieces.map((piece, i) =>
    i === bare.tubeAt && piece.kind === "tube"
      ? { ...piece, length_m: piece.length_m - trim_m }
      : piece,
  );
  pieces.splice(bare.ringsAt, 0, ...stacks);
  return {
    ...design,
    vents: design.vents.map((old, i) => (i === ventIndex ? { ...bare.vent, pieces } : old)),
  };
}
