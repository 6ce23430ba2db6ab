import "server-only";
import { AppError, type ErrorBody } from "./errors";
import { log } from "./log";

export interface RouteContext<Params> {
  request: Request;
  params: Params;
  requestId: string;
  /** Where the request came from, for rate limits. */
  address: string;
}

type Handler<Params> = (context: RouteContext<Params>) => Promise<Response>;

const SAFE = new Set(["GET", "HEAD", "OPTIONS"]);

/**
 * Wraps a route handler: the request id, the same-origin check of every write, and the one place
 * where errors become answers and log lines.
 */
export function route<Params = Record<string, never>>(handler: Handler<Params>) {
  return async (request: Request, segment: { params: Promise<Params> }): Promise<Response> => {
    const requestId = request.headers.get("x-request-id") ?? crypto.randomUUID();
    try {
      if (!SAFE.has(request.method)) requireSameOrigin(request);
      const params = await segment.params;
      const response = await handler({ request, params, requestId, address: addressOf(request) });
      response.headers.set("x-request-id", requestId);
      return response;
    } catch (error) {
      return refuse(error, request, requestId);
    }
  };
}

function refuse(error: unknown, request: Request, requestId: string): Response {
  const known = error instanceof AppError ? error : new AppError(codeOf(error), { cause: error });
  const where = { requestId, method: request.method, path: new URL(request.url).pathname };
  if (known.status >= 500) log.error({ ...where, code: known.code, err: known.cause ?? known });
  else log.info({ ...where, code: known.code });
  const { fields, details, headers } = known.extras;
  const body: ErrorBody = {
    error: {
      code: known.code,
      message: known.message,
      requestId,
      ...(fields ? { fields } : {}),
      ...(details ? { details } : {}),
    },
  };
  return Response.json(body, {
    status: known.status,
    headers: { ...headers, "x-request-id": requestId },
  });
}

/** A database that cannot be reached is not a fault of the request. */
function codeOf(error: unknown): "unavailable" | "internal" {
  for (let at: unknown = error; at instanceof Error; at = at.cause) {
    const code = "code" in at ? String(at.code) : "";
    if (/^(ECONN|ENOTFOUND|57P0|08)/.test(code) || /timeout exceeded when trying/.test(at.message))
      return "unavailable";
  }
  return "internal";
}

/** Browsers say where a write comes from; a write from another site is refused. */
function requireSameOrigin(request: Request): void {
  const site = request.headers.get("sec-fetch-site");
  if (site && site !== "same-origin" && site !== "none") throw new AppError("foreign_origin");
  const origin = request.headers.get("origin");
  // A sandboxed frame sends the word "null", which is no address at all.
  if (origin && (!URL.canParse(origin) || new URL(origin).host !== request.headers.get("host")))
    throw new AppError("foreign_origin");
}

/**
 * The caller's address as the server passes it on. It can be forged where no proxy of ours sets
 * it, so no limit rests on it alone.
 */
function addressOf(request: Request): string {
  return request.headers.get("x-forwarded-for")?.split(",").at(-1)?.trim() || "unknown";
}

/** The JSON body, at most so many bytes. */
export async function readJson(request: Request, limit = 1_000_000): Promise<unknown> {
  const declared = Number(request.headers.get("content-length") ?? 0);
  if (declared > limit) throw new AppError("too_large");
  const text = await request.text();
  if (text.length > limit) throw new AppError("too_large");
  try {
    return JSON.parse(text);
  } catch (cause) {
    throw new AppError("bad_request", { message: "The request is not JSON.", cause });
  }
}
