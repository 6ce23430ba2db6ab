import type { ButtonHTMLAttributes } from "react";

export interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  /** What it does to the page: the one thing to do, one of several, something taken away. */
  tone?: "primary" | "quiet" | "danger";
  /** Work is under way: the button stays where it is, says so, and cannot be pressed again. */
  busy?: boolean;
}

export function Button({
  tone = "quiet",
  busy = false,
  className = "",
  disabled,
  children,
  ...rest
}: ButtonProps) {
  return (
    <button
      type="button"
      className={`button-${tone} ${className}`}
      disabled={disabled || busy}
      aria-busy={busy || undefined}
      {...rest}
    >
      {children}
    </button>
  );
}
