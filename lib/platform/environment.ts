import "server-only";
import { z } from "zod";

const schema = z.object({
  NODE_ENV: z.enum(["development", "production", "test"]).default("development"),
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  SESSION_SECRET: z.string().min(32, "SESSION_SECRET has at least 32 characters"),
  LOG_LEVEL: z.enum(["fatal", "error", "warn", "info", "debug", "silent"]).default("info"),
  BCRYPT_COST: z.coerce.number().int().min(4).max(15).default(12),
  /** Set behind a proxy that ends TLS, so that the session cookie is marked secure. */
  SECURE_COOKIES: z.enum(["true", "false"]).default("false"),
});

export type Environment = z.infer<typeof schema>;

let parsed: Environment | null = null;

/** The environment, parsed once. Throws with every fault named. */
export function environment(): Environment {
  if (parsed) return parsed;
  const result = schema.safeParse(process.env);
  if (!result.success) {
    const faults = result.error.issues.map(({ path, message }) => `${path.join(".")}: ${message}`);
    throw new Error(`The environment is not complete. ${faults.join("; ")}`);
  }
  parsed = result.data;
  return parsed;
}
