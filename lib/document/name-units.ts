/** Units as the names of the document's fields carry them. Longest suffix first. */
const suffixes: readonly (readonly [string, string])[] = [
  ["_pa_s_m3", "Pa·s/m³"],
  ["_kg_m3", "kg/m³"],
  ["_kg_m4", "kg/m⁴"],
  ["_m_s", "m/s"],
  ["_deg", "°"],
  ["_ohm", "Ω"],
  ["_m2", "m²"],
  ["_m3", "m³"],
  ["_hz", "Hz"],
  ["_pa", "Pa"],
  ["_c", "°C"],
  ["_h", "H"],
  ["_m", "m"],
  ["_v", "V"],
  ["_w", "W"],
];

/**
 * The unit of a field from its name, or from that of the object or list it stands in
 * (`inside_m.width`, `frequency_hz[3]`); null for a pure number.
 *
 * @example unitOfPath(["design", "vents", 0, "bore", "diameter_m"]) // "m"
 */
export function unitOfPath(path: readonly PropertyKey[]): string | null {
  for (const name of [...path].reverse().slice(0, 2)) {
    if (typeof name !== "string") continue;
    const found = suffixes.find(([suffix]) => name.endsWith(suffix));
    if (found) return found[1];
  }
  return null;
}
