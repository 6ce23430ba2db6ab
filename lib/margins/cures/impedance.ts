import { editDriver } from "@/lib/bench/edits";
import { told, type Cure, type Subject } from "../margin";
import { attempt } from "./attempt";

/** Another wiring of several drivers. */
export function impedanceCures(subject: Subject): Cure[] {
  const { design } = subject;
  const bears = design.amplifier?.minimum_load_ohm;
  const driver = design.driver;
  if (!driver || driver.count < 2 || bears == null || driver.wiring === "series") return [];
  const apply = (from: typeof design) => editDriver(from, { wiring: "series" });
  const least = Math.min(...(attempt(apply(design))?.curves?.impedance_ohm ?? [0]));
  if (least < bears) return [];
  return [
    {
      id: "wiring",
      text: "Wire the drivers in series",
      effect: `${told(subject, least, "resistance")} at least, ${(20 * Math.log10(driver.count)).toFixed(0)} dB less from the same voltage`,
      cost: 2,
      apply,
    },
  ];
}
