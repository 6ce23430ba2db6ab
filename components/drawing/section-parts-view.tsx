import { memo } from "react";
import type { DrawnPart } from "@/lib/drawing/sheet";
import styles from "./section.module.css";

interface PartViewProps {
  part: DrawnPart;
  name: string;
  pressed: boolean;
  onPick: ((part: DrawnPart) => void) | undefined;
  onPoint: (name: string | null) => void;
}

/** One cut part: its faces, its plies in one path, its glue lines in another. */
export const PartView = memo(function PartView({
  part,
  name,
  pressed,
  onPick,
  onPoint,
}: PartViewProps) {
  const pick = onPick ? () => onPick(part) : undefined;
  return (
    <g
      className={styles.part}
      role="button"
      tabIndex={0}
      aria-label={name}
      aria-pressed={pressed}
      data-part={part.id}
      onClick={pick}
      onKeyDown={(event) => {
        if (!pick || (event.key !== "Enter" && event.key !== " ")) return;
        event.preventDefault();
        pick();
      }}
      onPointerEnter={() => onPoint(name)}
      onPointerLeave={() => onPoint(null)}
      onFocus={() => onPoint(name)}
      onBlur={() => onPoint(null)}
    >
      {part.wooden ? (
        <>
          <path d={part.outline} className={styles.plyLight} />
          {part.plies !== "" && <path d={part.plies} className={styles.plyDark} />}
          {part.glue !== "" && <path d={part.glue} className={styles.glue} />}
          <path d={part.outline} className={styles.cut} />
        </>
      ) : (
        <path d={part.outline} className={`${styles.tube} ${styles.cutPlastic}`} />
      )}
      <path d={part.outline} className={styles.mark} />
    </g>
  );
});
