"use client";

import { terms } from "@/lib/terms/terms";
import { Hint } from "@/components/ui/hint";

/** Explains a term of the trade where it stands. */
export function TermHint({ term, label }: { term: string; label: string }) {
  const found = terms[term];
  return found ? <Hint label={`What is ${label}?`}>{found.text}</Hint> : null;
}
