/**
 * What the whole-system circuit needs to know of one vent, whatever it is made of: how much air
 * moves at each end for one pascal in the enclosure.
 */
import type { Note, VentAnswer } from "./answer";

/** State of the air, SI. */
export interface AirProperties {
  /** ρ [kg/m³] */
  density: number;
  /** c [m/s] */
  speedOfSound: number;
  /** ν [m²/s] */
  kinematicViscosity: number;
  /** γ [1] */
  heatCapacityRatio: number;
  /** Pr [1] */
  prandtl: number;
}

/** Volume velocities per pascal of enclosure pressure, of one vent, counted outwards [m³/(s·Pa)]. */
export interface VentResponse {
  innerRe: Float64Array;
  innerIm: Float64Array;
  outerRe: Float64Array;
  outerIm: Float64Array;
}

export interface VentModel {
  /** Identical vents that act in parallel. */
  count: number;
  boreArea_m2: number;
  /** All of the contract's figures but the peak air speed, which takes a driver. */
  figures: Omit<VentAnswer, "peak_air_speed">;
  notes: Note[];
  /** Response of one vent at each angular frequency [rad/s]. */
  respond(angularFrequency: Float64Array): VentResponse;
}
