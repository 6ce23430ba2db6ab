/** "System A", the dossier's reference system, as a design. Source: vented-box dossier, its head. */
import { designSchema, type Design, type DesignInput } from "@/lib/document/schema";

export const smallsAir = { density_kg_m3: 1.18, speed_of_sound_m_s: 345 };

export const driverA = {
  fs_hz: 30,
  qes: 0.4,
  qms: 4,
  vas_m3: 0.1,
  re_ohm: 6,
  sd_m2: 0.035,
};

/** C_AB of 70 L and M_AP for 33 Hz, from their definitions. */
export const complianceA = 0.07 / (1.18 * 345 ** 2);
export const inertanceA = 1 / ((2 * Math.PI * 33) ** 2 * complianceA);
/** A bore of 100 mm. */
export const areaA = (Math.PI / 4) * 0.1 ** 2;

interface Losses {
  ql?: number | null;
  qa?: number | null;
  qp?: number | null;
}

export function systemA(
  losses: Losses = {},
  changes: Partial<DesignInput> & { coil?: object } = {},
): Design {
  const { ql = null, qa = null, qp = null } = losses;
  const { coil, ...rest } = changes;
  return designSchema.parse({
    format: 1,
    air: smallsAir,
    driver: { ...driverA, ...coil },
    enclosure: { net_volume_m3: 0.07, panel_thickness_m: 0.018, ql, qa },
    vents: [
      {
        lumped: {
          inertance_kg_m4: inertanceA,
          area_m2: areaA,
          resistance_pa_s_m3: qp === null ? 0 : 1 / (qp * 2 * Math.PI * 33 * complianceA),
        },
      },
    ],
    ...rest,
  });
}
