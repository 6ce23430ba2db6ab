import { statusOf, told, type Check, type Margin, type Subject } from "../margin";

/** Share of x max that counts as near. */
const NEAR = 0.08;

export const excursion: Check = (subject) => {
  const { design, answer } = subject;
  const curves = answer.curves;
  if (!curves || !design.driver) return [];
  const xmax = design.driver.xmax_m;
  if (xmax === undefined)
    return [
      {
        id: "excursion",
        title: "Cone excursion",
        status: "unknown",
        value: "–",
        limit: "x max not given",
        left: "–",
        reason: "Type the driver's x max to hold its travel against it.",
      },
    ];
  const edge = answer.tuning_hz ?? design.driver.fs_hz;
  const margin = (id: string, title: string, from: number, to: number): Margin[] => {
    const peak = peakBetween(subject, from, to);
    if (!peak) return [];
    const left = xmax - peak.x_m;
    const at = told(subject, peak.frequency_hz, "frequency", { digits: 0 });
    return [
      {
        id,
        title,
        status: statusOf(left, NEAR * xmax),
        value: told(subject, peak.x_m, "length"),
        limit: told(subject, xmax, "length"),
        left: told(subject, left, "length", { signed: true }),
        reason: `${told(subject, peak.x_m, "length")} peak at ${at}; x max is ${told(subject, xmax, "length")}.`,
      },
    ];
  };
  const below = told(subject, edge, "frequency", { digits: 0 });
  return [
    ...margin("excursion-band", `Cone above ${below}`, edge, 1e6),
    ...margin("excursion-below", `Cone below ${below}`, 0, edge),
  ];
};

/** Largest travel between two frequencies, or null where no point lies there. */
export function peakBetween({ answer }: Subject, from: number, to: number) {
  const curves = answer.curves;
  if (!curves) return null;
  let best: { x_m: number; frequency_hz: number } | null = null;
  curves.frequency_hz.forEach((frequency_hz, i) => {
    const x_m = curves.excursion_peak_m[i] ?? 0;
    if (frequency_hz >= from && frequency_hz < to && (!best || x_m > best.x_m))
      best = { x_m, frequency_hz };
  });
  return best as { x_m: number; frequency_hz: number } | null;
}
