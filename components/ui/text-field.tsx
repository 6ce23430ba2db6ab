import type { InputHTMLAttributes, ReactNode } from "react";

interface TextFieldProps extends InputHTMLAttributes<HTMLInputElement> {
  id: string;
  label: string;
  /** What to know before typing. */
  note?: ReactNode;
  fault?: string | null;
}

/** A line of text in a form: label over it, note and fault under it. */
export function TextField({ id, label, note, fault, ...input }: TextFieldProps) {
  const about = [note && `${id}-note`, fault && `${id}-fault`].filter(Boolean).join(" ");
  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      <input
        id={id}
        className="text-input"
        aria-invalid={fault ? true : undefined}
        aria-describedby={about || undefined}
        {...input}
      />
      {note && (
        <p id={`${id}-note`} className="text-sm text-ink-2">
          {note}
        </p>
      )}
      {fault && (
        <p id={`${id}-fault`} role="alert" className="text-sm font-semibold text-over">
          {fault}
        </p>
      )}
    </div>
  );
}
