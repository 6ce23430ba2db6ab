export { airProperties } from "./air";
export { evaluate } from "./evaluate";
export { lengthForTuning } from "./length";
export { tuningFrequency, tuningOf } from "./tuning";
export { modelVent } from "./vent";
