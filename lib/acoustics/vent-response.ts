/** The vent as a lossy line between its lumped ends: how much air moves for one pascal in the enclosure. */
import type { AirProperties, VentResponse } from "./vent-model";
import type { VentParts } from "./vent-parts";

/** Room for a response at n frequencies. */
export function newResponse(n: number): VentResponse {
  return {
    innerRe: new Float64Array(n),
    innerIm: new Float64Array(n),
    outerRe: new Float64Array(n),
    outerIm: new Float64Array(n),
  };
}

/**
 * Response of one vent, from the outer mouth inwards:
 *
 *     Z_out = ρω²/(2πc) + jωρδ_out/S;  each piece a line with z = jωρ/A (1 + (1−j) δ_v/a),
 *     y = jωA/(ρc²) (1 + (1−j)(γ−1) δ_t/a);  then jωρδ_in/S and the enclosure's plane air
 *
 * @param w - angular frequencies [rad/s]
 * @remarks Kirchhoff's wide-tube losses: validity a/δ_v > 10. Radiation into half space, ka < 0.5.
 * @source Kirchhoff boundary layers as in reference notes 5.1; composition as in 14
 */
export function respond(
  w: Float64Array,
  parts: VentParts,
  air: AirProperties,
  losses: boolean,
  S: number,
  a: number,
): VentResponse {
  const out = newResponse(w.length);
  const {
    density: rho,
    speedOfSound: c,
    kinematicViscosity: nu,
    heatCapacityRatio: g,
    prandtl,
  } = air;
  for (let i = 0; i < w.length; i++) {
    const om = w[i]!;
    const dv = Math.sqrt((2 * nu) / om),
      dt = dv / Math.sqrt(prandtl);
    // start outside: pressure per unit outer volume velocity
    let pr = (rho * om * om) / (2 * Math.PI * c),
      pi = (om * rho * parts.outerLump) / S,
      ur = 1,
      ui = 0;
    for (const line of parts.lines) {
      const A = line.radius === a ? S : Math.PI * line.radius * line.radius;
      const lr = losses ? dv / line.perimeterRadius : 0,
        lt = losses ? ((g - 1) * dt) / line.perimeterRadius : 0;
      // series z = jωρ/A (1 + (1-j) lr), shunt y = jωA/(ρc²) (1 + (1-j) lt)
      const q = (om * rho) / A,
        s = (om * A) / (rho * c * c);
      const zr = q * lr,
        zi = q * (1 + lr),
        yr = s * lt,
        yi = s * (1 + lt);
      const N = Math.max(1, Math.ceil((om / c) * line.length * 4));
      const len = line.length / N;
      // short symmetric section: exact to fourth order with the series of cosh and sinh
      for (let m = 0; m < N; m++) {
        const gr = (zr * yr - zi * yi) * len * len,
          gi = (zr * yi + zi * yr) * len * len;
        const g2r = gr * gr - gi * gi,
          g2i = 2 * gr * gi;
        const cr = 1 + gr / 2 + g2r / 24,
          ci = gi / 2 + g2i / 24;
        const sr = 1 + gr / 6 + g2r / 120,
          si = gi / 6 + g2i / 120;
        const br = (zr * sr - zi * si) * len,
          bi = (zr * si + zi * sr) * len;
        const kr = (yr * sr - yi * si) * len,
          ki = (yr * si + yi * sr) * len;
        const npr = pr * cr - pi * ci + ur * br - ui * bi,
          npi = pr * ci + pi * cr + ur * bi + ui * br;
        const nur = pr * kr - pi * ki + ur * cr - ui * ci,
          nui = pr * ki + pi * kr + ur * ci + ui * cr;
        pr = npr;
        pi = npi;
        ur = nur;
        ui = nui;
      }
    }
    const x = (om * rho * (parts.innerLump + parts.plane)) / S;
    pr -= x * ui;
    pi += x * ur;
    const d = pr * pr + pi * pi;
    out.innerRe[i] = (ur * pr + ui * pi) / d;
    out.innerIm[i] = (ui * pr - ur * pi) / d;
    out.outerRe[i] = pr / d;
    out.outerIm[i] = -pi / d;
  }
  return out;
}
