/** How the client writes designs: our own routes, with their errors typed. */
import type { Design } from "@/lib/document/schema";
import { ask } from "@/lib/platform/ask";
import type { SavedDesign } from "./contract";

export const createDesign = (document: Design) =>
  ask<SavedDesign>("/api/designs", { method: "POST", body: { document } });

export const saveDesign = (id: string, version: number, document: Design) =>
  ask<SavedDesign>(`/api/designs/${id}`, { method: "PUT", body: { version, document } });

export const renameDesign = (id: string, name: string) =>
  ask<SavedDesign>(`/api/designs/${id}`, { method: "PATCH", body: { name } });

export const deleteDesign = (id: string) => ask<null>(`/api/designs/${id}`, { method: "DELETE" });

export const restoreDesign = (id: string) =>
  ask<SavedDesign>(`/api/designs/${id}/restore`, { method: "POST" });

export const duplicateDesign = (id: string) =>
  ask<SavedDesign>(`/api/designs/${id}/duplicate`, { method: "POST" });
