"use client";

import dynamic from "next/dynamic";
import { useState } from "react";

const StartDialog = dynamic(() => import("./start-dialog").then((part) => part.StartDialog), {
  ssr: false,
});

/** The way in for newcomers: three questions, a design to begin with. */
export function StartButton() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <button type="button" className="button-quiet" onClick={() => setOpen(true)}>
        Start in three questions
      </button>
      {open && <StartDialog onClose={() => setOpen(false)} />}
    </>
  );
}
