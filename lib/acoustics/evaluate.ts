import type { Design } from "@/lib/document/schema";
import { airProperties } from "./air";
import type { Answer, Curves, EvaluateOptions, LevelLimit, Note } from "./answer";
import { arrangement, mechanicalParameters } from "./driver";
import { applyFilters } from "./filters";
import { tuningFrequency } from "./tuning";
import { modelVent } from "./vent";
import type { AirProperties, VentModel } from "./vent-model";

const log = (n: number, lo: number, hi: number) =>
  Float64Array.from({ length: n }, (_, i) => lo * (hi / lo) ** (i / (n - 1)));
const usual = log(400, 10, 500);

/** Everything the contract's `evaluate` answers. */
export function evaluate(design: Design, options: EvaluateOptions = {}): Answer {
  const air = airProperties(design.air);
  const losses = { vent_losses: options.vent_losses ?? true };
  const notes: Note[] = [];
  if (options.level === "drive")
    notes.push({
      code: "level_not_modelled",
      message: "Level-dependent vent loss is not modelled yet; this is the linear answer.",
    });
  if (options.solver === "field")
    notes.push({
      code: "field_solver_not_landed",
      message: "The field solver has not landed; this is the fitted answer.",
    });
  const models = design.vents.map((vent, i) =>
    modelVent(vent, design.enclosure, air, losses, `design.vents[${i}]`),
  );
  models.forEach((model) => notes.push(...model.notes));
  const tuning = tuningFrequency(design.enclosure, models, air);
  const reference =
    "density_kg_m3" in design.air
      ? air
      : airProperties({ temperature_c: 20, pressure_pa: 101_325, relative_humidity: 0.5 });
  const mechanical = design.driver ? mechanicalParameters(design.driver, reference) : null;
  let curves: Curves | null = null;
  let peaks: ({ speed_m_s: number; frequency_hz: number } | null)[] = models.map(() => null);
  if (design.driver && mechanical) {
    const f = options.frequency_hz ? Float64Array.from(options.frequency_hz) : usual;
    curves = curvesOf(design, air, models, tuning, mechanical, f);
    const scan = options.frequency_hz
      ? curvesOf(design, air, models, tuning, mechanical, usual)
      : curves;
    peaks = models.map((_, v) => {
      const speed = scan.air_speed_peak_m_s[v]!;
      let at = 0;
      speed.forEach((value, i) => {
        if (value > speed[at]!) at = i;
      });
      return { speed_m_s: speed[at]!, frequency_hz: scan.frequency_hz[at]! };
    });
  }
  return {
    air: {
      density_kg_m3: air.density,
      speed_of_sound_m_s: air.speedOfSound,
      kinematic_viscosity_m2_s: air.kinematicViscosity,
    },
    driver: mechanical,
    tuning_hz: tuning,
    vents: models.map((model, i) => ({ ...model.figures, peak_air_speed: peaks[i]! })),
    curves,
    notes,
  };
}

function curvesOf(
  design: Design,
  air: AirProperties,
  models: VentModel[],
  tuning: number | null,
  m: NonNullable<Answer["driver"]>,
  f: Float64Array,
): Curves {
  const driver = design.driver!;
  const n = f.length;
  const w = f.map((x) => 2 * Math.PI * x);
  const { series, parallel } = arrangement(driver);
  const N = driver.count;
  const { density: rho, speedOfSound: c } = air;
  const C = design.enclosure.net_volume_m3 / (rho * c * c);
  const Sd = N * driver.sd_m2;
  const mms = N * m.mms_kg,
    rms = N * m.rms_kg_s,
    cms = m.cms_m_n / N;
  const bl = series * m.bl_t_m; // parallel strings share the force
  const ratio = series / parallel; // coil impedance of the array over one driver's
  const wb =
    2 *
    Math.PI *
    (tuning ?? closedResonance(driver.fs_hz, driver.vas_m3 * N, design.enclosure.net_volume_m3));
  const ral = design.enclosure.ql === null ? Infinity : design.enclosure.ql / (wb * C);
  const rab = design.enclosure.qa === null ? 0 : 1 / (design.enclosure.qa * wb * C);
  const responses = models.map((model) => model.respond(w));
  const vr = new Float64Array(n).fill(design.drive.voltage_v),
    vi = new Float64Array(n);
  applyFilters(design.filters, w, vr, vi);
  const make = () => new Array<number>(n).fill(0);
  const out = {
    spl: make(),
    phase: make(),
    x: make(),
    z: make(),
    zp: make(),
    u0r: new Float64Array(n),
    u0i: new Float64Array(n),
  };
  const speeds = models.map(make);
  const gain = make();
  for (let i = 0; i < n; i++) {
    const om = w[i]!;
    // enclosure admittance
    const br = om * C * rab,
      d0 = 1 + br * br;
    let yr = (om * C * br) / d0 + 1 / ral,
      yi = (om * C) / d0;
    if (ral === Infinity) yr = (om * C * br) / d0;
    models.forEach((model, v) => {
      yr += model.count * responses[v]!.innerRe[i]!;
      yi += model.count * responses[v]!.innerIm[i]!;
    });
    const yd = yr * yr + yi * yi;
    const zmr = rms + (Sd * Sd * yr) / yd,
      zmi = om * mms - 1 / (om * cms) - (Sd * Sd * yi) / yd;
    // coil
    let er = driver.re_ohm,
      ei = om * (driver.le_h ?? 0);
    if (
      driver.l2_h !== undefined &&
      driver.r2_ohm !== undefined &&
      driver.l2_h > 0 &&
      driver.r2_ohm > 0
    ) {
      const x = om * driver.l2_h,
        r = driver.r2_ohm,
        d = r * r + x * x;
      er += (r * x * x) / d;
      ei += (r * r * x) / d;
    }
    if (driver.semi_inductance) {
      const { k, n: e } = driver.semi_inductance;
      const s = k * om ** e;
      er += s * Math.cos((e * Math.PI) / 2);
      ei += s * Math.sin((e * Math.PI) / 2);
    }
    er *= ratio;
    ei *= ratio;
    const sr = er + design.drive.source_resistance_ohm;
    // u = Bl e /(Zs Zm + Bl²)
    const dr = sr * zmr - ei * zmi + bl * bl,
      di = sr * zmi + ei * zmr,
      dd = dr * dr + di * di;
    const ur = (bl * (vr[i]! * dr + vi[i]! * di)) / dd,
      ui = (bl * (vi[i]! * dr - vr[i]! * di)) / dd;
    const md = zmr * zmr + zmi * zmi;
    const zr = er + (bl * bl * zmr) / md,
      zi = ei - (bl * bl * zmi) / md;
    out.z[i] = Math.hypot(zr, zi);
    out.zp[i] = (Math.atan2(zi, zr) * 180) / Math.PI;
    out.x[i] = (Math.SQRT2 * Math.hypot(ur, ui)) / om;
    // cone moves in with u: box pressure
    const pr = (Sd * (ur * yr + ui * yi)) / yd,
      pi = (Sd * (ui * yr - ur * yi)) / yd;
    let qr = -Sd * ur,
      qi = -Sd * ui;
    if (ral !== Infinity) {
      qr += pr / ral;
      qi += pi / ral;
    }
    models.forEach((model, v) => {
      const r = responses[v]!;
      const or = pr * r.outerRe[i]! - pi * r.outerIm[i]!,
        oi = pr * r.outerIm[i]! + pi * r.outerRe[i]!;
      const ir = pr * r.innerRe[i]! - pi * r.innerIm[i]!,
        ii = pr * r.innerIm[i]! + pi * r.innerRe[i]!;
      qr += model.count * or;
      qi += model.count * oi;
      speeds[v]![i] =
        (Math.SQRT2 * Math.max(Math.hypot(or, oi), Math.hypot(ir, ii))) / model.boreArea_m2;
    });
    // p = jωρ q / 2π, cone outward positive at the front
    out.u0r[i] = -qr;
    out.u0i[i] = -qi;
    out.spl[i] = 20 * Math.log10((om * rho * Math.hypot(qr, qi)) / (2 * Math.PI) / 20e-6);
    gain[i] = Math.hypot(vr[i]!, vi[i]!) / design.drive.voltage_v;
  }
  // phase, unwrapped, and its slope
  const phase = make(),
    delay = make();
  let previous = 0;
  for (let i = 0; i < n; i++) {
    let p = Math.atan2(out.u0r[i]!, -out.u0i[i]!);
    if (i > 0) p += 2 * Math.PI * Math.round((previous - p) / (2 * Math.PI));
    previous = p;
    phase[i] = p;
  }
  for (let i = 0; i < n; i++) {
    const a = Math.max(0, i - 1),
      b = Math.min(n - 1, i + 1);
    delay[i] = a === b ? 0 : -(phase[b]! - phase[a]!) / (w[b]! - w[a]!);
    out.phase[i] = (((((phase[i]! * 180) / Math.PI + 180) % 360) + 360) % 360) - 180;
  }
  const limits = largest(design, out.spl, out.x, speeds, out.z, gain);
  return {
    frequency_hz: [...f],
    spl_db: out.spl,
    phase_deg: out.phase,
    group_delay_s: delay,
    excursion_peak_m: out.x,
    impedance_ohm: out.z,
    impedance_phase_deg: out.zp,
    air_speed_peak_m_s: speeds,
    ...limits,
  };
}

function closedResonance(fs: number, vas: number, vb: number): number {
  return fs * Math.sqrt(1 + vas / vb);
}

function largest(
  design: Design,
  spl: number[],
  x: number[],
  speeds: number[][],
  _z: number[],
  gain: number[],
) {
  const driver = design.driver!;
  const { series, parallel } = arrangement(driver);
  const voltage = design.drive.voltage_v;
  const power =
    driver.power_w === undefined
      ? Infinity
      : Math.sqrt((driver.power_w * driver.count * driver.re_ohm * series) / parallel);
  const max_spl_db: (number | null)[] = [],
    max_spl_limit: (LevelLimit | null)[] = [];
  spl.forEach((level, i) => {
    let scale = Infinity,
      name: LevelLimit | null = null;
    const bound = (value: number, limit: LevelLimit) => {
      if (value < scale) {
        scale = value;
        name = limit;
      }
    };
    if (driver.xmax_m !== undefined) bound(driver.xmax_m / x[i]!, "excursion");
    const speed = design.target.air_speed_limit_m_s;
    if (speed !== null) for (const s of speeds) bound(speed / s[i]!, "air speed");
    bound(power / (voltage * gain[i]!), "power");
    if (design.amplifier?.voltage_limit_v)
      bound(design.amplifier.voltage_limit_v / (voltage * gain[i]!), "voltage");
    const level2 = level + 20 * Math.log10(scale);
    max_spl_db.push(Number.isFinite(level2) ? level2 : null);
    max_spl_limit.push(Number.isFinite(level2) ? name : null);
  });
  return { max_spl_db, max_spl_limit };
}
