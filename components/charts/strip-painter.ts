/**
 * Writes what must keep up with a hand straight into the page: live paths, the cursor, the dots on
 * the curves and the figures at the right end. React renders the places once and is not asked
 * again until something settles.
 */
import type { Curves } from "@/lib/acoustics/answer";
import { valueAt } from "@/lib/charts/cursor";
import { limitAt } from "@/lib/charts/figures";
import type { CurveTracer } from "@/lib/charts/path";
import { curveTracer } from "@/lib/charts/path";
import { hertz, limitWords, reading, readingWithUnit } from "@/lib/charts/readings";
import type { Scale } from "@/lib/charts/scale";
import type { StripPlot } from "@/lib/charts/strip-plot";

/** Everything the painter needs to know of what React has rendered. */
export interface PaintedSheet {
  curves: Curves;
  ventNames: readonly string[];
  tuning_hz: number | null;
  /** Frequency axis in pixels of the plot. */
  x: Scale;
  plots: readonly StripPlot[];
}

/** Room that the figure at the tuning's line needs [px]. */
const TUNING_LABEL = 62;

interface StripNodes {
  plot: StripPlot;
  paths: Element[];
  dots: Element[];
  values: Map<string, Element>;
  words: Element | null;
}

export class StripPainter {
  private root: HTMLElement | null = null;
  private sheet: PaintedSheet | null = null;
  private strips: StripNodes[] = [];
  private tracer: { of: readonly number[]; x: Scale; tracer: CurveTracer } | null = null;
  private liveCurves: Curves | null = null;
  private liveTuning: number | null = null;
  private cursor_hz = 0;

  /** Takes what React has just rendered; called after every render that changed it. */
  adopt(root: HTMLElement, sheet: PaintedSheet): void {
    if (this.sheet && this.sheet.curves !== sheet.curves) this.dropLive();
    this.root = root;
    this.sheet = sheet;
    this.strips = sheet.plots.flatMap((plot) => {
      const row = root.querySelector(`[data-strip="${plot.id}"]`);
      if (!row) return [];
      const values = new Map<string, Element>();
      for (const node of row.querySelectorAll("[data-value]"))
        values.set(node.getAttribute("data-value") ?? "", node);
      return [
        {
          plot,
          paths: [...row.querySelectorAll("[data-live-path]")],
          dots: [...row.querySelectorAll("[data-dot]")],
          values,
          words: row.querySelector("[data-words]"),
        },
      ];
    });
    root.toggleAttribute("data-live", this.liveCurves !== null);
    if (this.liveCurves) this.paintLive(this.liveCurves);
    this.paintCursor();
  }

  /** Writes the curves of a design in motion. */
  live(curves: Curves, tuning_hz: number | null): void {
    this.liveCurves = curves;
    this.liveTuning = tuning_hz;
    if (!this.root) return;
    this.root.toggleAttribute("data-live", true);
    this.paintLive(curves);
    this.paintTuning();
    this.paintReadings();
  }

  /** Back to the settled curves. */
  settle(): void {
    this.dropLive();
    this.root?.toggleAttribute("data-live", false);
    this.paintTuning();
    this.paintReadings();
  }

  moveCursor(cursor_hz: number): void {
    this.cursor_hz = cursor_hz;
    this.paintCursor();
  }

  private dropLive(): void {
    this.liveCurves = null;
    this.liveTuning = null;
  }

  private tracerFor(frequency_hz: readonly number[], x: Scale): CurveTracer {
    if (this.tracer?.of.length !== frequency_hz.length || this.tracer.x !== x)
      this.tracer = { of: frequency_hz, x, tracer: curveTracer(frequency_hz, x) };
    return this.tracer.tracer;
  }

  private paintLive(curves: Curves): void {
    if (!this.sheet) return;
    const tracer = this.tracerFor(curves.frequency_hz, this.sheet.x);
    for (const { plot, paths } of this.strips) {
      const series = plot.definition.series(curves, this.sheet.ventNames);
      paths.forEach((path, n) =>
        path.setAttribute("d", tracer.trace(series[n]?.values ?? [], plot.map)),
      );
    }
  }

  private paintTuning(): void {
    const line = this.root?.querySelector<HTMLElement>("[data-tuning]");
    if (!line || !this.sheet) return;
    const tuning_hz = this.liveCurves ? this.liveTuning : this.sheet.tuning_hz;
    const { domain, toPixel } = this.sheet.x;
    const inside = tuning_hz !== null && tuning_hz >= domain[0] && tuning_hz <= domain[1];
    line.hidden = !inside;
    if (!inside) return;
    line.style.transform = `translateX(${toPixel(tuning_hz).toFixed(2)}px)`;
    const toCursor = this.sheet.x.toPixel(this.cursor_hz) - toPixel(tuning_hz);
    line.toggleAttribute("data-left", toCursor > 1 && toCursor < TUNING_LABEL);
    const figure = line.querySelector("[data-tuning-figure]");
    if (figure) figure.textContent = hertz(tuning_hz);
  }

  private paintCursor(): void {
    if (!this.root || !this.sheet) return;
    const at = this.sheet.x.toPixel(this.cursor_hz);
    const line = this.root.querySelector<HTMLElement>("[data-cursor]");
    if (line) line.style.transform = `translateX(${at.toFixed(2)}px)`;
    const flag = this.root.querySelector<HTMLElement>("[data-cursor-flag]");
    if (flag) {
      flag.textContent = hertz(this.cursor_hz);
      const half = 26;
      const shift = Math.min(Math.max(at, half), this.sheet.x.range[1] - half);
      flag.style.transform = `translateX(${shift.toFixed(2)}px) translateX(-50%)`;
    }
    this.paintTuning();
    this.paintReadings();
  }

  private paintReadings(): void {
    if (!this.root || !this.sheet) return;
    const { sheet, cursor_hz } = this;
    const curves = this.liveCurves ?? sheet.curves;
    const x = sheet.x.toPixel(cursor_hz).toFixed(2);
    const spoken = [hertz(cursor_hz)];
    for (const { plot, dots, values, words } of this.strips) {
      const series = plot.definition.series(curves, sheet.ventNames);
      series.forEach((one, n) => {
        const value = valueAt(curves.frequency_hz, one.values, cursor_hz);
        write(values.get(`present-${n}`), reading(value, plot.unit));
        placeDot(dots[n], x, value, plot);
        const name = one.label ? `${plot.definition.name}, ${one.label}` : plot.definition.name;
        spoken.push(`${name} ${readingWithUnit(value, plot.unit)}`);
      });
      if (words) write(words, limitWords(limitAt(curves, cursor_hz)));
      this.paintOthers(plot, values);
    }
    this.root.querySelector("[role=slider]")?.setAttribute("aria-valuetext", spoken.join("; "));
    this.root
      .querySelector("[role=slider]")
      ?.setAttribute("aria-valuenow", String(Number(cursor_hz.toPrecision(4))));
  }

  /** Before and saved: while a hand drags, the settled curves are what was before. */
  private paintOthers(plot: StripPlot, values: Map<string, Element>): void {
    if (!this.sheet) return;
    const { frequency_hz } = this.sheet.curves;
    const wanted = this.liveCurves ? "present" : "before";
    const before = plot.lines.filter((line) => line.kind === wanted);
    for (const [key, node] of values) {
      if (key.startsWith("present")) continue;
      const line = key.startsWith("before")
        ? before[Number(key.slice(7))]
        : plot.lines.find((candidate) => candidate.key === key);
      const value = line ? valueAt(frequency_hz, line.values, this.cursor_hz) : null;
      write(node, line ? reading(value, plot.unit) : "");
    }
  }
}

function write(node: Element | undefined, text: string): void {
  if (node && node.textContent !== text) node.textContent = text;
}

function placeDot(dot: Element | undefined, x: string, value: number | null, plot: StripPlot) {
  if (!dot) return;
  const y = value === null ? NaN : plot.map.offset + plot.map.gain * value;
  const inside = y >= plot.map.top - 0.5 && y <= plot.map.bottom + 0.5;
  dot.setAttribute("visibility", inside ? "visible" : "hidden");
  if (!inside) return;
  dot.setAttribute("cx", x);
  dot.setAttribute("cy", y.toFixed(2));
}
