/**
 * The requests of the command line and the API, each with its limits. The design inside is the
 * document's own schema; what is left out takes the value the contract shows.
 */
import { z } from "zod";
import { designSchema } from "./schema";

const length = (min: number, max: number) => z.number().min(min).max(max);
const tuning = z.number().min(1).max(2_000);
const ventIndex = z.number().int().min(0).max(15).default(0);
const model = {
  solver: z.enum(["fitted", "field"]).default("fitted"),
  vent_losses: z.boolean().default(true),
};

export const evaluateRequestSchema = z.strictObject({
  design: designSchema,
  frequency_hz: z.array(z.number().min(0.1).max(100_000)).min(1).max(5_000).optional(),
  level: z.enum(["small", "drive"]).default("small"),
  ...model,
});

export const lengthRequestSchema = z.strictObject({
  design: designSchema,
  vent: ventIndex,
  tuning_hz: tuning,
  ...model,
});

export const sheetSchema = z.strictObject({
  name: z.string().min(1).max(120),
  thickness_m: length(0.0005, 0.2),
  thickness_sd_m: length(0, 0.05).default(0),
  within_sheet_sd_m: length(0, 0.05).nullable().optional(),
});

export const ringsRequestSchema = z.strictObject({
  design: designSchema,
  vent: ventIndex,
  tuning_hz: tuning,
  sheets: z.array(sheetSchema).min(1).max(12),
  ring_outer_diameter_m: length(0.005, 3),
  glue_line_m: length(0, 0.005).default(0),
  glue_line_sd_m: length(0, 0.005).default(0),
  max_rings: z.number().int().min(0).max(100).default(12),
  may_trim_tube: z.boolean().default(true),
  trim_loss_m: length(0, 0.05).default(0.001),
  ...model,
});

export const jigRequestSchema = z.strictObject({
  bore_m: length(0.001, 3),
  outer_diameter_m: length(0.001, 3),
  bit_diameter_m: length(0.0005, 0.1),
  bearing_diameter_m: length(0.001, 0.1).nullable().optional(),
  bushing_diameter_m: length(0.001, 0.2).nullable().optional(),
  round_over_radius_m: length(0, 0.2).nullable().optional(),
  stack_depth_m: length(0, 10).nullable().optional(),
});

/** Every command with the schema of its request. */
export const requestSchemas = {
  evaluate: evaluateRequestSchema,
  length: lengthRequestSchema,
  rings: ringsRequestSchema,
  jig: jigRequestSchema,
} as const;

export type CommandName = keyof typeof requestSchemas;
export const commandNames = Object.keys(requestSchemas) as CommandName[];
export type RequestOf<Name extends CommandName> = z.output<(typeof requestSchemas)[Name]>;

/** The longest request that is read [bytes]: a design of 16 full vents and 5,000 frequencies is well below. */
export const LARGEST_REQUEST = 512 * 1024;
