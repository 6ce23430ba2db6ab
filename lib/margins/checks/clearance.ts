import { layOutAirway } from "@/lib/acoustics/airway";
import { ofVent, statusOf, told, type Check } from "../margin";

/** Bore diameters of free air asked for behind the inner end: common practice, no source. */
export const CLEARANCE_BORES = 1;
/** A slot asks for its short side. */
export const clearance: Check = (subject) =>
  subject.design.vents.flatMap((vent, index) => {
    if ("lumped" in vent) return [];
    const airway = layOutAirway(vent, subject.design.enclosure, `design.vents[${index}]`);
    const title = `Inner clearance${ofVent(subject.design, index)}`;
    const id = `clearance-${index}`;
    if (!Number.isFinite(airway.clearance_m))
      return [
        {
          id,
          title,
          status: "unknown" as const,
          value: "–",
          limit: "–",
          left: "–",
          reason: "Type the inside dimensions to see how far the inner end stands from the wall.",
        },
      ];
    const bore =
      vent.bore.shape === "round"
        ? vent.bore.diameter_m
        : Math.min(vent.bore.width_m, vent.bore.height_m);
    const bores = airway.clearance_m / bore;
    const gauge = vent.bore.shape === "round" ? "Ø" : "× height";
    return [
      {
        id,
        title,
        status: statusOf(bores - CLEARANCE_BORES, 0.15),
        value: told(subject, airway.clearance_m, "length"),
        limit: `${CLEARANCE_BORES} ${gauge}`,
        left: `${bores.toFixed(2)} ${gauge}`,
        reason: `${told(subject, airway.clearance_m, "length")} to the wall it faces. Under 1 ${gauge} the wall starts to lengthen the vent and to make noise (common practice).`,
      },
    ];
  });
