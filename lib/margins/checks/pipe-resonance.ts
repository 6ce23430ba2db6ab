import { filterOf } from "@/lib/bench/edits";
import { ofVent, statusOf, told, type Check } from "../margin";

/** Octaves asked for between the low-pass and the first pipe resonance: common practice, no source. */
export const PIPE_OCTAVES = 2;

export const pipeResonance: Check = (subject) => {
  const { design, answer } = subject;
  const lowpass = filterOf(design, "lowpass");
  return answer.vents.flatMap((vent, index) => {
    const first = vent.pipe_resonances_hz[0];
    if (first === undefined) return [];
    const title = `First pipe resonance${ofVent(design, index)}`;
    const value = told(subject, first, "frequency", { digits: 0 });
    const id = `pipe-resonance-${index}`;
    if (!lowpass)
      return [
        {
          id,
          title,
          status: "unknown" as const,
          value,
          limit: "no low-pass",
          left: value,
          reason:
            "No low-pass is set, so nothing keeps the vent from sounding like a pipe. Set the one the driver is used with.",
        },
      ];
    const octaves = Math.log2(first / lowpass.frequency_hz);
    return [
      {
        id,
        title,
        status: statusOf(octaves - PIPE_OCTAVES, 0.15),
        value,
        limit: `${PIPE_OCTAVES} octaves over the low-pass`,
        left: value,
        reason: `${octaves.toFixed(1)} octaves over the ${told(subject, lowpass.frequency_hz, "frequency", { digits: 0 })} low-pass; ${PIPE_OCTAVES} are asked (common practice).`,
      },
    ];
  });
};
