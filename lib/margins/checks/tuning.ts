import { told, type Check, type Status } from "../margin";
import { tuningSpread } from "../tuning-spread";

/** How far off the target counts as met, and as near: shares of the tuning. A person hardly hears 1.5 %, and a sheet's thickness moves as much. */
const MET = 0.015;
const NEAR = 0.03;

/** Where a tuning stands to its target. */
export function tuningStatus(found_hz: number, target_hz: number): Status {
  const share = Math.abs(found_hz - target_hz) / target_hz;
  return share <= MET ? "within" : share <= NEAR ? "near" : "over";
}

export const tuning: Check = (subject) => {
  const { answer, design } = subject;
  const found = answer.tuning_hz;
  const target = design.target.tuning_hz;
  if (found === null) return [];
  const title = "Tuning";
  const value = told(subject, found, "frequency", { digits: 1 });
  const spread = tuningSpread(design, answer);
  const largest = spread.causes
    .slice(0, 2)
    .map(({ name, sd_hz }) => `${name} (${sd_hz.toFixed(2)})`)
    .join(" and ");
  const band = `± ${told(subject, spread.sd_hz, "frequency", { digits: 1 })}, mostly from ${largest}.`;
  if (target === null)
    return [
      {
        id: "tuning",
        title,
        status: "unknown",
        value,
        limit: "no target",
        left: value,
        reason: `${band} Set the tuning you want to see how far off it is.`,
      },
    ];
  const off = found - target;
  return [
    {
      id: "tuning",
      title,
      status: tuningStatus(found, target),
      value,
      limit: told(subject, target, "frequency", { digits: 1 }),
      left: told(subject, off, "frequency", { digits: 1, signed: true }),
      reason: band,
    },
  ];
};
