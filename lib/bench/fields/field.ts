/**
 * The numbers of a design as the Bench shows them: what each is called, what kind of quantity it
 * is, the range the design document allows, and how it is read and written. A field that does not
 * apply to a design (a ring's thickness where there is no ring) reads null.
 */
import type { Design } from "@/lib/document/schema";
import type { QuantityKind } from "@/lib/units/preferences";

export interface Field {
  id: string;
  label: string;
  kind: QuantityKind;
  min: number;
  max: number;
  /** What one press of an arrow key changes, in SI. */
  step: number;
  /** Key into lib/terms. */
  term?: string;
  /** Null: the number is not set; undefined: the field does not apply. */
  read: (design: Design) => number | null | undefined;
  write: (design: Design, value: number | null) => Design;
  /** May be left empty, and what that means. */
  empty?: string;
}
