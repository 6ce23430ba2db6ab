/**
 * The command line: `npm run --silent ventwright -- COMMAND < request.json > answer.json`.
 * Exit 0 with the answer; exit 2 with one line of JSON on standard error where the request is
 * refused; exit 1 where the fault is ours. No database, no network.
 */
import { LARGEST_REQUEST } from "@/lib/document/requests";
import { parseJson, runCommand, isCommand, type CommandResult } from "@/lib/document/run-command";

async function readStandardInput(): Promise<string | null> {
  const chunks: Buffer[] = [];
  let size = 0;
  for await (const chunk of process.stdin as AsyncIterable<Buffer>) {
    size += chunk.length;
    if (size > LARGEST_REQUEST) return null;
    chunks.push(chunk);
  }
  return Buffer.concat(chunks).toString("utf8");
}

async function answer(): Promise<CommandResult> {
  const [command = "", ...rest] = process.argv.slice(2);
  if (!isCommand(command) || rest.length > 0)
    return runCommand(isCommand(command) ? rest.join(" ") : command, null);
  const text = await readStandardInput();
  if (text === null)
    return {
      ok: false,
      refusal: {
        code: "too_large",
        path: "",
        message: "The request is too large.",
        allowed: `at most ${LARGEST_REQUEST} bytes`,
      },
    };
  const body = parseJson(text);
  return body.ok ? runCommand(command, body.value) : body;
}

answer()
  .then((result) => {
    if (result.ok) process.stdout.write(`${JSON.stringify(result.answer)}\n`);
    else {
      process.stderr.write(`${JSON.stringify({ error: result.refusal })}\n`);
      process.exitCode = 2;
    }
    process.stdin.destroy();
  })
  .catch((error: unknown) => {
    const message = error instanceof Error ? error.message : String(error);
    const refusal = { code: "internal", path: "", message, allowed: null };
    process.stderr.write(`${JSON.stringify({ error: refusal })}\n`);
    process.exitCode = 1;
    process.stdin.destroy();
  });
