/**
 * What the library answers: the shapes of the `evaluate` contract. SI units, named in each field.
 * Conventions: e^{+jωt}; speeds and excursions are peak values, voltages rms.
 */

/** Something a reader should know of a result, such as an input outside a model's validity. */
export interface Note {
  /** Stable, lower case, underscores. */
  code: string;
  message: string;
}

export interface AirAnswer {
  density_kg_m3: number;
  speed_of_sound_m_s: number;
  kinematic_viscosity_m2_s: number;
}

/** Mechanical parameters of one driver. */
export interface DriverAnswer {
  mms_kg: number;
  cms_m_n: number;
  rms_kg_s: number;
  bl_t_m: number;
  qts: number;
  efficiency: number;
  /** At 2.83 V, 1 m, half space. */
  sensitivity_db: number;
}

export interface EndCorrections {
  outer: number;
  inner: number;
  /** The enclosure air's own plane mass, referred to the bore of one vent. */
  enclosure_air: number;
  bore_steps: number;
}

export interface VentAnswer {
  overall_length_m: number;
  effective_length_m: number;
  end_corrections_m: EndCorrections;
  inertance_kg_m4: number;
  pipe_resonances_hz: number[];
  bore_area_m2: number;
  displaced_volume_m3: number;
  /** Null without a driver. */
  peak_air_speed: { speed_m_s: number; frequency_hz: number } | null;
}

export type LevelLimit = "excursion" | "air speed" | "power" | "voltage" | "load";

export interface Curves {
  frequency_hz: number[];
  spl_db: number[];
  phase_deg: number[];
  group_delay_s: number[];
  excursion_peak_m: number[];
  impedance_ohm: number[];
  impedance_phase_deg: number[];
  /** Per vent, mean over the bore. */
  air_speed_peak_m_s: number[][];
  /** Null where no limit is known. */
  max_spl_db: (number | null)[];
  max_spl_limit: (LevelLimit | null)[];
}

export interface Answer {
  air: AirAnswer;
  driver: DriverAnswer | null;
  tuning_hz: number | null;
  vents: VentAnswer[];
  /** Null without a driver. */
  curves: Curves | null;
  notes: Note[];
}

export interface EvaluateOptions {
  frequency_hz?: readonly number[];
  level?: "small" | "drive";
  solver?: "fitted" | "field";
  vent_losses?: boolean;
}
