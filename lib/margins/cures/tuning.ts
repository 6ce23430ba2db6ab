import { airwayAt, firstPiece, ringsOf, setRingCount } from "@/lib/bench/edits";
import { told, type Cure, type Subject } from "../margin";
import { attempt, retuned } from "./attempt";

/** One ring more or less, or the tube cut to the exact length: whatever comes nearer than now. */
export function tuningCures(subject: Subject): Cure[] {
  const { design, answer } = subject;
  const target = design.target.tuning_hz;
  const now = answer.tuning_hz;
  if (target === null || now === null) return [];
  return design.vents.flatMap((_, index) => {
    const vent = airwayAt(design, index);
    if (!vent || vent.bore.shape !== "round") return exactLength(subject, index, target);
    const at = firstPiece(vent, "rings");
    const stack = vent.pieces[at];
    const count = stack?.kind === "rings" ? stack.count : 0;
    const thickness =
      stack?.kind === "rings" ? `${told(subject, stack.thickness_m, "length")} ring` : "ring";
    const cures: Cure[] = [];
    for (const by of now > target ? [1, 2, 3] : [-1, -2, -3]) {
      if (count + by < 0 || ringsOf(vent) + by > 100) break;
      const apply = (from: typeof design) => setRingCount(from, index, count + by);
      const changed = attempt(apply(design));
      if (!changed || changed.tuning_hz === null) break;
      if (Math.abs(changed.tuning_hz - target) >= Math.abs(now - target)) break;
      cures.splice(0, cures.length, {
        id: `rings-${index}`,
        text: `${by > 0 ? "Add" : "Take off"} ${Math.abs(by) === 1 ? "one" : Math.abs(by)} ${thickness}${Math.abs(by) > 1 ? "s" : ""}`,
        effect: effect(subject, changed.tuning_hz, target),
        cost: 1 + Math.abs(by),
        apply,
      });
    }
    return [...cures, ...exactLength(subject, index, target)];
  });
}

function exactLength(subject: Subject, index: number, target: number): Cure[] {
  const { design } = subject;
  const vent = airwayAt(design, index);
  const at = vent ? firstPiece(vent, "tube") : -1;
  const tube = vent?.pieces[at];
  const changed = retuned(design, index, target);
  const solved = changed ? airwayAt(changed, index)?.pieces[at] : null;
  if (tube?.kind !== "tube" || solved?.kind !== "tube" || !changed) return [];
  const by = solved.length_m - tube.length_m;
  const found = attempt(changed)?.tuning_hz;
  if (found == null || Math.abs(by) < 5e-5) return [];
  const length = told(subject, Math.abs(by), "length");
  return [
    {
      id: `tube-${index}`,
      text: by < 0 ? `Trim the tube by ${length}` : `Take a tube ${length} longer`,
      effect: effect(subject, found, target),
      cost: by < 0 ? 1 : 4,
      apply: (from) => retuned(from, index, target) ?? from,
    },
  ];
}

function effect(subject: Subject, tuning: number, target: number): string {
  const off = tuning - target;
  const where = told(subject, tuning, "frequency", { digits: 1 });
  if (Math.abs(off) < 0.05) return `tuning ${where}, on the target`;
  return `tuning ${where}, ${told(subject, Math.abs(off), "frequency", { digits: 1 })} ${off > 0 ? "over" : "under"} the target`;
}
