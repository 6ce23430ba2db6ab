/** What a check says of a design, and what would cure it. Plain data, ready to be shown. */
import type { Answer } from "@/lib/acoustics/answer";
import type { Design } from "@/lib/document/schema";
import type { QuantityKind, UnitPreferences } from "@/lib/units/preferences";
import { formatQuantity } from "@/lib/units/format";

export type Status = "within" | "near" | "over" | "unknown";

export interface Margin {
  id: string;
  title: string;
  status: Status;
  /** The figure as it stands, in the person's units. */
  value: string;
  /** What it is held against. */
  limit: string;
  /** What is left, or by how much it is over, signed. */
  left: string;
  reason: string;
  caution?: string;
}

export interface Cure {
  id: string;
  /** What to do: "Add one 17.7 mm ring". */
  text: string;
  /** What it brings, in numbers. */
  effect: string;
  /** Cheapest first: trimming and rings before new parts, new parts before a new box. */
  cost: number;
  apply: (design: Design) => Design;
}

export interface MarginContext {
  preferences: UnitPreferences;
}

export interface Subject extends MarginContext {
  design: Design;
  answer: Answer;
}

/** One check: a margin, several (one per vent), or none where it does not apply. */
export type Check = (subject: Subject) => Margin[];

/** A quantity in the person's units, with its unit. */
export function told(
  subject: MarginContext,
  value: number,
  kind: QuantityKind,
  options?: { digits?: number; signed?: boolean },
): string {
  return formatQuantity(value, kind, subject.preferences, options).text;
}

/**
 * Where a figure stands to its limit.
 *
 * @param left - what is left, negative where it is over
 * @param near - how little left counts as near
 */
export function statusOf(left: number, near: number): Status {
  if (left < 0) return "over";
  return left < near ? "near" : "within";
}

/** A vent's name where there are several, to stand behind a title. */
export function ofVent(design: Design, index: number): string {
  return design.vents.length > 1 ? `, ${design.vents[index]?.name ?? `vent ${index + 1}`}` : "";
}
