interface Bracket {
  low: number;
  lowError: number;
  high: number;
  highError: number;
}

/**
 * Where an error that is negative at `low` and positive at `high` passes through zero: regula falsi after Illinois.
 *
 * An end that stays twice has its error halved, so that the search never creeps. Where the error jumps instead of passing
 * through zero, the place of the jump is returned.
 *
 * @param tolerance of the error
 * @returns the place
 * @source Dowell & Jarratt 1971, BIT 11:168–174 (recalled)
 */
export function bracketedRoot(
  errorAt: (x: number) => number,
  { low, lowError, high, highError }: Bracket,
  tolerance: number,
): number {
  let stayed = 0;
  for (let i = 0; i < 200; i += 1) {
    // Every fourth step halves, so that a jump is closed in on as well.
    const middle = i % 4 === 3 ? (low + high) / 2 : (low * highError - high * lowError) / (highError - lowError);
    const error = errorAt(middle);
    if (Math.abs(error) <= tolerance || high - low <= 1e-13 * Math.max(1, Math.abs(high))) return middle;
    if (error < 0) {
      low = middle;
      lowError = error;
      if (stayed === 1) highError /= 2;
      stayed = 1;
    } else {
      high = middle;
      highError = error;
      if (stayed === -1) lowError /= 2;
      stayed = -1;
    }
  }
  return (low + high) / 2;
}
