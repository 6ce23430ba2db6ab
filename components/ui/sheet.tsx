"use client";

import type { ReactNode } from "react";
import { Dialog } from "./dialog";

interface SheetProps {
  title: string;
  onClose: () => void;
  children: ReactNode;
}

/** A dialog at the right edge, or at the foot of a phone: the page it speaks of stays in view. */
export function Sheet(props: SheetProps) {
  return <Dialog aside {...props} />;
}
