/**
 * Designs of our own invention: the sample a visitor meets, and the demo shop's. Parts are
 * generic and named as such; no figure is any maker's.
 */
import type { DesignInput } from "./schema";

/** The sample on the front page: a stock tube that is too short, made up with rings. */
export const denSub = {
  format: 1,
  name: "Den sub",
  air: { temperature_c: 20, pressure_pa: 101_325, relative_humidity: 0.5 },
  driver: {
    count: 1,
    wiring: "parallel",
    fs_hz: 28,
    qes: 0.45,
    qms: 7.2,
    vas_m3: 0.062,
    re_ohm: 3.6,
    sd_m2: 0.0346,
    le_h: 0.0016,
    xmax_m: 0.012,
    power_w: 400,
    displacement_m3: 0.0025,
  },
  enclosure: {
    net_volume_m3: 0.06,
    inside_m: { width: 0.37, height: 0.4, depth: 0.46 },
    panel_thickness_m: 0.036,
    ql: 7,
    qa: null,
  },
  vents: [
    {
      name: "Front port",
      count: 1,
      bore: { shape: "round", diameter_m: 0.101 },
      outer_end: { flare_radius_m: 0.022, proud_m: 0 },
      pieces: [
        { kind: "tube", length_m: 0.22, outer_diameter_m: 0.107 },
        {
          kind: "rings",
          count: 5,
          thickness_m: 0.0177,
          outer_diameter_m: 0.16,
          glue_line_m: 0.0001,
        },
        { kind: "plate", thickness_m: 0.0177, outer_diameter_m: 0.236, glue_line_m: 0.0001 },
      ],
      inner_end: { flare_radius_m: 0.0127, form: "cut" },
    },
  ],
  drive: { voltage_v: 16, source_resistance_ohm: 0 },
  amplifier: { voltage_limit_v: 45, minimum_load_ohm: 2 },
  filters: [
    { kind: "highpass", family: "butterworth", order: 4, frequency_hz: 24 },
    { kind: "lowpass", family: "linkwitz-riley", order: 4, frequency_hz: 100 },
  ],
  target: { tuning_hz: 32, air_speed_limit_m_s: 17 },
} satisfies DesignInput;

/** Two compact boxes for a desk: a thin tube with a moulded trumpet inside. */
export const deskPair = {
  format: 1,
  name: "Desk pair",
  driver: {
    fs_hz: 52,
    qes: 0.42,
    qms: 4.8,
    vas_m3: 0.0078,
    re_ohm: 5.6,
    sd_m2: 0.0085,
    le_h: 0.0004,
    xmax_m: 0.0045,
    power_w: 40,
    displacement_m3: 0.0003,
  },
  enclosure: {
    net_volume_m3: 0.0074,
    inside_m: { width: 0.15, height: 0.26, depth: 0.21 },
    panel_thickness_m: 0.018,
    ql: 9,
  },
  vents: [
    {
      name: "Rear port",
      bore: { shape: "round", diameter_m: 0.044 },
      outer_end: { flare_radius_m: 0.012 },
      pieces: [{ kind: "tube", length_m: 0.154, outer_diameter_m: 0.049 }],
      inner_end: { flare_radius_m: 0.01, form: "shell", wall_m: 0.0025 },
    },
  ],
  drive: { voltage_v: 7 },
  filters: [{ kind: "highpass", family: "butterworth", order: 2, frequency_hz: 44 }],
  target: { tuning_hz: 58, air_speed_limit_m_s: 17 },
} satisfies DesignInput;

/** A hall subwoofer with two long ports, stretched by rings of two sheets. */
export const hallTwelve = {
  format: 1,
  name: "Hall twelve",
  driver: {
    fs_hz: 24.5,
    qes: 0.4,
    qms: 8,
    vas_m3: 0.11,
    re_ohm: 3.3,
    sd_m2: 0.052,
    le_h: 0.0022,
    xmax_m: 0.016,
    power_w: 600,
    displacement_m3: 0.0035,
  },
  enclosure: {
    net_volume_m3: 0.12,
    inside_m: { width: 0.44, height: 0.55, depth: 0.56 },
    panel_thickness_m: 0.036,
    ql: 7,
    qa: 80,
  },
  vents: [
    {
      name: "Twin ports",
      count: 2,
      spacing_m: 0.24,
      bore: { shape: "round", diameter_m: 0.1015 },
      outer_end: { flare_radius_m: 0.019 },
      pieces: [
        { kind: "tube", length_m: 0.352, outer_diameter_m: 0.1143 },
        {
          kind: "rings",
          count: 3,
          thickness_m: 0.0177,
          outer_diameter_m: 0.168,
          glue_line_m: 0.0001,
        },
        {
          kind: "rings",
          count: 2,
          thickness_m: 0.012,
          outer_diameter_m: 0.168,
          glue_line_m: 0.0001,
        },
      ],
      inner_end: { flare_radius_m: 0.0127 },
    },
  ],
  drive: { voltage_v: 22 },
  amplifier: { voltage_limit_v: 60, minimum_load_ohm: 2.5 },
  filters: [{ kind: "highpass", family: "butterworth", order: 4, frequency_hz: 22 }],
  target: { tuning_hz: 28, air_speed_limit_m_s: 17 },
} satisfies DesignInput;

/** A hatchback box with a full-width slot along the floor. */
export const hatchSlot = {
  format: 1,
  name: "Hatch slot",
  air: { temperature_c: 15, pressure_pa: 101_325, relative_humidity: 0.6 },
  driver: {
    count: 2,
    wiring: "parallel",
    fs_hz: 32,
    qes: 0.42,
    qms: 6.5,
    vas_m3: 0.038,
    re_ohm: 3.4,
    sd_m2: 0.0214,
    le_h: 0.0011,
    xmax_m: 0.01,
    power_w: 250,
    displacement_m3: 0.0016,
  },
  enclosure: {
    net_volume_m3: 0.055,
    inside_m: { width: 0.46, height: 0.34, depth: 0.4 },
    panel_thickness_m: 0.018,
    ql: 8,
  },
  vents: [
    {
      name: "Floor slot",
      bore: { shape: "slot", width_m: 0.34, height_m: 0.032, shared_walls: 3 },
      outer_end: { flare_radius_m: 0.0127 },
      pieces: [{ kind: "tube", length_m: 0.345 }],
      inner_end: { flare_radius_m: 0 },
    },
  ],
  drive: { voltage_v: 16 },
  amplifier: { voltage_limit_v: 40, minimum_load_ohm: 1.6 },
  filters: [{ kind: "highpass", family: "butterworth", order: 4, frequency_hz: 28 }],
  target: { tuning_hz: 36, air_speed_limit_m_s: 20 },
} satisfies DesignInput;

/** A box and a tuning, no driver yet: just give me the vent. */
export const ventOnly = {
  format: 1,
  name: "Vent for a found box",
  enclosure: {
    net_volume_m3: 0.0425,
    inside_m: { width: 0.3, height: 0.42, depth: 0.36 },
    panel_thickness_m: 0.018,
    ql: 7,
  },
  vents: [
    {
      name: "Stock 76 short",
      bore: { shape: "round", diameter_m: 0.0762 },
      outer_end: { flare_radius_m: 0.016 },
      pieces: [
        { kind: "tube", length_m: 0.174, outer_diameter_m: 0.0822 },
        {
          kind: "rings",
          count: 3,
          thickness_m: 0.012,
          outer_diameter_m: 0.126,
          glue_line_m: 0.0001,
        },
      ],
      inner_end: { flare_radius_m: 0.0095 },
    },
  ],
  target: { tuning_hz: 35, air_speed_limit_m_s: 17 },
} satisfies DesignInput;

export const demoDesigns: DesignInput[] = [denSub, deskPair, hallTwelve, hatchSlot, ventOnly];
