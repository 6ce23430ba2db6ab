import { textWidth } from "@/lib/drawing/text-width";
import type { HandlePlace } from "@/lib/drawing/handle-places";
import type { HandleBindings } from "./use-handles";
import { sheetNumber } from "@/lib/drawing/outline";
import styles from "./section.module.css";

/** A grip on the drawing: a slider to the hand, the keyboard and the screen reader alike. */
export function HandleView({ place, bindings }: { place: HandlePlace; bindings: HandleBindings }) {
  const { handle, at } = place;
  const x = sheetNumber(place.x);
  const y = sheetNumber(place.y);
  const said = handle.say(handle.value);
  const width = textWidth(said) + 14;
  const aside = Math.abs(place.y - at.y) > 1;
  return (
    <g
      className={styles.handle}
      role="slider"
      tabIndex={0}
      aria-label={handle.name}
      aria-orientation="horizontal"
      aria-valuemin={handle.min}
      aria-valuemax={handle.max}
      aria-valuenow={handle.value}
      aria-valuetext={said}
      data-handle={handle.id}
      data-held={bindings.held === handle.id}
      style={{ cursor: handle.cursor }}
      {...bindings.of(handle)}
    >
      {aside && (
        <path className={styles.thin} d={`M${sheetNumber(at.x)} ${sheetNumber(at.y)}L${x} ${y}`} />
      )}
      <circle className={styles.hit} cx={x} cy={y} r={13} />
      <circle className={styles.grip} cx={x} cy={y} r={6} />
      <path
        className={styles.notch}
        d={
          handle.perOutwards === 0
            ? `M${x - 1.6} ${y - 2.5}v5m3.2 -5v5`
            : `M${x - 2} ${y}h4m-2 -2v4`
        }
      />
      <g className={styles.tag}>
        <rect
          className={styles.tagBox}
          x={sheetNumber(place.x - width / 2)}
          y={y - 34}
          width={sheetNumber(width)}
          height={21}
          rx={2}
        />
        <text className={styles.tagText} x={x} y={y - 19.5}>
          {said}
        </text>
      </g>
    </g>
  );
}
