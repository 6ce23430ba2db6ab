/** How far a tuning may come out beside its mark, and which uncertainty is to blame. */
import type { AirwayVent, Bore, Design, Piece, Vent } from "@/lib/document/schema";
import { InputError } from "./input-error";
import { tuningOf } from "./tuning";

export type ToleranceCause =
  "net volume" | "bore" | "tube length" | "sheet thickness" | "glue lines" | "temperature";

/** Standard deviations: of the volume as a share, of a bore, a tube, a sheet, one glue line, the air. */
export interface ToleranceInputs {
  net_volume: number;
  bore_m: number;
  tube_length_m: number;
  sheet_thickness_m: number;
  glue_line_m: number;
  temperature_c: number;
}

/** What a careful shop may assume where nothing was measured: our own estimate, to be shown as such. */
export const USUAL_TOLERANCES: ToleranceInputs = {
  net_volume: 0.02,
  bore_m: 0.0003,
  tube_length_m: 0.001,
  sheet_thickness_m: 0.0003,
  glue_line_m: 0.00005,
  temperature_c: 5,
};

export interface ToleranceShare {
  cause: ToleranceCause;
  /** What it does to the tuning, one standard deviation [Hz]; its sign is that of an increase. */
  effect_hz: number;
  /** Share of the variance. */
  share: number;
}

export interface TuningTolerance {
  tuning_hz: number;
  sd_hz: number;
  /** Largest first. */
  causes: ToleranceShare[];
}

type Change = (design: Design, amount: number) => Design;

/**
 * First-order propagation of independent uncertainties into the tuning of the system.
 *
 *     σ_f² = Σ (∂f_B/∂x_i σ_i)²
 *
 * with central differences over ± half a standard deviation. A sheet's thickness moves all rings
 * and plates of all vents together; glue lines are independent of one another, so n lines count √n.
 *
 * @param inputs - standard deviations; what is left out is of `USUAL_TOLERANCES`
 * @returns null without a vent. The temperature is left out where the air is given outright, and so
 * is whatever the vents do not have
 * @remarks Valid while the effects are small against the tuning; not for a vent at its limits.
 */
export function tuningTolerance(
  design: Design,
  inputs: Partial<ToleranceInputs> = {},
  options: { vent_losses: boolean } = { vent_losses: true },
): TuningTolerance | null {
  const tuning_hz = tuningOf(design, options);
  if (tuning_hz === null) return null;
  const sd = { ...USUAL_TOLERANCES, ...inputs };
  const effect = (change: Change, deviation: number) =>
    differenceOf(design, change, deviation, tuning_hz, options);
  const lines = glueLines(design);
  const found: [ToleranceCause, number][] = [
    ["net volume", effect(changeVolume, sd.net_volume)],
    ["bore", effect(changeBores, sd.bore_m)],
    ["tube length", effect(changePieces("tube"), sd.tube_length_m)],
    ["sheet thickness", effect(changePieces("sheet"), sd.sheet_thickness_m)],
    [
      "glue lines",
      lines === 0 ? 0 : effect(changePieces("glue"), sd.glue_line_m) / Math.sqrt(lines),
    ],
    ["temperature", effect(changeTemperature, sd.temperature_c)],
  ];
  const variance = found.reduce((sum, [, hz]) => sum + hz * hz, 0);
  const causes = found
    .filter(([, hz]) => hz !== 0)
    .map(([cause, effect_hz]) => ({ cause, effect_hz, share: effect_hz ** 2 / variance }))
    .sort((a, b) => b.share - a.share);
  return { tuning_hz, sd_hz: Math.sqrt(variance), causes };
}

/** Central difference; one-sided where the other side cannot be built. */
function differenceOf(
  design: Design,
  change: Change,
  deviation: number,
  centre_hz: number,
  options: { vent_losses: boolean },
): number {
  if (deviation === 0) return 0;
  const at = (amount: number): number | null => {
    try {
      return tuningOf(change(design, amount), options);
    } catch (error) {
      if (error instanceof InputError) return null;
      throw error;
    }
  };
  const up = at(deviation / 2);
  const down = at(-deviation / 2);
  if (up !== null && down !== null) return up - down;
  if (up !== null) return 2 * (up - centre_hz);
  return down === null ? 0 : 2 * (centre_hz - down);
}

const changeVolume: Change = (design, share) => ({
  ...design,
  enclosure: {
    ...design.enclosure,
    net_volume_m3: design.enclosure.net_volume_m3 * (1 + share),
  },
});

const changeTemperature: Change = (design, degrees) =>
  "temperature_c" in design.air
    ? { ...design, air: { ...design.air, temperature_c: design.air.temperature_c + degrees } }
    : design;

const airways = (design: Design, change: (vent: AirwayVent) => Vent): Design => ({
  ...design,
  vents: design.vents.map((vent) => ("lumped" in vent ? vent : change(vent))),
});

const changeBores: Change = (design, amount) =>
  airways(design, (vent) => ({
    ...vent,
    bore: changeBore(vent.bore, amount),
    pieces: vent.pieces.map((piece) =>
      piece.bore_m === undefined ? piece : { ...piece, bore_m: piece.bore_m + amount },
    ),
  }));

function changeBore(bore: Bore, amount: number): Bore {
  return bore.shape === "round"
    ? { ...bore, diameter_m: bore.diameter_m + amount }
    : { ...bore, height_m: bore.height_m + amount };
}

const changePieces =
  (what: "tube" | "sheet" | "glue"): Change =>
  (design, amount) =>
    airways(design, (vent) => ({
      ...vent,
      pieces: vent.pieces.map((piece) => changePiece(piece, what, amount)),
    }));

function changePiece(piece: Piece, what: "tube" | "sheet" | "glue", amount: number): Piece {
  if (piece.kind === "tube")
    return what === "tube" ? { ...piece, length_m: piece.length_m + amount } : piece;
  if (piece.kind === "bend" || what === "tube") return piece;
  return what === "sheet"
    ? { ...piece, thickness_m: piece.thickness_m + amount }
    : { ...piece, glue_line_m: piece.glue_line_m + amount };
}

function glueLines(design: Design): number {
  return design.vents.reduce(
    (sum, vent) =>
      sum +
      ("lumped" in vent
        ? 0
        : vent.pieces.reduce(
            (lines, piece) =>
              lines + (piece.kind === "rings" ? piece.count : piece.kind === "plate" ? 1 : 0),
            0,
          )),
    0,
  );
}
