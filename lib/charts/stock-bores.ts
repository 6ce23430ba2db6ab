/**
 * Inside diameters that are sold ready made, by generic size. What is at hand in the shop goes
 * first; these stand in where nothing is known of it. Always caliper before cutting.
 */

export interface StockBore {
  diameter_m: number;
  name: string;
}

const PIPE = "schedule 40 pipe, average inside (ASTM D1785)";
const PORT = "moulded port, middle of the sizes sold";

/** Ascending. */
export const STOCK_BORES: readonly StockBore[] = [
  { diameter_m: 0.037, name: `38 mm ${PORT}` },
  { diameter_m: 0.05, name: `2 in ${PORT}` },
  { diameter_m: 0.052, name: `2 in ${PIPE}` },
  { diameter_m: 0.0665, name: `65–70 mm ${PORT}` },
  { diameter_m: 0.076, name: `3 in ${PORT}` },
  { diameter_m: 0.0773, name: `3 in ${PIPE}` },
  { diameter_m: 0.1005, name: `4 in ${PORT}` },
  { diameter_m: 0.1036, name: "110 mm drain pipe (EN 1401)" },
  { diameter_m: 0.126, name: `5 in ${PORT}` },
  { diameter_m: 0.151, name: `6 in ${PORT}` },
  { diameter_m: 0.1532, name: `6 in ${PIPE}` },
  { diameter_m: 0.2005, name: `8 in ${PORT}` },
];
