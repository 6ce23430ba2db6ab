"use client";

import dynamic from "next/dynamic";
import { useSyncExternalStore } from "react";

export interface Toast {
  message: string;
  /** The way back, as long as the toast stands. */
  undo?: () => void;
  /** Something went wrong: it stays longer. */
  fault?: boolean;
}

/** How long a toast stands: time enough to read it and to take a step back [ms]. */
const STANDS = 8_000;
const FAULT_STANDS = 15_000;

const Toaster = dynamic(() => import("./toaster"), { ssr: false });

let wanted = false;
const listeners = new Set<() => void>();

/** Says what was done, with the way back. The code for it is fetched with the first one. */
export function showToast({ message, undo, fault = false }: Toast): void {
  wanted = true;
  listeners.forEach((listener) => listener());
  void import("sonner").then(({ toast }) => {
    const show = fault ? toast.error : toast;
    show(message, {
      duration: fault ? FAULT_STANDS : STANDS,
      action: undo ? { label: "Undo", onClick: undo } : undefined,
    });
  });
}

function subscribe(listener: () => void) {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** Where toasts stand; nothing until the first. */
export function Toasts() {
  const needed = useSyncExternalStore(
    subscribe,
    () => wanted,
    () => false,
  );
  return needed ? <Toaster /> : null;
}
