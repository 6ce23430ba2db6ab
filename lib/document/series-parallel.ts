/**
 * Drivers in series in each string of a series-parallel array: the largest divisor of the count
 * that is at most its square root; null where no equal strings of two or more can be made.
 *
 * @example seriesPerString(8) // 2: four strings of two
 */
export function seriesPerString(count: number): number | null {
  for (let divisor = Math.floor(Math.sqrt(count)); divisor > 1; divisor--)
    if (count % divisor === 0) return divisor;
  return null;
}
