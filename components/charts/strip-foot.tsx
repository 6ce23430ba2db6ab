"use client";

import { BEFORE, presentMark, savedMark } from "@/lib/charts/marks";
import type { Domain } from "@/lib/charts/scale";
import type { SheetInput } from "@/lib/charts/strip-plot";
import type { StripId } from "@/lib/charts/strips";
import { StripFigures } from "./strip-figures";
import { StripMenu } from "./strip-menu";
import { Key } from "./strip-values";
import styles from "./strip-foot.module.css";

/** Level above which the hearing caution stands under the strips [dB]. */
const LOUD = 85;

/** Under the strips: what stands, what the lines mean, the table twin, the caution. */
export function StripFoot({
  input,
  strips,
  range_hz,
  onStripsChange,
  caution,
}: {
  input: SheetInput;
  strips: readonly StripId[];
  range_hz: Domain;
  onStripsChange?: (strips: StripId[]) => void;
  caution?: string;
}) {
  const { curves, saved } = input;
  const loud = [curves.spl_db, curves.max_spl_db].some((levels) =>
    levels.some((level) => level !== null && level > LOUD),
  );
  const key = input.previous || saved.length > 0;
  return (
    <>
      <div className={styles.foot}>
        {onStripsChange ? <StripMenu strips={strips} onChange={onStripsChange} /> : null}
        <StripFigures
          curves={curves}
          strips={strips}
          preferences={input.preferences}
          ventNames={input.ventNames}
          range_hz={range_hz}
        />
        {key ? (
          <p className={styles.legend}>
            <LegendEntry dash={presentMark(0).dash} colour={presentMark(0).colour} name="now" />
            {input.previous ? (
              <LegendEntry dash={BEFORE.dash} colour={BEFORE.colour} name="before the last edit" />
            ) : null}
            {saved.map((tuning, n) => (
              <LegendEntry
                key={tuning.name}
                dash={savedMark(n).dash}
                colour={savedMark(n).colour}
                name={tuning.name}
              />
            ))}
          </p>
        ) : null}
      </div>
      {loud && caution ? <p className={styles.caution}>{caution}</p> : null}
    </>
  );
}

function LegendEntry(entry: { dash: string | undefined; colour: string; name: string }) {
  return (
    <span>
      <Key dash={entry.dash} colour={entry.colour} />
      {entry.name}
    </span>
  );
}
