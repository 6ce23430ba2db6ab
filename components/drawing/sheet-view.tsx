import { memo } from "react";
import type { PlacedLabel } from "@/lib/drawing/place-labels";
import { sheetNumber } from "@/lib/drawing/outline";
import type { DrawnPart, Sheet } from "@/lib/drawing/sheet";
import { AirView } from "./air-view";
import { PartView } from "./section-parts-view";
import styles from "./section.module.css";

interface SheetViewProps {
  sheet: Sheet;
  /** Unique on the page: gradients are named after it. */
  id: string;
  nameOf: (part: string) => string;
  pressed: string | null;
  onPick: ((part: DrawnPart) => void) | undefined;
  onPoint: (name: string | null) => void;
}

/** Everything on the sheet but its handles. */
export const SheetView = memo(function SheetView(props: SheetViewProps) {
  const { sheet, id, nameOf, pressed, onPick, onPoint } = props;
  const { bore, centre, dimensions } = sheet;
  const axis = sheetNumber(sheet.frame.transform.axis);
  const [x, y0, y1] = [sheetNumber(bore.x), sheetNumber(bore.y0), sheetNumber(bore.y1)];
  const tall = bore.y1 - bore.y0 > 24;
  return (
    <>
      <AirView sheet={sheet} id={id} />
      {sheet.parts.map((part) => (
        <PartView
          key={part.id}
          part={part}
          name={nameOf(part.id)}
          pressed={pressed === part.id}
          onPick={onPick}
          onPoint={onPoint}
        />
      ))}
      <g aria-hidden="true" pointerEvents="none">
        <path
          className={styles.centre}
          d={`M${sheetNumber(centre.x0)} ${axis}H${sheetNumber(centre.x1)}`}
        />
        <path
          className={styles.thin}
          d={`${sheet.breaks}${sheet.leaders}${dimensions.lines}${tall ? `M${x} ${y0}V${y1}` : ""}`}
        />
        <path
          className={styles.arrow}
          d={`${dimensions.arrows}${tall ? `M${x} ${y0}l-2 7h4zM${x} ${y1}l-2 -7h4z` : ""}${datumMark(sheet)}`}
        />
        {[...dimensions.labels, ...sheet.annotations].map((label) => (
          <text
            key={label.id}
            x={sheetNumber(label.x)}
            y={sheetNumber(label.y)}
            className={labelStyle(label, dimensions.warn)}
          >
            {label.text}
          </text>
        ))}
        <DatumLetter sheet={sheet} />
      </g>
    </>
  );
});

function labelStyle({ id }: PlacedLabel, warn: boolean): string | undefined {
  if (id === "clearance" && warn) return styles.labelOver;
  if (id === "stroke") return styles.labelAir;
  return id.startsWith("piece-") || id === "overall" || id === "clearance" || id === "bore"
    ? styles.label
    : styles.labelQuiet;
}

/** Where the datum letter stands: left of the outer face, below the section. */
function datumPlace({ frame }: Sheet) {
  return { x: frame.transform.x(0), y: frame.bottom - 14 };
}

/** The filled triangle of a datum, its base on the panel's outer face. */
function datumMark(sheet: Sheet): string {
  const { x, y } = datumPlace(sheet);
  return `M${sheetNumber(x)} ${sheetNumber(y - 5)}v10l-7 -5z`;
}

function DatumLetter({ sheet }: { sheet: Sheet }) {
  const { x, y } = datumPlace(sheet);
  return (
    <>
      <path
        className={styles.thin}
        d={`M${sheetNumber(x - 7)} ${sheetNumber(y)}h-8m0 -8h-15v16h15z`}
      />
      <text x={sheetNumber(x - 22.5)} y={sheetNumber(y + 4)} className={styles.label}>
        A
      </text>
    </>
  );
}
