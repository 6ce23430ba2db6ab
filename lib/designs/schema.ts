/** What the designs' routes accept. */
import { z } from "zod";
import { designSchema } from "@/lib/document/schema";

export const createDesignSchema = z.object({ document: designSchema });

export const saveDesignSchema = z.object({
  version: z.number().int().min(1),
  document: designSchema,
});

export const renameDesignSchema = z.object({
  name: z.string().trim().min(1, "A design has a name.").max(200),
});
