/** The checks of a design, worst first. Fast enough to follow a hand: it only reads the answer. */
import type { Answer } from "@/lib/acoustics/answer";
import type { Design } from "@/lib/document/schema";
import { airSpeed } from "./checks/air-speed";
import { clearance } from "./checks/clearance";
import { excursion } from "./checks/excursion";
import { impedance } from "./checks/impedance";
import { level } from "./checks/level";
import { pipeResonance } from "./checks/pipe-resonance";
import { ringWall } from "./checks/ring-wall";
import { tuning } from "./checks/tuning";
import { volumeShare } from "./checks/volume-share";
import type { Check, Margin, MarginContext, Status } from "./margin";

/** In the order in which a builder asks, which decides among equals. */
const checks: readonly Check[] = [
  tuning,
  airSpeed,
  excursion,
  clearance,
  pipeResonance,
  volumeShare,
  ringWall,
  impedance,
  level,
];

const rank: Record<Status, number> = { over: 0, near: 1, within: 2, unknown: 3 };

export function marginsOf(design: Design, answer: Answer, context: MarginContext): Margin[] {
  return checks
    .flatMap((check) => check({ design, answer, ...context }))
    .sort((a, b) => rank[a.status] - rank[b.status]);
}
