/**
 * What is said where a document or a request is refused: one error with its place, in words that
 * name the range and its unit.
 */
import type { z } from "zod";
import { InputError } from "@/lib/acoustics/input-error";
import { allowedAt, alternatives } from "./allowed";
import { jsonSchemaOf } from "./json-schema";
import { airSchema, airwayVentSchema, lumpedVentSchema } from "./schema";

/** The one body of an error, on the command line and in the API. */
export interface Refusal {
  /** Stable, lower case, underscores. */
  code: string;
  /** Such as `design.vents[0].bore.diameter_m`; empty for the request as a whole. */
  path: string;
  message: string;
  /** What would be accepted, in words with the unit; null where there is nothing to say. */
  allowed: string | null;
}

type Issue = z.core.$ZodIssue;
type Path = readonly PropertyKey[];

/** The value parsed, or the refusal to print. */
export function parseDocument<Schema extends z.ZodType>(
  schema: Schema,
  input: unknown,
): { ok: true; value: z.output<Schema> } | { ok: false; refusal: Refusal } {
  const parsed = schema.safeParse(input);
  if (parsed.success) return { ok: true, value: parsed.data };
  return { ok: false, refusal: refusalOf(parsed.error, schema, input) };
}

/** The first thing wrong, an unknown name before what it leaves missing. */
export function refusalOf(error: z.ZodError, schema: z.ZodType, input: unknown): Refusal {
  const issues = resolveBranches(error.issues, input);
  const first = issues[0];
  if (!first) return refusal("invalid", [], "The request is not allowed.", null);
  const owner = place(first.path.slice(0, -1));
  const unknown = issues.find(
    (issue) =>
      issue.code === "unrecognized_keys" && isMissing(first, input) && place(issue.path) === owner,
  );
  return describe(unknown ?? first, schema, input);
}

/** An expected refusal of the library in the same shape. */
export function refusalOfInput(error: InputError): Refusal {
  return { code: error.code, path: error.path, message: error.message, allowed: error.allowed };
}

/** A path the way people write it. @example place(["design", "vents", 0, "bore"]) // "design.vents[0].bore" */
export function place(path: Path): string {
  return path.reduce<string>(
    (text, part) =>
      typeof part === "number"
        ? `${text}[${part}]`
        : text
          ? `${text}.${String(part)}`
          : String(part),
    "",
  );
}

/**
 * Air and vents can each be given in two ways. Issues under them are those of the way that was
 * meant: bare elements where `lumped` is there, given air where its density or speed is.
 */
function resolveBranches(issues: readonly Issue[], input: unknown): Issue[] {
  const seen = new Set<string>();
  return issues.flatMap((issue) => {
    const at = branchPoint(issue.path);
    const value = at && valueAt(input, at);
    if (!at || typeof value !== "object" || value === null || Array.isArray(value))
      return unfold(issue);
    if (seen.has(place(at))) return [];
    seen.add(place(at));
    const meant = (at.at(-1) === "air" ? meantAir(value) : meantVent(value)).safeParse(value);
    if (meant.success) return unfold(issue);
    return meant.error.issues.flatMap((inner) =>
      unfold({ ...inner, path: [...at, ...inner.path] } as Issue),
    );
  });
}

/** A union none of whose branches fits: the branch with the least wrong. */
function unfold(issue: Issue): Issue[] {
  if (issue.code !== "invalid_union" || issue.errors.length === 0) return [issue];
  const branch = [...issue.errors].sort((a, b) => a.length - b.length)[0] ?? [];
  return branch.flatMap((inner) =>
    unfold({ ...inner, path: [...issue.path, ...inner.path] } as Issue),
  );
}

const meantAir = (value: object): z.ZodType =>
  airSchema.options["density_kg_m3" in value || "speed_of_sound_m_s" in value ? 1 : 0];
const meantVent = (value: object): z.ZodType =>
  "lumped" in value ? lumpedVentSchema : airwayVentSchema;

function branchPoint(path: Path): PropertyKey[] | null {
  const start = path[0] === "design" ? 1 : 0;
  if (path[start] === "air") return path.slice(0, start + 1);
  if (path[start] === "vents" && typeof path[start + 1] === "number")
    return path.slice(0, start + 2);
  return null;
}

function valueAt(input: unknown, path: Path): unknown {
  return path.reduce<unknown>(
    (value, part) =>
      typeof value === "object" && value !== null
        ? (value as Record<PropertyKey, unknown>)[part]
        : undefined,
    input,
  );
}

const isMissing = (issue: Issue, input: unknown) =>
  (issue.code === "invalid_type" ||
    issue.code === "invalid_value" ||
    issue.code === "invalid_union") &&
  valueAt(input, issue.path) === undefined;

function describe(issue: Issue, schema: z.ZodType, input: unknown): Refusal {
  const name = place(issue.path) || "The request";
  if (issue.code === "unrecognized_keys") {
    const key = issue.keys[0] ?? "";
    const siblings = allowedAt(jsonSchemaOf(schema), issue.path, input);
    const path = [...issue.path, key];
    return refusal("unknown_field", path, `There is no field ${key} here.`, siblings);
  }
  if (issue.code === "custom") return refusal("invalid", issue.path, issue.message, null);
  const allowed = allowedAt(jsonSchemaOf(schema), issue.path, input);
  const say = (code: string, text: string) => refusal(code, issue.path, text, allowed);
  if (isMissing(issue, input)) return say("missing", `${name} is missing.`);
  const value = valueAt(input, issue.path);
  switch (issue.code) {
    case "too_small":
    case "too_big":
      return Array.isArray(value)
        ? say("out_of_range", `${name} has ${value.length} entries.`)
        : typeof value === "string"
          ? say("out_of_range", `${name} is ${value.length} characters long.`)
          : say("out_of_range", `${name} is ${String(value)}.`);
    case "invalid_union":
      return refusal(
        "not_allowed",
        issue.path,
        `${name} is ${JSON.stringify(value)?.slice(0, 80)}.`,
        namesOf(issue) ?? allowed,
      );
    case "invalid_value":
      return say("not_allowed", `${name} is ${JSON.stringify(value)?.slice(0, 80)}.`);
    case "invalid_type":
      if (typeof value === "number")
        return say("wrong_type", `${name} is ${value}, not ${article(issue.expected)}.`);
      return say("wrong_type", `${name} is ${kindOf(value)}, not ${article(issue.expected)}.`);
    default:
      return say("invalid", `${name} is not allowed: ${issue.message}.`);
  }
}

/** The names a union is told apart by, as in "round or slot". */
function namesOf(issue: Issue): string | null {
  const names = "options" in issue && Array.isArray(issue.options) ? issue.options.map(String) : [];
  return names.length > 0 ? alternatives(names) : null;
}

function refusal(code: string, path: Path, message: string, allowed: string | null): Refusal {
  return { code, path: place(path), message, allowed };
}

function kindOf(value: unknown): string {
  return value === null ? "null" : Array.isArray(value) ? "a list" : article(typeof value);
}

function article(kind: string): string {
  if (kind === "int") return "a whole number";
  if (kind === "array") return "a list";
  if (kind === "number") return "a finite number";
  if (kind === "boolean") return "true or false";
  if (kind === "string") return "a text";
  return /^[aeiou]/.test(kind) ? `an ${kind}` : `a ${kind}`;
}
