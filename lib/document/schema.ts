/**
 * The design document, format 1: the one definition from which the TypeScript type, the JSON
 * Schema and every check follow. SI values; the unit stands in each name. A number outside its
 * physical range is refused with the range said (see errors.ts).
 */
import { z } from "zod";
import { seriesPerString } from "./series-parallel";

export { seriesPerString };

const within = (min: number, max: number) => z.number().min(min).max(max);
const above = (min: number, max: number) => z.number().gt(min).max(max);

/** Any quality factor: of a driver, of the enclosure's losses, of a filter section. */
const quality = within(0.01, 100);
const frequency = within(0.1, 100_000);

export const airSchema = z.union([
  z.strictObject({
    temperature_c: within(-40, 80).default(20),
    pressure_pa: within(40_000, 110_000).default(101_325),
    relative_humidity: within(0, 1).default(0.5),
  }),
  z.strictObject({
    density_kg_m3: within(0.4, 2),
    speed_of_sound_m_s: within(250, 450),
  }),
]);

export const driverSchema = z
  .strictObject({
    count: z.number().int().min(1).max(64).default(1),
    wiring: z.enum(["parallel", "series", "series-parallel"]).default("parallel"),
    fs_hz: within(1, 5_000),
    qes: quality,
    qms: quality,
    vas_m3: within(1e-6, 20),
    re_ohm: within(0.05, 1_000),
    sd_m2: within(1e-5, 2),
    le_h: within(0, 0.5).optional(),
    l2_h: within(0, 0.5).optional(),
    r2_ohm: within(0, 10_000).optional(),
    semi_inductance: z.strictObject({ k: within(0, 100), n: within(0, 1) }).optional(),
    xmax_m: above(0, 0.2).optional(),
    power_w: above(0, 100_000).optional(),
    displacement_m3: within(0, 0.2).optional(),
  })
  .refine((driver) => (driver.l2_h === undefined) === (driver.r2_ohm === undefined), {
    path: ["r2_ohm"],
    message: "The parallel pair of a lossy coil needs both l2_h and r2_ohm.",
  })
  .refine(
    (driver) => driver.wiring !== "series-parallel" || seriesPerString(driver.count) !== null,
    {
      path: ["count"],
      message:
        "Series-parallel needs a count that makes equal strings of two or more: 4, 6, 8, 9, 10, 12 …",
    },
  );

export const enclosureSchema = z.strictObject({
  net_volume_m3: within(1e-5, 100),
  inside_m: z
    .strictObject({ width: above(0, 10), height: above(0, 10), depth: above(0, 10) })
    .nullable()
    .default(null),
  panel_thickness_m: within(0.0005, 0.5),
  ql: quality.nullable().default(null),
  qa: quality.nullable().default(null),
});

export const boreSchema = z.discriminatedUnion("shape", [
  z.strictObject({ shape: z.literal("round"), diameter_m: within(0.005, 2) }),
  z.strictObject({
    shape: z.literal("slot"),
    width_m: within(0.003, 5),
    height_m: within(0.003, 5),
    shared_walls: z.number().int().min(0).max(4).default(0),
  }),
]);

const ownBore = within(0.005, 2).optional();
const outerDiameter = within(0.005, 3);

export const pieceSchema = z.discriminatedUnion("kind", [
  z.strictObject({
    kind: z.literal("tube"),
    length_m: within(0, 10),
    outer_diameter_m: outerDiameter.optional(),
    bore_m: ownBore,
  }),
  z.strictObject({
    kind: z.literal("rings"),
    count: z.number().int().min(0).max(100),
    thickness_m: within(0.0005, 0.2),
    outer_diameter_m: outerDiameter,
    glue_line_m: within(0, 0.005).default(0),
    bore_m: ownBore,
  }),
  z.strictObject({
    kind: z.literal("plate"),
    thickness_m: within(0.0005, 0.2),
    outer_diameter_m: outerDiameter,
    glue_line_m: within(0, 0.005).default(0),
    bore_m: ownBore,
  }),
  z.strictObject({
    kind: z.literal("bend"),
    angle_deg: within(1, 180),
    centre_radius_m: within(0.005, 5).optional(),
    mitred: z.boolean().default(false),
    outer_diameter_m: outerDiameter.optional(),
    bore_m: ownBore,
  }),
]);

export const airwayVentSchema = z.strictObject({
  name: z.string().max(120).default("Vent"),
  count: z.number().int().min(1).max(16).default(1),
  spacing_m: above(0, 10).nullable().default(null),
  bore: boreSchema,
  outer_end: z
    .strictObject({
      flare_radius_m: within(0, 1).default(0),
      proud_m: within(0, 1).default(0),
    })
    .default({ flare_radius_m: 0, proud_m: 0 }),
  pieces: z.array(pieceSchema).min(1).max(40),
  inner_end: z
    .strictObject({
      flare_radius_m: within(0, 1).default(0),
      form: z.enum(["cut", "shell"]).default("cut"),
      wall_m: within(0.0001, 0.1).optional(),
    })
    .default({ flare_radius_m: 0, form: "cut" }),
  clearance_m: within(0, 20).nullable().default(null),
  outer_clearance_m: above(0, 100).nullable().default(null),
});

export const lumpedVentSchema = z.strictObject({
  name: z.string().max(120).default("Vent"),
  count: z.number().int().min(1).max(16).default(1),
  lumped: z.strictObject({
    inertance_kg_m4: above(0, 1e7),
    resistance_pa_s_m3: within(0, 1e9).default(0),
    area_m2: above(0, 20),
  }),
});

export const ventSchema = z.union([airwayVentSchema, lumpedVentSchema]);

export const filterSchema = z
  .strictObject({
    kind: z.enum(["highpass", "lowpass"]),
    /** "resonant" is one second-order section of the given q, as a sixth-order alignment asks for. */
    family: z.enum(["butterworth", "linkwitz-riley", "resonant"]),
    order: z.number().int().min(1).max(8),
    frequency_hz: within(0.5, 50_000),
    q: within(0.1, 20).optional(),
  })
  .refine((filter) => filter.family !== "linkwitz-riley" || filter.order % 2 === 0, {
    path: ["order"],
    message: "A Linkwitz-Riley filter has an even order: 2, 4, 6 or 8.",
  })
  .refine(
    (filter) =>
      (filter.family === "resonant") === (filter.q !== undefined) &&
      (filter.family !== "resonant" || filter.order === 2),
    {
      path: ["q"],
      message: "A resonant filter is of order 2 and carries q; the others carry none.",
    },
  );

export const designSchema = z
  .strictObject({
    format: z.literal(1),
    name: z.string().max(200).default("Untitled design"),
    air: airSchema.default({ temperature_c: 20, pressure_pa: 101_325, relative_humidity: 0.5 }),
    driver: driverSchema.nullable().default(null),
    enclosure: enclosureSchema,
    vents: z.array(ventSchema).max(16).default([]),
    drive: z
      .strictObject({
        voltage_v: within(0, 2_000).default(2.83),
        source_resistance_ohm: within(0, 1_000).default(0),
      })
      .default({ voltage_v: 2.83, source_resistance_ohm: 0 }),
    amplifier: z
      .strictObject({
        voltage_limit_v: above(0, 2_000).nullable().default(null),
        minimum_load_ohm: within(0, 1_000).nullable().default(null),
      })
      .nullable()
      .default(null),
    filters: z.array(filterSchema).max(8).default([]),
    target: z
      .strictObject({
        tuning_hz: frequency.nullable().default(null),
        air_speed_limit_m_s: above(0, 200).nullable().default(null),
      })
      .default({ tuning_hz: null, air_speed_limit_m_s: null }),
  })
  .refine((design) => design.vents.every((vent) => "lumped" in vent || ringCount(vent) <= 100), {
    path: ["vents"],
    message: "At most 100 rings in one vent.",
  });

function ringCount(vent: z.infer<typeof airwayVentSchema>): number {
  return vent.pieces.reduce((sum, piece) => sum + (piece.kind === "rings" ? piece.count : 0), 0);
}

/** A design with every default filled in: what the library works on. */
export type Design = z.output<typeof designSchema>;
/** A design as it may be written down, defaults left out. */
export type DesignInput = z.input<typeof designSchema>;
export type Air = Design["air"];
export type Driver = NonNullable<Design["driver"]>;
export type Enclosure = Design["enclosure"];
export type Vent = Design["vents"][number];
export type AirwayVent = z.output<typeof airwayVentSchema>;
export type LumpedVent = z.output<typeof lumpedVentSchema>;
export type Bore = AirwayVent["bore"];
export type Piece = AirwayVent["pieces"][number];
export type Filter = Design["filters"][number];
