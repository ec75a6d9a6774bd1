import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { labelStair, textWidthPx, type StairPiece } from '@/app/_components/chart/label-stair';

const widthPx = 900;

const pieces = fc
  .array(
    fc.record({
      sharePx: fc.double({ min: 0, max: 260, noNaN: true }),
      label: fc.string({ minLength: 3, maxLength: 26 }),
    }),
    {
      minLength: 1,
      maxLength: 6,
    },
  )
  .map((list) => {
    let at = 0;
    return list.map(({ sharePx, label }) => {
      const piece = { startPx: at, endPx: at + sharePx, label };
      at += sharePx;
      return piece;
    });
  });

describe('labelStair', () => {
  it('leaves a label on its bar where it has room', () => {
    const labels = labelStair({
      widthPx,
      pieces: [
        { startPx: 0, endPx: 400, label: '826 W through the fabric' },
        { startPx: 400, endPx: 800, label: '61 W into the floor' },
      ],
    });
    expect(labels.map((label) => label.level)).toEqual([0, 0]);
  });

  it('lifts a label that would run into its neighbour', () => {
    const labels = labelStair({
      widthPx,
      pieces: [
        { startPx: 0, endPx: 10, label: '5 W into the floor' },
        { startPx: 10, endPx: 500, label: '826 W through the fabric' },
      ],
    });
    expect(labels.map((label) => label.level)).toEqual([1, 0]);
  });

  const spansOf = (list: StairPiece[]) =>
    labelStair({ pieces: list, widthPx }).map(({ level, leaderPx, textPx, anchor }, index) => {
      const words = textWidthPx(list[index]!.label);
      const from = anchor === 'start' ? textPx : textPx - words;
      return { level, leaderPx, from, to: from + words };
    });

  it('turns round at the right edge: words end at their piece, and no leader runs through words', () => {
    const list = [
      { startPx: 0, endPx: 800, label: '440 through the fabric' },
      { startPx: 800, endPx: 850, label: '32 into the floor' },
      { startPx: 850, endPx: 870, label: '6 in changed air' },
      { startPx: 870, endPx: 895, label: '12 in water vapour' },
    ];
    const labels = labelStair({ pieces: list, widthPx });
    expect(labels.map(({ level, anchor }) => [level, anchor])).toEqual([
      [0, 'start'],
      [0, 'end'],
      [1, 'end'],
      [2, 'end'],
    ]);
    for (const { to, from } of spansOf(list)) {
      expect(from).toBeGreaterThanOrEqual(0);
      expect(to).toBeLessThanOrEqual(widthPx);
    }
  });

  it('never lets two labels on one level meet, nor a leader run through words', () => {
    fc.assert(
      fc.property(pieces, (list) => {
        const spans = spansOf(list);
        const turned = labelStair({ pieces: list, widthPx }).some(({ anchor }) => anchor === 'end');
        return spans.every((a, i) =>
          spans.every((b, j) => {
            if (i === j) return true;
            const crossed = b.level < a.level && a.leaderPx > b.from && a.leaderPx < b.to;
            return (a.level !== b.level || a.to <= b.from || b.to <= a.from) && (turned || !crossed);
          }),
        );
      }),
      { numRuns: 2000 },
    );
  });
});
