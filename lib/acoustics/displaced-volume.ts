/** What a vent takes from the inside of the box. */
import type { AirwayVent, Enclosure } from "@/lib/document/schema";
import type { Airway } from "./airway";

/** Wall taken where a piece's outside is not given [m]. */
const UNKNOWN_WALL_M = 0.003;

/**
 * Outer envelope of what stands inside the panel, bore air included [m³]. A shell's trumpet is
 * bounded by an arc of its radius less its wall, with a lip of the wall's thickness.
 *
 * @param a - bore radius [m]
 * @param wall - wall of the shell [m]
 * @source solid of revolution (Pappus), exact
 */
export function displacedVolume(
  vent: AirwayVent,
  enclosure: Enclosure,
  airway: Airway,
  a: number,
  wall: number,
): number {
  const face = vent.outer_end.proud_m + enclosure.panel_thickness_m;
  const slot = vent.bore.shape === "slot" ? vent.bore : null;
  const shell = vent.inner_end.form === "shell" ? vent.inner_end.flare_radius_m : 0;
  let volume = 0;
  for (const seg of airway.segments) {
    const from = Math.max(seg.start_m, face),
      to = Math.min(seg.end_m, airway.overallLength_m - shell);
    if (to <= from) continue;
    const area = slot
      ? airway.boreArea_m2
      : Math.PI * (seg.outer_m !== null ? seg.outer_m / 2 : a + UNKNOWN_WALL_M) ** 2;
    volume += area * (to - from);
  }
  if (shell > 0) {
    const lip = a + shell,
      ra = Math.max(0, shell - wall),
      o = lip - ra;
    volume += Math.PI * lip * lip * Math.min(wall, shell);
    volume +=
      Math.PI * (ra * (o + ra) ** 2 - (o + ra) * (Math.PI / 2) * ra * ra + ra ** 3 - ra ** 3 / 3);
  }
  return Math.max(0, volume);
}
