import type { Answer } from "@/lib/acoustics/answer";
import { filterOf, setFilter } from "@/lib/bench/edits";
import type { Design, Filter } from "@/lib/document/schema";
import { told, type Cure, type Subject } from "../margin";
import { attempt } from "./attempt";

const worst = (answer: Answer | null) =>
  Math.max(...(answer?.curves?.excursion_peak_m ?? [Infinity]));

/** The lowest infrasonic filter that brings the cone inside, with what it costs, or less drive. */
export function excursionCures(subject: Subject): Cure[] {
  const { design, answer } = subject;
  const xmax = design.driver?.xmax_m;
  const tuning = answer.tuning_hz;
  if (!xmax || !answer.curves) return [];
  const cures: Cure[] = [];
  const present = filterOf(design, "highpass");
  const filter = (frequency_hz: number): Filter =>
    present
      ? { ...present, frequency_hz }
      : { kind: "highpass", family: "butterworth", order: 4, frequency_hz };
  const put = (frequency_hz: number) => (from: Design) =>
    setFilter(from, "highpass", filter(frequency_hz));
  const low = Math.ceil(present?.frequency_hz ?? 8);
  const high = Math.ceil((tuning ?? 40) * 1.15);
  for (let corner = low; corner <= high; corner++) {
    const found = attempt(put(corner)(design));
    if (worst(found) > xmax) continue;
    cures.push({
      id: "highpass",
      text: present
        ? `Raise the infrasonic filter to ${told(subject, corner, "frequency", { digits: 0 })}`
        : `Add a 24 dB/oct infrasonic filter at ${told(subject, corner, "frequency", { digits: 0 })}`,
      effect: `inside x max, ${lost(answer, found, tuning ?? 30)}`,
      cost: 1,
      apply: put(corner),
    });
    break;
  }
  const scale = (xmax / worst(answer)) * 0.995;
  const voltage_v = Math.floor(10 * design.drive.voltage_v * scale) / 10;
  if (scale < 1 && voltage_v > 0)
    cures.push({
      id: "drive",
      text: `Drive it with ${told(subject, voltage_v, "voltage")}`,
      effect: `inside x max, ${(20 * Math.log10(design.drive.voltage_v / voltage_v)).toFixed(1)} dB less everywhere`,
      cost: 3,
      apply: (from) => ({ ...from, drive: { ...from.drive, voltage_v } }),
    });
  return cures;
}

/** What a filter costs at a named frequency. */
function lost(before: Answer, after: Answer | null, frequency: number): string {
  const at = (answer: Answer | null) => {
    const curves = answer?.curves;
    if (!curves) return 0;
    const index = curves.frequency_hz.findIndex((value) => value >= frequency);
    return curves.spl_db[Math.max(0, index)] ?? 0;
  };
  return `${Math.max(0, at(before) - at(after)).toFixed(1)} dB lost at ${frequency.toFixed(0)} Hz`;
}
