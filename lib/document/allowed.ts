/** What a place of a document accepts, said in words from the schema. */
import type { JsonSchema } from "./json-schema";
import { unitOfPath } from "./name-units";

type Path = readonly PropertyKey[];

/** @example allowedAt(schema, ["design", "vents", 0, "bore", "diameter_m"], input) // "0.005 to 2 m" */
export function allowedAt(schema: JsonSchema, path: Path, input: unknown): string | null {
  let at: JsonSchema | undefined = schema;
  let value = input;
  for (const part of path) {
    at = branchFor(at, value);
    at = typeof part === "number" ? at?.items : at?.properties?.[String(part)];
    value =
      typeof value === "object" && value !== null
        ? (value as Record<PropertyKey, unknown>)[part]
        : undefined;
    if (!at) return null;
  }
  return at ? inWords(at, path, value) : null;
}

function inWords(schema: JsonSchema, path: Path, value: unknown): string | null {
  const branches = branchesOf(schema);
  const nullable = branches.some((branch) => branch.type === "null");
  const node = branchFor(schema, value);
  if (!node) return null;
  const words = nodeInWords(node, path);
  return words && nullable ? `${words}, or null` : words;
}

function nodeInWords(node: JsonSchema, path: Path): string | null {
  if (node.const !== undefined) return JSON.stringify(node.const);
  if (node.enum) return alternatives(node.enum.map(String));
  switch (node.type) {
    case "number":
    case "integer":
      return range(node, unitOfPath(path), node.type === "integer");
    case "array":
      return `a list of ${span(node.minItems, node.maxItems)} entries`;
    case "string":
      return `a text of ${span(node.minLength, node.maxLength)} characters`;
    case "boolean":
      return "true or false";
    case "object":
      return `an object with ${Object.keys(node.properties ?? {}).join(", ")}`;
    default:
      return null;
  }
}

function range(node: JsonSchema, unit: string | null, whole: boolean): string {
  const kind = whole ? "a whole number, " : "";
  const suffix = unit === null ? "" : unit === "°" ? unit : ` ${unit}`;
  const { minimum, maximum, exclusiveMinimum } = node;
  if (exclusiveMinimum !== undefined && maximum !== undefined)
    return `${kind}more than ${exclusiveMinimum} and at most ${maximum}${suffix}`;
  if (minimum !== undefined && maximum !== undefined)
    return `${kind}${minimum} to ${maximum}${suffix}`;
  if (exclusiveMinimum !== undefined) return `${kind}more than ${exclusiveMinimum}${suffix}`;
  return `${kind}a finite number${unit === null ? "" : ` in ${unit}`}`;
}

function span(min: number | undefined, max: number | undefined): string {
  if (max === undefined) return `${min ?? 0} or more`;
  return `${min ?? 0} to ${max}`;
}

function branchesOf(schema: JsonSchema): JsonSchema[] {
  return schema.anyOf ?? schema.oneOf ?? [schema];
}

/** The branch of a union that a value means: by its constant fields, then by the names it shares. */
function branchFor(schema: JsonSchema | undefined, value: unknown): JsonSchema | undefined {
  if (!schema) return undefined;
  const branches = branchesOf(schema).filter((branch) => branch.type !== "null");
  if (branches.length <= 1) return branches[0];
  if (typeof value !== "object" || value === null) return branches[0];
  const score = (branch: JsonSchema) =>
    Object.entries(branch.properties ?? {}).reduce((sum, [name, field]) => {
      if (!(name in value)) return sum;
      if (field.const === undefined) return sum + 1;
      return sum + ((value as Record<string, unknown>)[name] === field.const ? 100 : -100);
    }, 0);
  return [...branches].sort((a, b) => score(b) - score(a))[0];
}

/** @example alternatives(["round", "slot"]) // "round or slot" */
export function alternatives(names: string[]): string {
  return names.length < 2
    ? (names[0] ?? "")
    : `${names.slice(0, -1).join(", ")} or ${names.at(-1)}`;
}
