/** What box suits a driver: a few standard alignments, each with what it is good for. */
import type { Driver } from "@/lib/document/schema";
import { alignmentFor, fixedAlignment, sixthOrderButterworth, type Alignment } from "./alignments";
import { totalQ } from "./driver";
import { arrangement } from "./driver-array";

export interface BoxSuggestion {
  /** Stable, for keys and choices. */
  id: "flat" | "gentle" | "damped" | "assisted" | "closed";
  /** Standard name of the alignment. */
  alignment: string;
  title: string;
  /** What it is for, in plain words. */
  purpose: string;
  net_volume_m3: number;
  /** Null for a closed box. */
  tuning_hz: number | null;
  f3_hz: number;
  f10_hz: number;
  peak_db: number;
  /** A high-pass that belongs to it. */
  filter: { frequency_hz: number; q: number } | null;
}

export interface SuggestOptions {
  /** Expected leakage of the box; 7 suits moderate boxes (Small 1973, Part III). Null for none. */
  ql?: number | null;
  source_resistance_ohm?: number;
}

/** More ripple than this is not offered as flat [dB]. */
const MOST_RIPPLE = 1.5;
/** Above this Q_T a vented box only booms. */
const MOST_Q = 0.7;

/**
 * Boxes for a driver or an array of them, the recommended one first.
 *
 *     V_B = N V_AS / α,  f_B = h f_S,  f_3 = (f_3/f_S) f_S;  Q_ES × (1 + R_g/R_E)
 *
 * @returns an empty list where no vented or closed box gives a sensible response
 * @source vented-box dossier 2; closed box: Q_TC = Q_T √(1 + V_AS/V_B)
 * @example dossier 4.4 (Q_T 0.30066, Q_L 7): QB3 of 120.56 L tuned to 28.825 Hz, f3 34.470 Hz
 */
export function suggestBoxes(driver: Driver, options: SuggestOptions = {}): BoxSuggestion[] {
  const ql = options.ql === undefined ? 7 : options.ql;
  const { series, parallel } = arrangement(driver);
  const array_ohm = (driver.re_ohm * series) / parallel;
  const qes = driver.qes * (1 + (options.source_resistance_ohm ?? 0) / array_ohm);
  const qt = totalQ(qes, driver.qms);
  const vas = driver.count * driver.vas_m3;
  /** Q_T against that of B4: near 1 the families fall together, above it these two rise to a peak. */
  const nearness = qt / (fixedAlignment("B4", ql)?.qt ?? 0.38);
  const make = (
    id: BoxSuggestion["id"],
    title: string,
    purpose: string,
    box: Alignment | null,
  ): BoxSuggestion[] =>
    box === null
      ? []
      : [
          {
            id,
            alignment: box.family,
            title,
            purpose,
            net_volume_m3: vas / box.alpha,
            tuning_hz: box.h * driver.fs_hz,
            f3_hz: box.f3 * driver.fs_hz,
            f10_hz: box.f10 * driver.fs_hz,
            peak_db: box.peak_db,
            filter: null,
          },
        ];
  return [
    ...(qt <= MOST_Q ? make("flat", ...flatBox(qt, ql)) : []),
    ...make(
      "gentle",
      "Gentle slope",
      "Begins to fall earlier but more slowly; room gain fills it in, and it settles sooner after a beat.",
      nearness < 0.93 ? alignmentFor("SC4", qt, ql) : null,
    ),
    ...make(
      "damped",
      "Tuned to the driver's resonance",
      "The least overhang of the vented boxes: the response of two damped resonances, an early and easy fall.",
      nearness < 1 ? alignmentFor("SBB4", qt, ql) : null,
    ),
    ...assisted(driver.fs_hz, vas, qt, ql),
    ...closedBox(driver.fs_hz, vas, qt),
  ];
}

/** The flattest box: QB3 below the Q_T of B4, C4 above it, B4 where they meet. */
function flatBox(qt: number, ql: number | null): [string, string, Alignment | null] {
  const b4 = fixedAlignment("B4", ql);
  if (b4 && Math.abs(qt / b4.qt - 1) < 0.001)
    return ["Maximally flat", "Flat to the corner, then falls at 24 dB an octave.", b4];
  const qb3 = alignmentFor("QB3", qt, ql);
  if (qb3)
    return [
      "Flat and compact",
      "The smallest box without a peak: flat to the corner. The usual choice for a strong motor.",
      qb3,
    ];
  const c4 = alignmentFor("C4", qt, ql);
  return [
    "Deep with a little ripple",
    "A large box that reaches below the driver's resonance, with a slight rise above the corner.",
    c4 && c4.peak_db <= MOST_RIPPLE ? c4 : null,
  ];
}

/** A sixth-order box with its resonant high-pass, where the driver's Q_T is near enough to it. */
function assisted(fs_hz: number, vas: number, qt: number, ql: number | null): BoxSuggestion[] {
  const box = sixthOrderButterworth(1, ql);
  if (!box || Math.abs(qt / box.qt - 1) > 0.04) return [];
  return [
    {
      id: "assisted",
      alignment: "B6",
      title: "Deep with a filter's help",
      purpose:
        "A resonant high-pass lifts the corner by 6 dB and keeps the cone still below it; it asks four times the power there.",
      net_volume_m3: vas / box.alpha,
      tuning_hz: box.h * fs_hz,
      f3_hz: fs_hz,
      f10_hz: fs_hz * (10 ** (10 / 10) - 1) ** (-1 / 12),
      peak_db: 0,
      filter: { frequency_hz: fs_hz, q: box.sectionQ },
    },
  ];
}

/** A closed box of Q_TC 0.7071, for drivers whose Q_T is high for a vent. */
function closedBox(fs_hz: number, vas: number, qt: number): BoxSuggestion[] {
  const ratio = Math.SQRT1_2 / qt;
  if (qt < 0.4 || ratio ** 2 - 1 < 0.05) return [];
  return [
    {
      id: "closed",
      alignment: "B2",
      title: "Closed box",
      purpose:
        "No vent at all: the easiest box to build, a slope of 12 dB an octave, less output low down.",
      net_volume_m3: vas / (ratio ** 2 - 1),
      tuning_hz: null,
      f3_hz: fs_hz * ratio,
      f10_hz: fs_hz * ratio * (10 - 1) ** (-1 / 4),
      peak_db: 0,
      filter: null,
    },
  ];
}
