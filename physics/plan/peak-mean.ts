/** Over how long a meter takes the mean of which the highest counts, h. */
export const PEAK_H = 5 / 60;

/**
 * The highest mean power of any five minutes of a year, fed stretch by stretch.
 *
 * The mean of a power that stands still between switchings is highest in a window that begins or ends where something switches;
 * those windows alone are looked at. A stretch of five minutes or more is its own window.
 */
export class PeakMean {
  private peakW = 0;
  /** The latest stretches, as far back as a window may reach. */
  private recent: { hours: number; powerW: number }[] = [];

  add(hours: number, powerW: number): void {
    if (hours >= PEAK_H) this.peakW = Math.max(this.peakW, powerW);
    const { recent } = this;
    recent.push({ hours, powerW });
    let held = recent.reduce((sum, each) => sum + each.hours, 0);
    // A window that ends in this stretch reaches back to five minutes before it at most.
    while (recent.length > 1 && held - hours - recent[0]!.hours >= PEAK_H) held -= recent.shift()!.hours;
    // Among long stretches no window beats the higher of the two that it touches.
    if (recent.every((each) => each.hours >= PEAK_H)) return;
    if (held < PEAK_H) return;
    this.peakW = Math.max(this.peakW, this.meanTo(held, held));
    let start = 0;
    for (const each of recent) {
      const end = start + PEAK_H;
      if (end > held - hours && end <= held) this.peakW = Math.max(this.peakW, this.meanTo(end, held));
      start += each.hours;
    }
  }

  /** Mean over the five minutes that end so many hours after the first stretch kept began. */
  private meanTo(endH: number, heldH: number): number {
    let sumWh = 0;
    let start = 0;
    for (const { hours, powerW } of this.recent) {
      const from = Math.max(start, endH - PEAK_H);
      const to = Math.min(start + hours, endH, heldH);
      sumWh += Math.max(0, to - from) * powerW;
      start += hours;
    }
    return sumWh / PEAK_H;
  }

  result(): number {
    return this.peakW;
  }
}
