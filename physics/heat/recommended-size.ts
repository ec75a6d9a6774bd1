/** Powers in which plug-in heaters are sold, W. */
export const HEATER_SIZES_W = [100, 150, 200, 250, 300, 400, 500, 600, 750, 1000, 1200, 1500, 1800, 2000, 2400, 3000];
/** Over the steady need: for colder nights, ageing and a wet tray; 1.15 to 1.5 is usual. Judged. */
export const HEATER_MARGIN = 1.25;

/** Airflows on the R10 series of preferred numbers, m³/h. @source ISO 3 */
export const FAN_SIZES_M3H = [
  50, 63, 80, 100, 125, 160, 200, 250, 315, 400, 500, 630, 800, 1000, 1250, 1600, 2000, 2500, 3150,
];

/** The smallest listed size that covers the need; a need beyond the list is given as it is. */
export function sizeUp(need: number, sizes: readonly number[]): number {
  if (need <= 0) return 0;
  return sizes.find((size) => size >= need - 1e-9) ?? need;
}
