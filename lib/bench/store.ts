/**
 * The state of one Bench: the design in hand, what the library answers to it, and the way back.
 *
 * A hand that drags changes the design many times a second; only its end becomes a step of undo.
 * The answer is computed once per change, here, so that drawing, figures, curves and margins can
 * never disagree.
 */
import { createStore } from "zustand/vanilla";
import { evaluate } from "@/lib/acoustics/evaluate";
import type { Answer } from "@/lib/acoustics/answer";
import { InputError } from "@/lib/acoustics/input-error";
import type { Design } from "@/lib/document/schema";

export type EditPhase = "drag" | "commit";

/** What is marked on the drawing and in the numbers: a piece of the airway, or one of its ends. */
export interface Selection {
  piece: number | null;
  kind: string;
}

export interface Reading {
  design: Design;
  /** Null while the design cannot be (see problem). */
  answer: Answer | null;
  problem: { code: string; path: string; message: string; allowed: string | null } | null;
}

export interface BenchState extends Reading {
  /** The reading before the last finished edit: drawn dotted in the curves. */
  before: Reading | null;
  past: Design[];
  future: Design[];
  /** Where the present drag began; null while no hand drags. */
  dragOrigin: Reading | null;
  ventIndex: number;
  selection: Selection | null;
  change: (design: Design, phase: EditPhase) => void;
  undo: () => void;
  redo: () => void;
  /** Takes another design in hand; the way back is kept where it is the same work. */
  load: (design: Design, options?: { keepHistory?: boolean }) => void;
  select: (selection: Selection | null) => void;
  showVent: (index: number) => void;
}

/** Steps that can be taken back. */
const HISTORY = 200;

/** Evaluates a design; what cannot be is told, not thrown. */
export function read(design: Design): Reading {
  try {
    return { design, answer: evaluate(design), problem: null };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    const { code, path, message, allowed } = error;
    return { design, answer: null, problem: { code, path, message, allowed } };
  }
}

export type BenchStore = ReturnType<typeof createBenchStore>;

export function createBenchStore(initial: Design) {
  return createStore<BenchState>()((set, get) => {
    const now = (): Reading => {
      const { design, answer, problem } = get();
      return { design, answer, problem };
    };
    const step = (from: "past" | "future") => () => {
      const state = get();
      if (state.dragOrigin) return;
      const stack = state[from];
      const design = stack.at(-1);
      if (!design) return;
      const to = from === "past" ? "future" : "past";
      set({
        ...read(design),
        before: now(),
        [from]: stack.slice(0, -1),
        [to]: [...state[to], state.design],
        ventIndex: Math.min(state.ventIndex, Math.max(0, design.vents.length - 1)),
      });
    };
    return {
      ...read(initial),
      before: null,
      past: [],
      future: [],
      dragOrigin: null,
      ventIndex: 0,
      selection: null,
      change: (design, phase) => {
        const state = get();
        const origin = state.dragOrigin ?? now();
        if (phase === "drag") {
          if (design !== state.design) set({ ...read(design), dragOrigin: origin });
          return;
        }
        const same =
          design === origin.design || JSON.stringify(design) === JSON.stringify(origin.design);
        if (same) {
          set({ ...origin, dragOrigin: null });
          return;
        }
        set({
          ...(design === state.design ? now() : read(design)),
          dragOrigin: null,
          before: origin,
          past: [...state.past, origin.design].slice(-HISTORY),
          future: [],
          ventIndex: Math.min(state.ventIndex, Math.max(0, design.vents.length - 1)),
        });
      },
      undo: step("past"),
      redo: step("future"),
      load: (design, options) => {
        const state = get();
        set({
          ...read(design),
          before: options?.keepHistory ? now() : null,
          past: options?.keepHistory ? [...state.past, state.design].slice(-HISTORY) : [],
          future: [],
          dragOrigin: null,
          ventIndex: 0,
          selection: null,
        });
      },
      select: (selection) => set({ selection }),
      showVent: (ventIndex) => set({ ventIndex, selection: null }),
    };
  });
}
