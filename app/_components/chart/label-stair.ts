/** Lexend at 12 px runs about this wide for each character; measured on its regular cut, rounded up. */
const CHARACTER_PX = 6.9;

export function textWidthPx(text: string, sizePx = 12): number {
  return text.length * CHARACTER_PX * (sizePx / 12);
}

export interface StairPiece {
  startPx: number;
  endPx: number;
  label: string;
}

export interface StairLabel {
  /** 0 stands directly on the bar; each level is one line higher. */
  level: number;
  /** Where the words begin. */
  xPx: number;
}

/**
 * Places one label over each piece of a bar, so that neither words nor leaders meet.
 *
 * Laid from right to left: a label that is wider than its piece climbs one step above the highest label that it would
 * run into, so that its leader, which rises at the left end of its piece, never crosses words.
 */
export function labelStair({ pieces, widthPx }: { pieces: readonly StairPiece[]; widthPx: number }): StairLabel[] {
  const placed: (StairLabel & { endPx: number })[] = [];
  for (let index = pieces.length - 1; index >= 0; index -= 1) {
    const piece = pieces[index]!;
    const wordsPx = textWidthPx(piece.label) + 8;
    const xPx = Math.max(0, Math.min(piece.startPx, widthPx - wordsPx));
    const met = placed.filter((other) => other.xPx < xPx + wordsPx && other.endPx > xPx);
    const level = met.length === 0 ? 0 : Math.max(...met.map((other) => other.level)) + 1;
    placed.push({ level, xPx, endPx: xPx + wordsPx });
  }
  return placed.reverse().map(({ level, xPx }) => ({ level, xPx }));
}
