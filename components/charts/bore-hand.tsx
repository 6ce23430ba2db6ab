"use client";

import { useRef } from "react";
import type { KeyboardEvent, PointerEvent } from "react";
import type { MapLines, Probe } from "@/lib/charts/bore-map";
import { probeAtPixel, stepAlong, stepCount } from "@/lib/charts/bore-map";
import type { BorePlot } from "@/lib/charts/bore-plot";
import type { Scale } from "@/lib/charts/scale";
import styles from "./bore-map.module.css";

/** Movement up to which a touch counts as a tap [px]. */
const TAP = 8;

/** The probe's handle: moves along the curves with pointer and arrow keys, picks with a press. */
export function BoreHand({
  plot,
  series,
  x,
  boreFactor,
  probe,
  onProbe,
  onPick,
  valueText,
}: {
  plot: BorePlot;
  series: MapLines;
  x: Scale;
  boreFactor: number;
  probe: Probe;
  onProbe: (probe: Probe | null) => void;
  onPick?: (probe: Probe) => void;
  valueText: string;
}) {
  const pressed = useRef<{ x: number; y: number } | null>(null);
  const probeUnder = (event: PointerEvent<HTMLDivElement>) => {
    const { left, top } = event.currentTarget.getBoundingClientRect();
    const toX = (diameter_m: number) => x.toPixel(diameter_m * boreFactor);
    const toY = (value: number) => plot.map.offset + plot.map.gain * value;
    const at = { x: event.clientX - left, y: event.clientY - top };
    return probeAtPixel(series, plot.quantity, toX, toY, at.x, at.y);
  };
  const up = (event: PointerEvent<HTMLDivElement>) => {
    const from = pressed.current;
    pressed.current = null;
    const under = probeUnder(event);
    if (!from || !under) return;
    if (Math.hypot(event.clientX - from.x, event.clientY - from.y) > TAP) return;
    onProbe(under);
    onPick?.(under);
  };
  const key = (event: KeyboardEvent<HTMLDivElement>) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    const next = moved(series, probe, event.key, event.shiftKey ? 10 : 1);
    if (next) onProbe(next);
    else if (event.key === "Enter" || event.key === " ") onPick?.(probe);
    else return;
    event.preventDefault();
  };
  const bores = series[probe.series]?.points ?? [];
  const shown = (diameter_m: number | undefined) =>
    Number(((diameter_m ?? 0) * boreFactor).toFixed(1));
  return (
    <div
      className={styles.hand}
      style={{ height: plot.map.bottom + 8 }}
      role="slider"
      tabIndex={0}
      aria-label="Vent diameter and number of vents"
      aria-orientation="horizontal"
      aria-valuemin={shown(bores[0]?.diameter_m)}
      aria-valuemax={shown(bores.at(-1)?.diameter_m)}
      aria-valuenow={shown(bores[probe.point]?.diameter_m)}
      aria-valuetext={valueText}
      onPointerDown={(event) => {
        if (event.button === 0) pressed.current = { x: event.clientX, y: event.clientY };
      }}
      onPointerMove={(event) => onProbe(probeUnder(event))}
      onPointerUp={up}
      onPointerCancel={() => (pressed.current = null)}
      onPointerLeave={() => onProbe(null)}
      onKeyDown={key}
      onBlur={() => onProbe(null)}
    />
  );
}

function moved(series: MapLines, probe: Probe, key: string, steps: number): Probe | null {
  switch (key) {
    case "ArrowLeft":
      return stepAlong(series, probe, -steps);
    case "ArrowRight":
      return stepAlong(series, probe, steps);
    case "ArrowUp":
      return stepCount(series, probe, 1);
    case "ArrowDown":
      return stepCount(series, probe, -1);
    case "Home":
      return stepAlong(series, probe, -Infinity);
    case "End":
      return stepAlong(series, probe, Infinity);
    default:
      return null;
  }
}
