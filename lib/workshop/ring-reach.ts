/** What tunings a stack of rings can reach, and which length of rings meets the one wanted. */
import { InputError } from "@/lib/acoustics/input-error";
import { pieceLength } from "@/lib/acoustics/airway";
import { tuningOf } from "@/lib/acoustics/tuning";
import type { Piece } from "@/lib/document/schema";
import { bareVent, withStacks, type BareVent, type RingRequest } from "./ring-request";

/** Shortest stump of a tube that is still a tube [m]. */
const STUMP_M = 0.001;

/** Evaluates the finished vent of one request; remembers why a vent could not be built. */
export class RingBench {
  readonly bare: BareVent;
  /** Most that may come off the tube [m]; 0 where it may not be trimmed. */
  readonly mostTrim_m: number;
  /** Least that rings less trim must add for both flares to find room [m]; mostly negative. */
  readonly shortestNet_m: number;
  /** Longest stack there is room for behind the untrimmed tube [m]. */
  readonly room_m: number;
  refusal: InputError | null = null;

  constructor(
    readonly request: RingRequest,
    private readonly options: { vent_losses: boolean },
  ) {
    this.bare = bareVent(request);
    const { vent, tubeAt, tubeLength_m } = this.bare;
    const flare = tubeAt === 0 ? vent.outer_end.flare_radius_m : 0;
    this.shortestNet_m =
      vent.outer_end.flare_radius_m + vent.inner_end.flare_radius_m - this.restLength_m + 1e-9;
    this.mostTrim_m =
      request.may_trim_tube && tubeAt >= 0
        ? Math.max(0, tubeLength_m - Math.max(flare, STUMP_M))
        : 0;
    const { inside_m: inside, panel_thickness_m: panel } = request.design.enclosure;
    this.room_m =
      inside && vent.clearance_m === null
        ? inside.depth + panel + vent.outer_end.proud_m - this.restLength_m - 1e-6
        : Infinity;
  }

  /** Everything but rings, untrimmed [m]. */
  get restLength_m(): number {
    const { vent } = this.bare;
    return vent.pieces.reduce((sum, piece) => sum + pieceLength(piece, vent.bore), 0);
  }

  /** Tuning of the vent with these stacks [Hz]; null where it cannot be built. */
  tuning(stacks: Piece[], trim_m: number): number | null {
    if (stacks.length === 0 && this.bare.vent.pieces.length === 0) return null;
    try {
      return tuningOf(
        withStacks(this.request.design, this.request.vent, this.bare, stacks, trim_m),
        this.options,
      );
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      this.refusal ??= error;
      return null;
    }
  }

  /**
   * Tuning where rings and trim add `net_m` in all [Hz], rings standing at the end. Rings of one
   * outside and bore act by their length alone, so one thick ring stands for any mix.
   */
  tuningAtNet(net_m: number, shortest_m: number): number | null {
    const added = Math.max(net_m, shortest_m);
    const { ring_outer_diameter_m, glue_line_m } = this.request;
    return this.tuning(
      [
        {
          kind: "rings",
          count: 1,
          thickness_m: added - glue_line_m,
          outer_diameter_m: ring_outer_diameter_m,
          glue_line_m,
        },
      ],
      added - net_m,
    );
  }
}

/**
 * The x in [low, high] where a falling tuning meets the wanted one: 1/f² is nearly linear in a
 * vent's length, so it is interpolated (Illinois' variant of false position).
 *
 * @returns x, or null where the ends do not enclose it or a vent in between cannot be built
 */
export function meet(
  tuning: (x: number) => number | null,
  wanted_hz: number,
  low: number,
  high: number,
): number | null {
  const miss = (x: number): number | null => {
    const f = tuning(x);
    return f === null ? null : (wanted_hz / f) ** 2 - 1;
  };
  let [a, b] = [low, high];
  let [fa, fb] = [miss(a), miss(b)];
  if (fa === null || fb === null || fa > 0 || fb < 0) return null;
  let side = 0;
  for (let i = 0; i < 60; i++) {
    const x: number = fb === fa ? (a + b) / 2 : a - (fa * (b - a)) / (fb - fa);
    const fx = miss(x);
    if (fx === null) return null;
    if (Math.abs(fx) < 1e-9 || b - a < 1e-10) return x;
    if (fx < 0) {
      [a, fa] = [x, fx];
      if (side === -1) fb /= 2;
      side = -1;
    } else {
      [b, fb] = [x, fx];
      if (side === 1) fa /= 2;
      side = 1;
    }
  }
  return (a + b) / 2;
}
