import type { ZodType } from "zod";
import { AppError } from "./errors";

/** Parses a form's body; what is wrong is told field by field. */
export function parseForm<T>(schema: ZodType<T>, body: unknown): T {
  const result = schema.safeParse(body);
  if (result.success) return result.data;
  const fields: Record<string, string> = {};
  for (const issue of result.error.issues) fields[issue.path.join(".") || "form"] ??= issue.message;
  throw new AppError("invalid", { fields });
}
