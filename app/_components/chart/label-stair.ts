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
  /** Where the leader rises from the bar, for levels above 0. */
  leaderPx: number;
  /** Where the words begin, or end. */
  textPx: number;
  anchor: 'start' | 'end';
}

type Placed = StairLabel & { fromPx: number; toPx: number };

/** From words to leader. */
const GAP_PX = 8;

function put(fromPx: number, wordsPx: number, anchor: 'start' | 'end', placed: readonly Placed[]): Placed {
  const toPx = fromPx + wordsPx;
  const met = placed.filter((other) => other.fromPx < toPx && other.toPx > fromPx);
  const level = met.length === 0 ? 0 : Math.max(...met.map((other) => other.level)) + 1;
  const gapPx = level > 0 ? GAP_PX : 1;
  return anchor === 'start'
    ? { level, fromPx, toPx, anchor, leaderPx: fromPx + 1, textPx: fromPx + gapPx }
    : { level, fromPx, toPx, anchor, leaderPx: toPx - 1, textPx: toPx - gapPx };
}

/**
 * Places one label over each piece of a bar, so that neither words nor leaders meet.
 *
 * A label that fits stands on its piece. The others are laid from right to left: each climbs one step above the highest
 * label that it would run into, so that its leader, which rises at the left end of its piece, never crosses words. Where
 * words would run out at the right edge the stair turns round: they end at the right end of their piece.
 */
export function labelStair({ pieces, widthPx }: { pieces: readonly StairPiece[]; widthPx: number }): StairLabel[] {
  const wordsPx = pieces.map((piece) => textWidthPx(piece.label) + GAP_PX);
  const fits = (at: number) => wordsPx[at]! <= pieces[at]!.endPx - pieces[at]!.startPx;
  const turn = pieces.findIndex((piece, at) => !fits(at) && piece.startPx + wordsPx[at]! > widthPx);
  const turned = turn < 0 ? pieces.length : turn;
  const labels: Placed[] = [];
  pieces.forEach((piece, at) => {
    if (fits(at)) labels[at] = put(piece.startPx, wordsPx[at]!, 'start', []);
  });
  for (let at = turned; at < pieces.length; at += 1)
    if (!labels[at]) labels[at] = put(Math.max(0, pieces[at]!.endPx - wordsPx[at]!), wordsPx[at]!, 'end', labels);
  for (let at = turned - 1; at >= 0; at -= 1)
    if (!labels[at]) labels[at] = put(pieces[at]!.startPx, wordsPx[at]!, 'start', labels);
  return labels.map(({ level, leaderPx, textPx, anchor }) => ({ level, leaderPx, textPx, anchor }));
}
