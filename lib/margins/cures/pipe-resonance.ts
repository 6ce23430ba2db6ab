import { filterOf, setFilter } from "@/lib/bench/edits";
import type { Filter } from "@/lib/document/schema";
import { PIPE_OCTAVES } from "../checks/pipe-resonance";
import { told, type Cure, type Subject } from "../margin";

/** A lower low-pass. */
export function pipeResonanceCures(subject: Subject, vent: number): Cure[] {
  const { design, answer } = subject;
  const first = answer.vents[vent]?.pipe_resonances_hz[0];
  if (!first) return [];
  const frequency_hz = Math.floor(first / 2 ** PIPE_OCTAVES);
  const present = filterOf(design, "lowpass");
  // Already low enough: being near is no fault to cure.
  if (present && present.frequency_hz <= frequency_hz) return [];
  const filter: Filter = present
    ? { ...present, frequency_hz }
    : { kind: "lowpass", family: "linkwitz-riley", order: 4, frequency_hz };
  return [
    {
      id: "lowpass",
      text: `${present ? "Lower the low-pass to" : "Set a low-pass at"} ${told(subject, frequency_hz, "frequency", { digits: 0 })}`,
      effect: `${PIPE_OCTAVES} octaves under the ${told(subject, first, "frequency", { digits: 0 })} resonance`,
      cost: 1,
      apply: (from) => setFilter(from, "lowpass", filter),
    },
  ];
}
