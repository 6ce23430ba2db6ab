"use client";

import Link from "next/link";
import { useState } from "react";

interface DesignNameProps {
  id: string;
  name: string;
  editing: boolean;
  onDone: (name: string | null) => void;
}

/** The name opens the design; while it is being renamed it is a field in the same place. */
export function DesignName({ id, name, editing, onDone }: DesignNameProps) {
  return editing ? (
    <NameInput name={name} onDone={onDone} />
  ) : (
    <Link href={`/bench/${id}`} className="design-link">
      {name}
    </Link>
  );
}

function NameInput({ name, onDone }: Pick<DesignNameProps, "name" | "onDone">) {
  const [text, setText] = useState(name);
  const [left, setLeft] = useState(false);
  const done = (next: string | null) => {
    if (left) return;
    setLeft(true);
    const trimmed = next?.trim();
    onDone(trimmed && trimmed !== name ? trimmed : null);
  };
  return (
    <input
      aria-label={`New name for ${name}`}
      className="text-input font-semibold"
      autoFocus
      maxLength={200}
      value={text}
      onFocus={(event) => event.currentTarget.select()}
      onChange={(event) => setText(event.target.value)}
      onBlur={() => done(text)}
      onKeyDown={(event) => {
        if (event.key === "Enter") done(text);
        if (event.key === "Escape") done(null);
      }}
    />
  );
}
