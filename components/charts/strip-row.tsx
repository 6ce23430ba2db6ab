import type { ReactNode } from "react";
import type { StripDefinition } from "@/lib/charts/strips";
import { unitLine } from "@/lib/charts/strips";
import type { UnitPreferences } from "@/lib/units/preferences";
import styles from "./strips.module.css";

/** One strip of the recorder: its name and unit, its plot, its values at the cursor. */
export function StripRow({
  definition,
  preferences,
  summary,
  values,
  children,
}: {
  definition: StripDefinition;
  preferences: UnitPreferences;
  summary?: string;
  values?: ReactNode;
  children: ReactNode;
}) {
  return (
    <li className={styles.strip} data-strip={definition.id}>
      <div className={styles.name}>
        <p className={styles.title}>{definition.name}</p>
        <p className={styles.unitLine}>{unitLine(definition, preferences)}</p>
      </div>
      <div className={styles.plot} aria-hidden="true">
        {children}
      </div>
      <div className={styles.values} aria-hidden="true">
        {values}
      </div>
      {summary ? <p className="sr-only">{summary}</p> : null}
    </li>
  );
}
