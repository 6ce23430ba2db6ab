"use client";

import { keyFiguresOf, type KeyFigures as Figures } from "@/lib/bench/key-figures";
import { tuningStatus } from "@/lib/margins/checks/tuning";
import type { Status } from "@/lib/margins/margin";
import { formatQuantity } from "@/lib/units/format";
import type { QuantityKind, UnitPreferences } from "@/lib/units/preferences";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { Lettered } from "@/components/ui/lettered";
import { useBench } from "./bench-context";
import { WorkingButton } from "./working-button";

/** The four figures that decide. They stay in sight on a phone. */
export function KeyFigures() {
  const design = useBench((state) => state.design);
  const answer = useBench((state) => state.answer);
  const ventIndex = useBench((state) => state.ventIndex);
  const [preferences] = useUnitPreferences();
  const figures = keyFiguresOf(design, answer, ventIndex);
  return (
    <dl className="key-strip" aria-live="off">
      <KeyFigure label="Tuning f_B" working="tuning" {...tuningText(figures, preferences)} />
      <KeyFigure label="Air speed" working="air-speed" {...airSpeedText(figures, preferences)} />
      <KeyFigure
        label={figures.rings.length > 0 ? "Rings" : "Vent length"}
        working="effective-length"
        {...ringsText(figures, preferences)}
      />
      <KeyFigure label="Net volume" working="net-volume" {...volumeText(figures, preferences)} />
    </dl>
  );
}

interface FigureText {
  value: string;
  unit: string;
  below: string;
  state?: Status;
}

const tones: Record<Status, string> = {
  within: "text-within",
  near: "text-near",
  over: "text-over",
  unknown: "text-ink-2",
};

function KeyFigure(props: FigureText & { label: string; working: string }) {
  const tone = props.state ? tones[props.state] : "text-ink-2";
  return (
    <div className="key-figure">
      <dt className="key-name">
        <span className="truncate">
          <Lettered text={props.label} />
        </span>
        <WorkingButton figure={props.working} label={props.label} />
      </dt>
      <dd>
        <span className="figure-key">{props.value}</span>{" "}
        <span className="key-unit lettering text-ink-2">{props.unit}</span>
        <span className={`key-below ${tone}`}>{props.below}</span>
      </dd>
    </div>
  );
}

/** A quantity that may be missing. */
function show(value: number | null, kind: QuantityKind, preferences: UnitPreferences) {
  return value === null
    ? { value: "–", unit: "", text: "–" }
    : formatQuantity(value, kind, preferences);
}

function tuningText(figures: Figures, preferences: UnitPreferences): FigureText {
  const { value, unit } = show(figures.tuning_hz, "frequency", preferences);
  if (figures.tuning_hz === null) return { value, unit, below: "no vent is tuned yet" };
  if (figures.target_hz === null) return { value, unit, below: "no target set" };
  const off = figures.tuning_hz - figures.target_hz;
  const target = formatQuantity(figures.target_hz, "frequency", preferences).text;
  const near = Math.abs(off) < 0.05;
  return {
    value,
    unit,
    below: near
      ? `on the ${target} target`
      : `${formatQuantity(Math.abs(off), "frequency", preferences).text} ${off < 0 ? "under" : "over"} the ${target} target`,
    state: tuningStatus(figures.tuning_hz, figures.target_hz),
  };
}

function airSpeedText(figures: Figures, preferences: UnitPreferences): FigureText {
  const { value, unit } = show(figures.air_speed_m_s, "speed", preferences);
  if (figures.air_speed_m_s === null || figures.air_speed_hz === null)
    return { value, unit, below: "needs a driver and a vent" };
  const at = formatQuantity(figures.air_speed_hz, "frequency", preferences, { digits: 0 }).text;
  const peak = `${unit} peak at ${at}`;
  const limit = figures.air_speed_limit_m_s;
  if (limit === null) return { value, unit: peak, below: "no limit set" };
  const left = limit - figures.air_speed_m_s;
  return {
    value,
    unit: peak,
    below: `${formatQuantity(Math.abs(left), "speed", preferences).text} ${left >= 0 ? "under" : "over"} the limit`,
    state: left >= 0 ? "within" : "over",
  };
}

function ringsText(figures: Figures, preferences: UnitPreferences): FigureText {
  const overall = show(figures.overall_length_m, "length", preferences);
  if (figures.rings.length === 0)
    return { value: overall.value, unit: overall.unit, below: "no rings" };
  const unit = formatQuantity(figures.rings_length_m, "length", preferences);
  return {
    value: figures.rings
      .map(
        ({ count, thickness_m }) =>
          `${count} × ${formatQuantity(thickness_m, "length", preferences).value}`,
      )
      .join(" + "),
    unit: unit.unit,
    below: `adds ${unit.text}, overall ${overall.text}`,
  };
}

function volumeText(figures: Figures, preferences: UnitPreferences): FigureText {
  const { value, unit } = show(figures.net_volume_m3, "volume", preferences);
  const gross = figures.gross_volume_m3;
  const vents = formatQuantity(figures.vents_volume_m3, "volume", preferences).text;
  return {
    value,
    unit: gross ? `${unit} of ${formatQuantity(gross, "volume", preferences).value} gross` : unit,
    below: figures.vents_volume_m3 > 0 ? `vents take ${vents}` : "no vent inside",
  };
}
