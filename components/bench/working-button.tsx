"use client";

import { useState } from "react";
import dynamic from "next/dynamic";

const WorkingSheet = dynamic(() => import("./working-sheet").then((part) => part.WorkingSheet), {
  ssr: false,
});

/** Opens the working behind a figure: the formula, the values put in, the source. */
export function WorkingButton({ figure, label }: { figure: string; label: string }) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <button
        type="button"
        className="link-quiet key-working"
        aria-label={`Working of ${label}`}
        onClick={() => setOpen(true)}
      >
        working
      </button>
      {open && <WorkingSheet figure={figure} onClose={() => setOpen(false)} />}
    </>
  );
}
