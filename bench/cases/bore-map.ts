/**
 * 20,000 candidate vents, each with solved length, clearance, first pipe resonance and peak air
 * speed. In the product this runs in a worker; here it runs by itself, after a warm-up.
 */
import { boreField } from "@/lib/bore-map/field";
import { denSub, hallTwelve } from "@/lib/document/samples";
import { designSchema } from "@/lib/document/schema";

const RUNS = 15;

export async function bench() {
  const designs = [denSub, hallTwelve].map((input) => designSchema.parse(input));
  const first = performance.now();
  let solved = 0;
  let size = 0;
  designs.forEach((design) => ({ solved, size } = boreField(design, 0)));
  const cold = (performance.now() - first) / designs.length;
  const times: number[] = [];
  for (let run = 0; run < RUNS; run++)
    for (const design of designs) {
      const began = performance.now();
      ({ solved, size } = boreField(design, 0));
      times.push(performance.now() - began);
    }
  times.sort((a, b) => a - b);
  return {
    name: "bore-map",
    median_ms: times[times.length >> 1]!,
    ratio_to_c: null,
    notes: [
      `${size} candidates, ${solved} of them solved one by one; target under 100 ms`,
      `${cold.toFixed(0)} ms before the code is warm, ${times.at(-1)!.toFixed(0)} ms at worst`,
    ],
  };
}
