"use client";

import { Toaster as Sonner } from "sonner";

/** The toasts' frame, in the sheet's own lines. */
export default function Toaster() {
  return (
    <Sonner
      position="bottom-center"
      gap={8}
      toastOptions={{
        unstyled: true,
        classNames: {
          toast: "toast",
          error: "toast-fault",
          actionButton: "toast-action",
          icon: "hidden",
        },
      }}
    />
  );
}
