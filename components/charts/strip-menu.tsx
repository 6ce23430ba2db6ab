"use client";

import { useEffect, useRef } from "react";
import type { StripId } from "@/lib/charts/strips";
import { movedStrip, STRIP_IDS, stripDefinition, toggledStrip } from "@/lib/charts/strips";
import styles from "./strip-menu.module.css";

/** Which strips stand and in what order. */
export function StripMenu({
  strips,
  onChange,
}: {
  strips: readonly StripId[];
  onChange: (strips: StripId[]) => void;
}) {
  const details = useRef<HTMLDetailsElement>(null);
  useEffect(() => {
    const node = details.current;
    if (!node) return;
    const outside = (event: PointerEvent) => {
      if (event.target instanceof Node && !node.contains(event.target)) node.open = false;
    };
    document.addEventListener("pointerdown", outside);
    return () => document.removeEventListener("pointerdown", outside);
  }, []);
  const others = STRIP_IDS.filter((id) => !strips.includes(id));
  return (
    <details
      ref={details}
      className={styles.menu}
      onKeyDown={(event) => {
        if (event.key !== "Escape" || !details.current?.open) return;
        details.current.open = false;
        details.current.querySelector("summary")?.focus();
      }}
    >
      <summary className={styles.opener}>Strips</summary>
      <ul className={styles.panel} aria-label="Strips and their order">
        {[...strips, ...others].map((id) => {
          const { name } = stripDefinition(id);
          const at = strips.indexOf(id);
          return (
            <li key={id} className={styles.item}>
              <label>
                <input
                  type="checkbox"
                  checked={at >= 0}
                  disabled={strips.length === 1 && at === 0}
                  onChange={() => onChange(toggledStrip(strips, id))}
                />
                {name}
              </label>
              {at >= 0 ? (
                <>
                  <MoveButton
                    name={`Move ${name.toLowerCase()} up`}
                    path="M3 8L7 4L11 8"
                    disabled={at === 0}
                    onPress={() => onChange(movedStrip(strips, id, -1))}
                  />
                  <MoveButton
                    name={`Move ${name.toLowerCase()} down`}
                    path="M3 6L7 10L11 6"
                    disabled={at === strips.length - 1}
                    onPress={() => onChange(movedStrip(strips, id, 1))}
                  />
                </>
              ) : null}
            </li>
          );
        })}
      </ul>
    </details>
  );
}

function MoveButton({
  name,
  path,
  disabled,
  onPress,
}: {
  name: string;
  path: string;
  disabled: boolean;
  onPress: () => void;
}) {
  // Stays focusable at the end of the list, so that a person moving a strip does not lose it.
  return (
    <button
      type="button"
      aria-label={name}
      title={name}
      aria-disabled={disabled}
      onClick={() => (disabled ? undefined : onPress())}
    >
      <svg viewBox="0 0 14 14" width="14" height="14" aria-hidden="true">
        <path d={path} fill="none" stroke="currentColor" strokeWidth="1.6" />
      </svg>
    </button>
  );
}
