/** A request of the client to our own routes, with their errors typed. */
import type { ErrorBody } from "./errors";

/** The server refused or failed; code "offline" where it could not be reached at all. */
export class AskError extends Error {
  constructor(
    readonly code: ErrorBody["error"]["code"] | "offline",
    message: string,
    readonly fields: Record<string, string> = {},
    readonly details: Record<string, unknown> = {},
    readonly requestId: string | null = null,
  ) {
    super(message);
    this.name = "AskError";
  }
}

interface AskOptions {
  method?: "GET" | "POST" | "PUT" | "PATCH" | "DELETE";
  body?: unknown;
  signal?: AbortSignal;
  keepalive?: boolean;
}

export async function ask<T>(path: string, options: AskOptions = {}): Promise<T> {
  const { method = "GET", body, signal, keepalive } = options;
  let response: Response;
  try {
    response = await fetch(path, {
      method,
      signal,
      keepalive,
      ...(body === undefined
        ? {}
        : { headers: { "content-type": "application/json" }, body: JSON.stringify(body) }),
    });
  } catch (cause) {
    if (cause instanceof DOMException && cause.name === "AbortError") throw cause;
    throw new AskError("offline", "The server cannot be reached. Your work stays here.");
  }
  if (response.status === 204) return null as T;
  const answer: unknown = await response.json().catch(() => null);
  if (response.ok) return answer as T;
  const error = isErrorBody(answer) ? answer.error : null;
  throw new AskError(
    error?.code ?? "internal",
    error?.message ?? `The server answered ${response.status}.`,
    error?.fields,
    error?.details,
    error?.requestId ?? response.headers.get("x-request-id"),
  );
}

function isErrorBody(value: unknown): value is ErrorBody {
  return typeof value === "object" && value !== null && "error" in value;
}
