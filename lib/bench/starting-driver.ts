import type { Driver } from "@/lib/document/schema";

/** A generic ten-inch driver of our own invention, to be overtyped with the figures of the real one. */
export const startingDriver: Driver = {
  count: 1,
  wiring: "parallel",
  fs_hz: 28,
  qes: 0.45,
  qms: 7.2,
  vas_m3: 0.062,
  re_ohm: 3.6,
  sd_m2: 0.0346,
  xmax_m: 0.012,
};
