/**
 * Cures: changes of a design that bring a margin inside, tried on the design itself. Searches cost
 * a few milliseconds each, so they run when the hand rests. Cheapest first.
 */
import type { Answer } from "@/lib/acoustics/answer";
import type { Design } from "@/lib/document/schema";
import { airSpeedCures } from "./cures/air-speed";
import { clearanceCures } from "./cures/clearance";
import { excursionCures } from "./cures/excursion";
import { impedanceCures } from "./cures/impedance";
import { pipeResonanceCures } from "./cures/pipe-resonance";
import { ringCures } from "./cures/rings";
import { tuningCures } from "./cures/tuning";
import { volumeCures } from "./cures/volume";
import type { Cure, MarginContext, Subject } from "./margin";

type Search = (subject: Subject, vent: number) => Cure[];

const searches: [id: string, search: Search][] = [
  ["tuning", tuningCures],
  ["air-speed", airSpeedCures],
  ["excursion", excursionCures],
  ["clearance", clearanceCures],
  ["pipe-resonance", pipeResonanceCures],
  ["volume-ledger", volumeCures],
  ["ring-wall", ringCures],
  ["inner-flare", ringCures],
  ["impedance", impedanceCures],
];

/** The cures of one margin by its id, cheapest first; none where nothing was found that helps. */
export function curesOf(
  id: string,
  design: Design,
  answer: Answer,
  context: MarginContext,
): Cure[] {
  const found = searches.find(([prefix]) => id === prefix || id.startsWith(`${prefix}-`));
  const vent = Number(/-(\d+)$/.exec(id)?.[1] ?? 0);
  return (found?.[1]({ design, answer, ...context }, vent) ?? []).sort((a, b) => a.cost - b.cost);
}
