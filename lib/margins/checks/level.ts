import { hearingCaution, LOUD_DB } from "../cautions";
import { told, type Check } from "../margin";

/** How loud the set drive is. Not a limit of the box: it carries the hearing caution. */
export const level: Check = (subject) => {
  const curves = subject.answer.curves;
  if (!curves) return [];
  let at = 0;
  curves.spl_db.forEach((db, i) => {
    if (db > (curves.spl_db[at] ?? -Infinity)) at = i;
  });
  const loudest = curves.spl_db[at] ?? 0;
  if (loudest < LOUD_DB) return [];
  const value = told(subject, loudest, "level");
  return [
    {
      id: "level",
      title: "Level at the set drive",
      status: "within",
      value,
      limit: "–",
      left: value,
      reason: `At 1 m in half space, at ${told(subject, curves.frequency_hz[at] ?? 0, "frequency", { digits: 0 })}.`,
      caution: hearingCaution.text,
    },
  ];
};
