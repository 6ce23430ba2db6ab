/** One whole answer on 400 frequencies of a design with two unlike vents. */
import { evaluate } from "@/lib/acoustics";
import { denSub } from "@/lib/document/samples";
import { designSchema } from "@/lib/document/schema";
import { plainEvaluate } from "../plain-c";

const WARM_UP = 200;
const RUNS = 400;

export async function bench() {
  const one = designSchema.parse(denSub);
  const [vent] = one.vents;
  if (!vent || "lumped" in vent) throw new Error("The sample design has no vent to double.");
  const narrower = {
    ...structuredClone(vent),
    name: "Second",
    bore: { shape: "round" as const, diameter_m: 0.076 },
  };
  const design = designSchema.parse({ ...one, vents: [vent, narrower] });
  const times: number[] = [];
  for (let run = 0; run < WARM_UP + RUNS; run++) {
    const began = performance.now();
    evaluate(design);
    if (run >= WARM_UP) times.push(performance.now() - began);
  }
  times.sort((a, b) => a - b);
  const median_ms = times[times.length >> 1]!;
  const notes = [`95 of 100 within ${times[Math.floor(0.95 * times.length)]!.toFixed(2)} ms`];
  const plain = plainEvaluate(design);
  if (plain) {
    const level = evaluate(design).curves?.spl_db ?? [];
    const apart = Math.max(...plain.spl_db.map((value, i) => Math.abs(value - level[i]!)));
    if (!(apart < 1e-3)) throw new Error(`The C and the library differ by ${apart} dB.`);
    notes.push(
      `plain C ${plain.median_ms.toFixed(2)} ms, its levels within ${apart.toExponential(1)} dB;`,
      "it is handed the geometry and leaves out the pipe resonances",
    );
  }
  const ratio_to_c = plain ? median_ms / plain.median_ms : null;
  return { name: "evaluate", median_ms, ratio_to_c, notes };
}
