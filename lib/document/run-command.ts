/**
 * The four commands, as the command line and the API both answer them: a name and an unknown body
 * in, an answer or a refusal out. Each command's code is loaded when it is asked for.
 */
import { InputError } from "@/lib/acoustics/input-error";
import { parseDocument, refusalOfInput, type Refusal } from "./errors";
import { commandNames, requestSchemas, type CommandName, type RequestOf } from "./requests";

export type CommandResult = { ok: true; answer: unknown } | { ok: false; refusal: Refusal };

const runners: { [Name in CommandName]: (request: RequestOf<Name>) => Promise<unknown> } = {
  async evaluate({ design, ...options }) {
    const { evaluate } = await import("@/lib/acoustics/evaluate");
    return evaluate(design, options);
  },
  async length({ design, vent, tuning_hz, solver, vent_losses }) {
    const { lengthForTuning } = await import("@/lib/acoustics/length");
    const answer = lengthForTuning(design, vent, tuning_hz, { vent_losses });
    return solver === "field" ? { ...answer, notes: [...answer.notes, fieldNote] } : answer;
  },
  async rings({ solver, ...request }) {
    const { planRings } = await import("@/lib/workshop/rings");
    const answer = planRings(request);
    return solver === "field" ? { ...answer, notes: [fieldNote] } : answer;
  },
  async jig(request) {
    const { jigCard } = await import("@/lib/workshop/jig");
    return jigCard(request);
  },
};

const fieldNote = {
  code: "field_solver_not_landed",
  message: "The field solver is not there yet; this is the fitted answer.",
};

export const isCommand = (name: string): name is CommandName =>
  (commandNames as string[]).includes(name);

/** Runs a command on a request that nothing is known of. Throws only what is a fault of ours. */
export async function runCommand(name: string, body: unknown): Promise<CommandResult> {
  if (!isCommand(name))
    return refuse({
      code: "unknown_command",
      path: "",
      message: name ? `There is no command ${name}.` : "No command is given.",
      allowed: commandNames.join(", "),
    });
  return runKnown(name, body);
}

async function runKnown<Name extends CommandName>(
  name: Name,
  body: unknown,
): Promise<CommandResult> {
  const parsed = parseDocument(requestSchemas[name], body);
  if (!parsed.ok) return refuse(parsed.refusal);
  try {
    const answer = await runners[name](parsed.value as RequestOf<Name>);
    const bad = firstNotFinite(answer, "");
    return bad === null ? { ok: true, answer } : refuse(notFinite(bad));
  } catch (error) {
    if (error instanceof InputError) return refuse(refusalOfInput(error));
    throw error;
  }
}

/** Reads JSON; a refusal where it is none. */
export function parseJson(
  text: string,
): { ok: true; value: unknown } | { ok: false; refusal: Refusal } {
  try {
    return { ok: true, value: JSON.parse(text) };
  } catch {
    return {
      ok: false,
      refusal: {
        code: "bad_json",
        path: "",
        message: text.trim() ? "The request is not JSON." : "The request is empty.",
        allowed: "one JSON object",
      },
    };
  }
}

function refuse(refusal: Refusal): CommandResult {
  return { ok: false, refusal };
}

function notFinite(path: string): Refusal {
  return {
    code: "not_finite",
    path,
    message: `With these figures ${path} of the answer is not a finite number.`,
    allowed: null,
  };
}

/** Where a number of an answer is not finite; null where all are. */
function firstNotFinite(value: unknown, path: string): string | null {
  if (typeof value === "number") return Number.isFinite(value) ? null : path;
  if (typeof value !== "object" || value === null) return null;
  for (const [key, inner] of Object.entries(value)) {
    const bad = firstNotFinite(
      inner,
      Array.isArray(value) ? `${path}[${key}]` : path ? `${path}.${key}` : key,
    );
    if (bad !== null) return bad;
  }
  return null;
}
