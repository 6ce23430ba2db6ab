/**
 * The air's outline along the axis: half height of the bore at each place, the quarter-circle flares
 * included. Millimetres; x counts inwards from the panel's outer face, radii from the axis.
 */
import type { Outline, OutlinePoint } from "./outline";

export interface BoreProfile {
  /** Mouth plane and innermost plane [mm]. */
  mouth: number;
  end: number;
  /** Half height of the bore at each end, flares left out [mm]. */
  mouthRadius: number;
  endRadius: number;
  outerFlare: number;
  innerFlare: number;
}

/** Radius of the outer flare at x; 0 where it does not reach. */
export function outerFlareRadius(profile: BoreProfile, x: number): number {
  const { mouth, mouthRadius, outerFlare: R } = profile;
  const t = mouth + R - x;
  if (R <= 0 || t <= 0) return 0;
  return mouthRadius + R - Math.sqrt(Math.max(0, R * R - Math.min(t, R) ** 2));
}

/** Radius of the inner flare at x; 0 where it does not reach. */
export function innerFlareRadius(profile: BoreProfile, x: number): number {
  const { end, endRadius, innerFlare: R } = profile;
  const t = x - (end - R);
  if (R <= 0 || t <= 0) return 0;
  return endRadius + R - Math.sqrt(Math.max(0, R * R - Math.min(t, R) ** 2));
}

/** Where the outer flare has the given radius; the mouth when it is never that wide. */
export function outerFlareAt(profile: BoreProfile, radius: number): number {
  const { mouth, mouthRadius, outerFlare: R } = profile;
  const rise = Math.min(Math.max(mouthRadius + R - radius, 0), R);
  return mouth + R - Math.sqrt(R * R - rise * rise);
}

/** Where the inner flare has the given radius; the innermost plane when it is never that wide. */
export function innerFlareAt(profile: BoreProfile, radius: number): number {
  const { end, endRadius, innerFlare: R } = profile;
  const rise = Math.min(Math.max(endRadius + R - radius, 0), R);
  return end - R + Math.sqrt(R * R - rise * rise);
}

/** Half height of the air inside a part whose own bore is `own` [mm]. */
export function airRadius(profile: BoreProfile, own: number, x: number): number {
  return Math.max(own, outerFlareRadius(profile, x), innerFlareRadius(profile, x));
}

/**
 * Outline of the solid between the air and a cylinder of radius `outer`, from x0 to x1: what the
 * flares have left of a ring, a plate or a tube. Empty where they have taken all of it.
 */
export function solidOutline(
  profile: BoreProfile,
  part: { x0: number; x1: number; own: number; outer: number },
): Outline {
  const { own, outer } = part;
  if (outer <= own) return [];
  const [left, right] = solidReach(profile, part);
  if (right - left <= 1e-9) return [];
  const meet = flaresMeet(profile);
  const outerEnd = Math.min(outerFlareAt(profile, own), meet);
  const innerStart = Math.max(innerFlareAt(profile, own), meet);
  const onOuter = profile.outerFlare > 0 && left < outerEnd;
  const onInner = profile.innerFlare > 0 && right > innerStart;
  const air = (x: number) => airRadius(profile, own, x);
  const outline: OutlinePoint[] = [
    { x: left, y: outer },
    { x: right, y: outer },
    { x: right, y: air(right) },
  ];
  if (onInner) {
    const x = Math.max(innerStart, left);
    outline.push({ x, y: air(x), radius: profile.innerFlare, clockwise: true });
  }
  if (onOuter) {
    const from = Math.min(outerEnd, right);
    if (from < (onInner ? Math.max(innerStart, left) : right))
      outline.push({ x: from, y: air(from) });
    outline.push({ x: left, y: air(left), radius: profile.outerFlare, clockwise: true });
  } else if (!onInner || innerStart > left) outline.push({ x: left, y: air(left) });
  return outline;
}

/** From where to where a part still has wood outside the flares. */
export function solidReach(
  profile: BoreProfile,
  { x0, x1, outer }: { x0: number; x1: number; outer: number },
): [number, number] {
  const left = outerFlareRadius(profile, x0) > outer ? outerFlareAt(profile, outer) : x0;
  const right = innerFlareRadius(profile, x1) > outer ? innerFlareAt(profile, outer) : x1;
  return [Math.max(x0, left), Math.min(x1, right)];
}

/** Where the two flares cross, for a vent shorter than both together; half way between their feet otherwise. */
function flaresMeet(profile: BoreProfile): number {
  let low = profile.mouth;
  let high = profile.end;
  if (profile.mouth + profile.outerFlare <= profile.end - profile.innerFlare)
    return (profile.mouth + profile.outerFlare + profile.end - profile.innerFlare) / 2;
  for (let step = 0; step < 30; step++) {
    const middle = (low + high) / 2;
    if (outerFlareRadius(profile, middle) > innerFlareRadius(profile, middle)) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/** Outline of a moulded flare: a wall of even thickness that follows the arc to its lip. */
export function trumpetOutline(profile: BoreProfile, at: "mouth" | "end", wall: number): Outline {
  const inner = at === "end";
  const R = inner ? profile.innerFlare : profile.outerFlare;
  const r = inner ? profile.endRadius : profile.mouthRadius;
  if (R <= 0) return [];
  const plane = inner ? profile.end : profile.mouth;
  const sign = inner ? 1 : -1;
  const back = Math.max(R - wall, 0);
  const foot = plane - sign * R;
  return [
    { x: foot, y: r + wall },
    { x: plane - sign * Math.min(wall, R), y: r + R, radius: back, clockwise: !inner },
    { x: plane, y: r + R },
    { x: foot, y: r, radius: R, clockwise: inner },
  ];
}
