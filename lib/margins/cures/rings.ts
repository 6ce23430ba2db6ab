import { airwayAt, editAirway, setInnerFlare } from "@/lib/bench/edits";
import type { Design } from "@/lib/document/schema";
import { LEAST_LAND_M, LEAST_RING_WALL_M } from "../checks/ring-wall";
import { told, type Cure, type Subject } from "../margin";
import { attempt } from "./attempt";

/** Wider rings, or a smaller inner flare. */
export function ringCures(subject: Subject, vent: number): Cure[] {
  const { design } = subject;
  const shape = airwayAt(design, vent);
  if (!shape || shape.bore.shape !== "round") return [];
  const bore = shape.bore.diameter_m;
  const flare = shape.inner_end.flare_radius_m;
  const wall = Math.max(LEAST_RING_WALL_M + 0.003, flare + LEAST_LAND_M + 0.002);
  const outside = Math.ceil((bore + 2 * wall) * 1000) / 1000;
  const widen = (from: Design) =>
    editAirway(from, vent, (old) => ({
      ...old,
      pieces: old.pieces.map((piece) =>
        piece.kind === "rings" || piece.kind === "plate"
          ? { ...piece, outer_diameter_m: Math.max(piece.outer_diameter_m, outside) }
          : piece,
      ),
    }));
  const cures: Cure[] = [];
  const offer = (id: string, text: string, cost: number, apply: (from: Design) => Design) => {
    if (JSON.stringify(apply(design)) === JSON.stringify(design)) return;
    const tuning = attempt(apply(design))?.tuning_hz;
    if (tuning == null) return;
    const effect = `tuning ${told(subject, tuning, "frequency", { digits: 1 })}`;
    cures.push({ id, text, effect, cost, apply });
  };
  offer("outside", `Cut the rings ${told(subject, outside, "length")} outside`, 2, widen);
  const smaller = Math.floor(flare * 500) / 1000;
  if (smaller > 0.001)
    offer("flare", `Round the inner edge ${told(subject, smaller, "length")} instead`, 1, (from) =>
      setInnerFlare(from, vent, smaller),
    );
  return cures;
}
