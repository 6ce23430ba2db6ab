import { evaluate } from "@/lib/acoustics";
import type { Answer } from "@/lib/acoustics/answer";
import { InputError } from "@/lib/acoustics/input-error";
import { lengthForTuning } from "@/lib/acoustics/length";
import { setTubeLength } from "@/lib/bench/edits";
import type { Design } from "@/lib/document/schema";

/** The answer to a changed design; null where it cannot be built. */
export function attempt(design: Design): Answer | null {
  try {
    return evaluate(design);
  } catch (error) {
    if (error instanceof InputError) return null;
    throw error;
  }
}

/** The design with the vent's tube solved for its target (or the tuning it has); null out of reach. */
export function retuned(design: Design, vent: number, tuning_hz: number): Design | null {
  try {
    const { tube_length_m } = lengthForTuning(design, vent, tuning_hz);
    return setTubeLength(design, vent, Math.round(tube_length_m * 1e4) / 1e4);
  } catch (error) {
    if (error instanceof InputError) return null;
    throw error;
  }
}
