import { electricalCaution } from "../cautions";
import { statusOf, told, type Check } from "../margin";

export const impedance: Check = (subject) => {
  const { answer, design } = subject;
  const curves = answer.curves;
  if (!curves) return [];
  let at = 0;
  curves.impedance_ohm.forEach((ohms, i) => {
    if (ohms < (curves.impedance_ohm[at] ?? Infinity)) at = i;
  });
  const least = curves.impedance_ohm[at] ?? 0;
  const value = told(subject, least, "resistance");
  const where = told(subject, curves.frequency_hz[at] ?? 0, "frequency", { digits: 0 });
  const bears = design.amplifier?.minimum_load_ohm ?? null;
  if (bears === null)
    return [
      {
        id: "impedance",
        title: "Least impedance",
        status: "unknown",
        value,
        limit: "amplifier not given",
        left: value,
        reason: `${value} at ${where}. Type what load the amplifier bears.`,
      },
    ];
  const left = least - bears;
  return [
    {
      id: "impedance",
      title: "Least impedance",
      status: statusOf(left, 0.05 * bears),
      value,
      limit: told(subject, bears, "resistance"),
      left: told(subject, left, "resistance", { signed: true }),
      reason: `${value} at ${where}; the amplifier bears ${told(subject, bears, "resistance")}.`,
      ...(left < 0 ? { caution: electricalCaution.text } : {}),
    },
  ];
};
