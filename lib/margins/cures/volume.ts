import { editEnclosure } from "@/lib/bench/edits";
import type { Design } from "@/lib/document/schema";
import { told, type Cure, type Subject } from "../margin";
import { attempt } from "./attempt";

/** The net volume the box really leaves, or a box as deep as the net volume asks. */
export function volumeCures(subject: Subject): Cure[] {
  const { design, answer } = subject;
  const inside = design.enclosure.inside_m;
  if (!inside) return [];
  const face = inside.width * inside.height;
  const solid =
    answer.vents.reduce(
      (sum, vent, index) => sum + vent.displaced_volume_m3 * (design.vents[index]?.count ?? 1),
      0,
    ) +
    (design.driver?.displacement_m3 ?? 0) * (design.driver?.count ?? 1);
  const net = Math.round((face * inside.depth - solid) * 1e5) / 1e5;
  const depth = Math.round(((design.enclosure.net_volume_m3 + solid) / face) * 1000) / 1000;
  const cures: Cure[] = [];
  const offer = (id: string, text: string, cost: number, apply: (from: Design) => Design) => {
    const tuning = attempt(apply(design))?.tuning_hz;
    if (tuning == null) return;
    const effect = `tuning ${told(subject, tuning, "frequency", { digits: 1 })}`;
    cures.push({ id, text, effect, cost, apply });
  };
  if (net > 0)
    offer("net", `Count with ${told(subject, net, "volume")} net`, 1, (from) =>
      editEnclosure(from, { net_volume_m3: net }),
    );
  offer("depth", `Make the box ${told(subject, depth, "length")} deep inside`, 6, (from) =>
    editEnclosure(from, { inside_m: { ...inside, depth } }),
  );
  return cures;
}
