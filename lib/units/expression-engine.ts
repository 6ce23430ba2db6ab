/** The smallest part of mathjs that evaluates arithmetic with units; a chunk of its own. */
import {
  addDependencies,
  create,
  divideDependencies,
  evaluateDependencies,
  multiplyDependencies,
  powDependencies,
  subtractDependencies,
  unaryMinusDependencies,
  unaryPlusDependencies,
  unitDependencies,
  type FactoryFunctionMap,
  type Unit,
} from "mathjs";

/** Each of these is exported by mathjs, whose types cannot say so. */
function present(...parts: (FactoryFunctionMap | undefined)[]): FactoryFunctionMap {
  return Object.assign({}, ...parts.filter((part) => part !== undefined));
}

const math = create(
  present(
    evaluateDependencies,
    addDependencies,
    subtractDependencies,
    multiplyDependencies,
    divideDependencies,
    powDependencies,
    unaryMinusDependencies,
    unaryPlusDependencies,
    unitDependencies,
  ),
);

/** Evaluates; throws where units do not match or the text does not parse. */
export function evaluateExpression(text: string): number | Unit {
  const result: unknown = math.evaluate?.(text);
  if (typeof result === "number") return result;
  if (isUnit(result)) return result;
  throw new Error("Not a quantity.");
}

function isUnit(value: unknown): value is Unit {
  return typeof value === "object" && value !== null && "toNumber" in value && "units" in value;
}
