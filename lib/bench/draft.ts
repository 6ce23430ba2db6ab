/**
 * A visitor's work, kept in the browser until there is a shop to keep it in.
 */
import type { Design } from "@/lib/document/schema";

const KEY = "ventwright.draft";

export interface VisitorDraft {
  design: Design;
  saved_at: string;
}

/** The draft kept in this browser, or null: none yet, not readable, or of a later format. */
export function readVisitorDraft(): VisitorDraft | null {
  try {
    const text = window.localStorage.getItem(KEY);
    if (!text) return null;
    const draft: unknown = JSON.parse(text);
    return isDraft(draft) ? draft : null;
  } catch {
    return null;
  }
}

function isDraft(value: unknown): value is VisitorDraft {
  if (typeof value !== "object" || value === null || !("design" in value)) return false;
  const { design } = value;
  return (
    typeof design === "object" &&
    design !== null &&
    "format" in design &&
    design.format === 1 &&
    "vents" in design &&
    Array.isArray(design.vents) &&
    "enclosure" in design
  );
}

/** Keeps a visitor's design; false where the browser refuses (private mode, full). */
export function keepInBrowser(design: Design, saved_at: string): boolean {
  try {
    window.localStorage.setItem(KEY, JSON.stringify({ design, saved_at } satisfies VisitorDraft));
    return true;
  } catch {
    return false;
  }
}

export function forgetVisitorDraft(): void {
  try {
    window.localStorage.removeItem(KEY);
  } catch {
    // Nothing was kept where nothing may be removed.
  }
}

/**
 * After signing up or in: what was made without an account becomes a saved design of the shop.
 * Null where there was nothing. The browser's copy goes only once the server has its own.
 */
export async function keepVisitorDraft(): Promise<{ designId: string } | null> {
  const draft = readVisitorDraft();
  if (!draft) return null;
  const response = await fetch("/api/designs", {
    method: "POST",
    headers: { "content-type": "application/json" },
    body: JSON.stringify({ document: draft.design }),
  });
  if (!response.ok) throw new Error(`Your work could not be saved (${response.status}).`);
  const saved: { id: string } = await response.json();
  forgetVisitorDraft();
  return { designId: saved.id };
}
