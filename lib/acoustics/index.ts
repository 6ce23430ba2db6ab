/** The library's surface: what other parts of the product may lean on. */
export { airProperties } from "./air";
export {
  alignmentFor,
  chebyshevPeak,
  fixedAlignment,
  sixthOrderButterworth,
  type Alignment,
  type AlignmentFamily,
} from "./alignments";
export { boxWith, coefficientsOf, type BoxShape, type Coefficients } from "./alignment-response";
export type * from "./answer";
export { coilImpedance, type Coil } from "./coil";
export { curvesOf, logarithmicFrequencies, USUAL_FREQUENCIES } from "./curves";
export {
  driverAnswer,
  mechanicalFrom,
  midBandLevel,
  referenceAir,
  referenceEfficiency,
  thieleSmallFrom,
  totalQ,
  type Mechanical,
  type ThieleSmall,
} from "./driver";
export { arrangement, driverArray, isobaricPair } from "./driver-array";
export { checkDriver, type DriverCheckResult, type DriverFigures } from "./driver-check";
export { evaluate } from "./evaluate";
export { butterworthQ, filterGain, filterSections } from "./filters";
export { InputError } from "./input-error";
export { lengthForTuning } from "./length";
export { largestLevel } from "./limits";
export { suggestBoxes, type BoxSuggestion } from "./suggest-boxes";
export {
  closedBoxResonance,
  enclosureCompliance,
  systemOf,
  type System,
  type SystemResponse,
} from "./system";
export {
  tuningTolerance,
  USUAL_TOLERANCES,
  type ToleranceInputs,
  type TuningTolerance,
} from "./tolerance";
export { tuningFrequency, tuningOf } from "./tuning";
export { modelVent } from "./vent";
export type { AirProperties, VentModel, VentResponse } from "./vent-model";
