import { statusOf, told, type Check } from "../margin";

/** Share of the gross volume the vents may take before the box is the wrong size for them: common practice, no source. */
const SHARE = 0.15;

export const volumeShare: Check = (subject) => {
  const { design, answer } = subject;
  const taken = answer.vents.reduce(
    (sum, vent, index) => sum + vent.displaced_volume_m3 * (design.vents[index]?.count ?? 1),
    0,
  );
  if (answer.vents.length === 0) return [];
  const driver = (design.driver?.displacement_m3 ?? 0) * (design.driver?.count ?? 1);
  const net = design.enclosure.net_volume_m3;
  const inside = design.enclosure.inside_m;
  const gross = inside ? inside.width * inside.height * inside.depth : net + taken + driver;
  const share = taken / gross;
  const margins = [
    {
      id: "volume-share",
      title: "Vents' share of the box",
      status: statusOf(SHARE - share, 0.03),
      value: `${(100 * share).toFixed(1)} %`,
      limit: `${100 * SHARE} %`,
      left: `${(100 * (SHARE - share)).toFixed(1)} %`,
      reason: `The vents take ${told(subject, taken, "volume")} of ${told(subject, gross, "volume")} gross, bore and wall.`,
    },
  ];
  if (inside) {
    const room = gross - taken - driver;
    const left = room - net;
    margins.push({
      id: "volume-ledger",
      title: "Net volume in the box",
      status: left < -0.005 * net ? "over" : left > 0.06 * net ? "near" : "within",
      value: told(subject, room, "volume"),
      limit: told(subject, net, "volume"),
      left: told(subject, left, "volume", { signed: true }),
      reason: `${told(subject, gross, "volume")} inside less vents ${told(subject, taken, "volume")} and driver ${told(subject, driver, "volume")} leaves ${told(subject, room, "volume")}; ${told(subject, net, "volume")} net is set. Braces and lining come off it too.`,
    });
  }
  return margins;
};
