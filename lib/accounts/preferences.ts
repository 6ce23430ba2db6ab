/** How a person reads numbers and pages; kept with the account. */
import { z } from "zod";

export const preferencesSchema = z.object({
  system: z.enum(["metric", "imperial"]).default("metric"),
  tape: z.union([z.literal(16), z.literal(32), z.literal(64)]).default(32),
  theme: z.enum(["light", "dark", "system"]).default("system"),
});

export type Preferences = z.infer<typeof preferencesSchema>;

export const defaultPreferences: Preferences = preferencesSchema.parse({});
