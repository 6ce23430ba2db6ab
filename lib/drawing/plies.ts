/** Plies and glue lines of sheet goods as path data: one path for all the stripes of a part. */
import { sheetNumber, type SheetTransform, type Side } from "./outline";
import type { Sheet } from "./section-parts";

/** Usual thickness of one ply in sheet goods for cabinets [mm]. */
const PLY_MM = 1.4;
/** Stripes finer than this are not told apart on the sheet. */
const FINEST_STRIPE = 1.15;

/**
 * How many plies a sheet is drawn with: the odd number nearest to one ply per 1.4 mm, fewer where
 * the sheet is drawn so small that stripes would run together; 1 = no stripes.
 */
export function plyCount(thickness_mm: number, scale: number): number {
  const most = Math.floor((thickness_mm * scale) / FINEST_STRIPE);
  const true_ = Math.max(3, Math.round(thickness_mm / PLY_MM));
  const count = Math.min(true_, most);
  return count < 3 ? 1 : count - ((count + 1) % 2);
}

/** Path of the dark plies of all sheets of a part. */
export function plyPath(sheets: Sheet[], transform: SheetTransform, side: Side): string {
  let path = "";
  for (const sheet of sheets) {
    const thickness = sheet.along ? sheet.to(sheet.x0) - sheet.from(sheet.x0) : sheet.x1 - sheet.x0;
    const count = plyCount(thickness, transform.scale);
    for (let i = 1; i < count - 1; i += 2) {
      const a = i / count;
      const b = (i + 1) / count;
      path += sheet.along
        ? alongStripe(sheet, a, b, transform, side)
        : acrossStripe(sheet, sheet.x0 + thickness * a, sheet.x0 + thickness * b, transform, side);
    }
  }
  return path;
}

/** Path of sheets filled whole: the glue lines between them. */
export function fillPath(sheets: Sheet[], transform: SheetTransform, side: Side): string {
  return sheets
    .map((sheet) =>
      sheet.along
        ? alongStripe(sheet, 0, 1, transform, side)
        : acrossStripe(sheet, sheet.x0, sheet.x1, transform, side),
    )
    .join("");
}

function acrossStripe(
  sheet: Sheet,
  x0: number,
  x1: number,
  transform: SheetTransform,
  side: Side,
): string {
  const left = sheetNumber(transform.x(x0));
  const right = sheetNumber(transform.x(x1));
  const half = (sign: number) => {
    const y = (value: number) => sheetNumber(transform.axis + sign * value * transform.scale);
    return `M${left} ${y(sheet.from(x0))}V${y(sheet.to(x0))}L${right} ${y(sheet.to(x1))}V${y(sheet.from(x1))}Z`;
  };
  return (side !== "below" ? half(-1) : "") + (side !== "above" ? half(1) : "");
}

function alongStripe(
  sheet: Sheet,
  a: number,
  b: number,
  transform: SheetTransform,
  side: Side,
): string {
  const left = sheetNumber(transform.x(sheet.x0));
  const right = sheetNumber(transform.x(sheet.x1));
  const from = sheet.from(sheet.x0);
  const thick = sheet.to(sheet.x0) - from;
  const half = (sign: number) => {
    const y = (part: number) =>
      sheetNumber(transform.axis + sign * (from + part * thick) * transform.scale);
    return `M${left} ${y(a)}H${right}V${y(b)}H${left}Z`;
  };
  return (side !== "below" ? half(-1) : "") + (side !== "above" ? half(1) : "");
}
