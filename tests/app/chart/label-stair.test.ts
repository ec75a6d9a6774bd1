import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { labelStair, textWidthPx } from '@/app/_components/chart/label-stair';

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

  it('never lets two labels on one level meet', () => {
    fc.assert(
      fc.property(pieces, (list) => {
        const labels = labelStair({ pieces: list, widthPx });
        const spans = labels.map((label, index) => ({
          level: label.level,
          from: label.xPx,
          to: label.xPx + textWidthPx(list[index]!.label),
        }));
        return spans.every((a, i) =>
          spans.every((b, j) => i === j || a.level !== b.level || a.to <= b.from || b.to <= a.from),
        );
      }),
      { numRuns: 2000 },
    );
  });
});
