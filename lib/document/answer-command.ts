/** A command asked for over HTTP: the same answers and the same errors as on the command line. */
import { LARGEST_REQUEST, type CommandName } from "./requests";
import { parseJson, runCommand } from "./run-command";
import type { Refusal } from "./errors";

/** 200 with the answer; 400 where the body is no JSON, 413 where it is too long, 422 where it is refused. */
export async function answerCommand(command: CommandName, request: Request): Promise<Response> {
  const text = await readAtMost(request, LARGEST_REQUEST);
  if (text === null)
    return refuse(413, {
      code: "too_large",
      path: "",
      message: "The request is too large.",
      allowed: `at most ${LARGEST_REQUEST} bytes`,
    });
  const body = parseJson(text);
  if (!body.ok) return refuse(400, body.refusal);
  const result = await runCommand(command, body.value);
  return result.ok ? Response.json(result.answer) : refuse(422, result.refusal);
}

function refuse(status: number, refusal: Refusal): Response {
  return Response.json({ error: refusal }, { status });
}

/** The body, read no further than the limit; null beyond it. */
async function readAtMost(request: Request, limit: number): Promise<string | null> {
  if (Number(request.headers.get("content-length") ?? 0) > limit) return null;
  const reader = request.body?.getReader();
  if (!reader) return "";
  const decoder = new TextDecoder();
  let text = "";
  let size = 0;
  for (;;) {
    const { done, value } = await reader.read();
    if (done) return text + decoder.decode();
    size += value.byteLength;
    if (size > limit) {
      await reader.cancel();
      return null;
    }
    text += decoder.decode(value, { stream: true });
  }
}
