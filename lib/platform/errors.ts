/** Every way a request can be refused or fail: a closed list, each with its status and its words. */
const kinds = {
  bad_request: { status: 400, message: "The request could not be read." },
  invalid: { status: 422, message: "Something in the request is not allowed." },
  signed_out: { status: 401, message: "Sign in first." },
  wrong_credentials: { status: 401, message: "The e-mail address or the password is not right." },
  forbidden: { status: 403, message: "Your role in this shop may not do that." },
  foreign_origin: { status: 403, message: "The request came from another site." },
  not_found: { status: 404, message: "There is nothing here by that name." },
  email_taken: { status: 409, message: "There is an account with that e-mail address already." },
  conflict: { status: 409, message: "Someone else has saved this design in the meantime." },
  too_large: { status: 413, message: "The request is too large." },
  too_many: { status: 429, message: "Too many tries. Wait a little." },
  unavailable: { status: 503, message: "The database does not answer. Try again shortly." },
  internal: { status: 500, message: "Something went wrong here." },
} as const;

export type ErrorCode = keyof typeof kinds;

/** What a client is told. */
export interface ErrorBody {
  error: {
    code: ErrorCode;
    message: string;
    requestId: string;
    /** Field by field, for forms. */
    fields?: Record<string, string>;
    /** What else the client needs, such as the current version in a conflict. */
    details?: Record<string, unknown>;
  };
}

export interface ErrorExtras {
  message?: string;
  fields?: Record<string, string>;
  details?: Record<string, unknown>;
  headers?: Record<string, string>;
  cause?: unknown;
}

/** An expected refusal, thrown where it is found and answered at the edge. */
export class AppError extends Error {
  readonly status: number;
  readonly extras: ErrorExtras;
  constructor(
    readonly code: ErrorCode,
    extras: ErrorExtras = {},
  ) {
    super(extras.message ?? kinds[code].message, { cause: extras.cause });
    this.name = "AppError";
    this.status = kinds[code].status;
    this.extras = extras;
  }
}
