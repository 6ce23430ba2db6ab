/** JSON Schema of the design document and of the requests, derived from the one definition. */
import { z } from "zod";
import { requestSchemas, type CommandName } from "./requests";
import { designSchema } from "./schema";

/** The part of JSON Schema that our own schemas come out as. */
export interface JsonSchema {
  type?: string;
  const?: unknown;
  enum?: unknown[];
  default?: unknown;
  properties?: Record<string, JsonSchema>;
  required?: string[];
  items?: JsonSchema;
  anyOf?: JsonSchema[];
  oneOf?: JsonSchema[];
  minimum?: number;
  maximum?: number;
  exclusiveMinimum?: number;
  minItems?: number;
  maxItems?: number;
  minLength?: number;
  maxLength?: number;
}

/** Of the document as it may be written down, defaults left out. Refinements across fields are not in it. */
export function designJsonSchema(): JsonSchema {
  return jsonSchemaOf(designSchema);
}

export function requestJsonSchema(command: CommandName): JsonSchema {
  return jsonSchemaOf(requestSchemas[command]);
}

/** JSON Schema (draft 2020-12) of what a schema accepts as input. */
export function jsonSchemaOf(schema: z.ZodType): JsonSchema {
  return z.toJSONSchema(schema, { io: "input" }) as JsonSchema;
}
