import { airwayAt, setBore, setVentCount } from "@/lib/bench/edits";
import type { Design } from "@/lib/document/schema";
import { told, type Cure, type Subject } from "../margin";
import { attempt, retuned } from "./attempt";

/** A wider bore or one vent more, each retuned, or less drive. */
export function airSpeedCures(subject: Subject, vent: number): Cure[] {
  const { design, answer } = subject;
  const speed = answer.vents[vent]?.peak_air_speed?.speed_m_s;
  const limit = design.target.air_speed_limit_m_s ?? 0.05 * answer.air.speed_of_sound_m_s;
  const tuning = design.target.tuning_hz ?? answer.tuning_hz;
  const shape = airwayAt(design, vent);
  if (!speed || !tuning || !shape) return [];
  const cures: Cure[] = [];
  const offer = (id: string, words: string, cost: number, change: (from: Design) => Design) => {
    const apply = (from: Design) => retuned(change(from), vent, tuning) ?? from;
    const changed = apply(design);
    if (changed === design) return;
    const found = attempt(changed);
    const peak = found?.vents[vent];
    if (!peak?.peak_air_speed || peak.peak_air_speed.speed_m_s > limit) return;
    cures.push({
      id,
      text: words,
      effect: `${told(subject, peak.peak_air_speed.speed_m_s, "speed")}, overall ${told(subject, peak.overall_length_m, "length")}`,
      cost,
      apply,
    });
  };
  if (shape.bore.shape === "round") {
    const wider = Math.ceil(shape.bore.diameter_m * Math.sqrt(speed / limit) * 1020) / 1000;
    offer("bore", `Widen the bore to ${told(subject, wider, "length")}`, 5, (from) =>
      setBore(from, vent, wider),
    );
  }
  if (shape.count < 16)
    offer(
      "count",
      shape.count === 1
        ? "Make two vents of this bore"
        : `Make ${shape.count + 1} vents of this bore`,
      6,
      (from) => setVentCount(from, vent, shape.count + 1),
    );
  const voltage_v = Math.floor(10 * design.drive.voltage_v * (limit / speed) * 0.995) / 10;
  const loss = 20 * Math.log10(design.drive.voltage_v / voltage_v);
  if (voltage_v > 0 && speed > limit)
    cures.push({
      id: "drive",
      text: `Drive it with ${told(subject, voltage_v, "voltage")}`,
      effect: `${told(subject, (speed * voltage_v) / design.drive.voltage_v, "speed")}, ${loss.toFixed(1)} dB less`,
      cost: 2 + loss,
      apply: (from) => ({ ...from, drive: { ...from.drive, voltage_v } }),
    });
  return cures;
}
