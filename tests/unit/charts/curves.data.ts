import type { Curves } from "@/lib/acoustics/answer";

/** Curves of a plain kind: every value follows from its frequency by a formula that a reader can check. */
export function plainCurves(points = 401, vents = 1): Curves {
  const frequency_hz = Array.from(
    { length: points },
    (_, i) => 10 * 50 ** (i / Math.max(1, points - 1)),
  );
  const at = (value: (hz: number) => number) => frequency_hz.map(value);
  return {
    frequency_hz,
    // 20 dB in a decade up to 100 Hz, level above.
    spl_db: at((hz) => 100 + 20 * Math.log10(Math.min(hz, 100) / 100)),
    phase_deg: at((hz) => 180 - 360 * Math.log10(hz / 10)),
    group_delay_s: at((hz) => 0.2 / hz),
    excursion_peak_m: at((hz) => 0.24 / hz),
    impedance_ohm: at((hz) => 4 + 20 / (1 + ((hz - 50) / 4) ** 2)),
    impedance_phase_deg: at(() => 0),
    air_speed_peak_m_s: Array.from({ length: vents }, (_, n) =>
      at((hz) => 20 / (n + 1) / (1 + ((hz - 30) / 10) ** 2)),
    ),
    max_spl_db: at((hz) => 90 + hz / 10),
    max_spl_limit: frequency_hz.map((hz) => (hz < 40 ? "air speed" : "excursion")),
  };
}
