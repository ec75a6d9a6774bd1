import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leader, placeBlocks } from '@/app/_components/section/annotation-layout';
import { paddedField, paintField } from '@/app/_components/section/field-contours';
import { heatWidthPx } from '@/app/_components/section/heat-arrow';
import { labelIsolines } from '@/app/_components/section/isoline-labels';
import { lampGroups } from '@/app/_components/section/lamp-groups';
import { convexHull, hangsFromM, lampOutline } from '@/app/_components/section/lamp-outline';
import { bandPpfd, stripForm, stripProfile, stripTopPpfd, stripY } from '@/app/_components/section/light-strip';
import { plantHabit, plantPaths } from '@/app/_components/section/plants';
import { acrossAtPx, sectionFrame, sectionPxPerM, upAtPx, xPx, yPx } from '@/app/_components/section/section-frame';
import { tierName, tierNameInside } from '@/app/_components/section/tier-names';
import { twoTierTent } from './two-tier-tent';

const room = { maxWidthPx: 420, maxHeightPx: 620, centrePx: 720, floorPx: 722 };
const front = sectionFrame(twoTierTent.tent, 'front', room);

describe('the scale of the section', () => {
  it('lets width or height decide, whichever asks for less', () => {
    expect(sectionPxPerM({ widthM: 2.4, depthM: 1.2, heightM: 2 }, room)).toBe(175);
    expect(sectionPxPerM({ widthM: 0.6, depthM: 0.6, heightM: 2 }, room)).toBe(310);
  });

  it('keeps floor and centre line for every tent and both views', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.3, max: 6, noNaN: true }),
        fc.double({ min: 0.3, max: 6, noNaN: true }),
        (w, h) => {
          for (const view of ['front', 'side'] as const) {
            const frame = sectionFrame({ widthM: w, depthM: w * 0.8, heightM: h }, view, room);
            expect(xPx(frame, frame.acrossM / 2)).toBeCloseTo(720, 6);
            expect(yPx(frame, 0)).toBe(722);
            expect(frame.acrossM * frame.pxPerM).toBeLessThanOrEqual(560);
            expect(h * frame.pxPerM).toBeLessThanOrEqual(620 + 1e-6);
          }
        },
      ),
    );
  });

  it('turns pixels back into the metres they came from', () => {
    expect(acrossAtPx(front, xPx(front, 0.37))).toBeCloseTo(0.37, 10);
    expect(upAtPx(front, yPx(front, 1.21))).toBeCloseTo(1.21, 10);
  });
});

describe('sentences beside the drawing', () => {
  const block = fc.record({
    wantedTopPx: fc.double({ min: 0, max: 700, noNaN: true }),
    heightPx: fc.double({ min: 12, max: 160, noNaN: true }),
  });

  it('never overlap, whatever they want and however tall they are', () => {
    fc.assert(
      fc.property(fc.array(block, { maxLength: 12 }), (wants) => {
        const placed = placeBlocks(
          wants.map((want, i) => ({ id: String(i), ...want })),
          { topPx: 40, bottomPx: 700, gapPx: 12 },
        );
        placed.slice(1).forEach((next, i) => {
          const above = placed[i]!;
          expect(next.topPx).toBeGreaterThanOrEqual(above.topPx + above.heightPx + 12 - 1e-6);
        });
        expect(placed.every((one) => one.topPx >= 40 - 1e-6)).toBe(true);
      }),
    );
  });

  it('stand in the order of their things, and inside the column while there is room', () => {
    const placed = placeBlocks(
      [
        { id: 'c', wantedTopPx: 650, heightPx: 90 },
        { id: 'a', wantedTopPx: 100, heightPx: 40 },
        { id: 'b', wantedTopPx: 120, heightPx: 40 },
      ],
      { topPx: 0, bottomPx: 700, gapPx: 12 },
    );
    expect(placed.map((one) => one.id)).toEqual(['a', 'b', 'c']);
    expect(placed.map((one) => one.topPx)).toEqual([100, 152, 610]);
  });

  it('leave alone what does not meet', () => {
    const placed = placeBlocks([{ id: 'a', wantedTopPx: 300, heightPx: 20 }], { topPx: 0, bottomPx: 700, gapPx: 12 });
    expect(placed[0]!.topPx).toBe(300);
  });

  it('are tied by leaders that leave level and bend once', () => {
    const line = leader({ side: 'right', fromPx: [976, 300], toPx: [880, 350], bendPx: 944 });
    expect(line.points).toEqual([
      [976, 300],
      [944, 300],
      [880, 350],
    ]);
  });
});

describe('the painted field', () => {
  const nx = 30;
  const nz = 40;
  const cone = Array.from({ length: nx * nz }, (_, at) => {
    const i = at % nx;
    const k = Math.floor(at / nx);
    return Math.max(0, 700 - 40 * Math.hypot(i - 14.5, k - 30));
  });

  it('gives solid cells the value of the nearest open cell in their column', () => {
    const grid = { nx: 1, nz: 5, ppfdUmolM2S: [10, NaN, NaN, NaN, 50] };
    const { values } = paddedField(grid);
    const column = [1, 2, 3, 4, 5].map((k) => values[k * 3 + 1]);
    expect(column).toEqual([10, 10, 50, 50, 50]);
  });

  it('puts the 300 line of a cone where the cone is 300: a circle of 10 cells', () => {
    const field = paintField({ nx, nz, ppfdUmolM2S: cone }, front);
    const line = field.lines.find((one) => one.value === 300)!;
    const cellX = (front.acrossM * front.pxPerM) / nx;
    const cellY = (front.heightM * front.pxPerM) / nz;
    const cx = front.leftPx + 15 * cellX;
    const cy = front.floorPx - 30.5 * cellY;
    for (const [x, y] of line.rings[0]!) {
      if (y < front.floorPx - front.heightM * front.pxPerM) continue;
      // Linear interpolation between cells of a curved field: off by a few hundredths of a cell.
      const radius = Math.hypot((x - cx) / cellX, (y - cy) / cellY);
      if (y > front.floorPx - front.heightM * front.pxPerM + cellY) expect(Math.abs(radius - 10)).toBeLessThan(0.1);
    }
  });

  it('labels lines on the paper, clear of things and of each other', () => {
    const field = paintField({ nx, nz, ppfdUmolM2S: cone }, front);
    const inside = { x0: 516, y0: 110, x1: 924, y1: 722 };
    const keepOut = [{ x0: 600, y0: 300, x1: 700, y1: 400 }];
    const labels = labelIsolines(field.lines, { inside, keepOut });
    expect(labels.length).toBeGreaterThan(2);
    labels.forEach((label, i) => {
      expect(label.x > 600 - 14 && label.x < 714 && label.y > 292 && label.y < 408).toBe(false);
      labels.slice(i + 1).forEach((other) => {
        const apart = Math.hypot(label.x - other.x, label.y - other.y);
        expect(apart).toBeGreaterThanOrEqual(label.value === other.value ? 150 : 58);
      });
    });
  });
});

describe('lamps in the section', () => {
  it('keep their true size: a 60 cm panel is 0.6 m of pixels wide', () => {
    const outline = lampOutline(twoTierTent.placements[0]!, twoTierTent.fixtures[0]!, front);
    expect(outline.rightPx - outline.leftPx).toBeCloseTo(0.6 * front.pxPerM, 6);
    expect(outline.bottomPx - outline.topPx).toBeCloseTo(0.04 * front.pxPerM, 6);
  });

  it('are grouped where they work as one, and parted on request', () => {
    const groups = lampGroups(twoTierTent);
    expect(groups.map((group) => group.lamps.map((lamp) => lamp.id))).toEqual([['lamp-1'], ['lamp-2', 'lamp-3']]);
    expect(groups[1]!.mirrored).toBe(true);
    expect(lampGroups(twoTierTent, new Set(['lamp-3']))).toHaveLength(3);
  });

  it('hang from the shelf above them, else from the roof', () => {
    expect(hangsFromM(twoTierTent.placements[1]!, twoTierTent.tiers, 1.8)).toBeCloseTo(1.09, 10);
    expect(hangsFromM(twoTierTent.placements[0]!, twoTierTent.tiers, 1.8)).toBe(1.8);
  });

  it('have the convex hull of their corners as outline', () => {
    const hull = convexHull([
      [0, 0],
      [4, 0],
      [4, 3],
      [0, 3],
      [2, 1],
    ]);
    expect(hull).toHaveLength(4);
  });
});

describe('the strip under a shelf', () => {
  const grid = { nx: 3, ny: 2, ppfdUmolM2S: [100, 200, 300, 120, 260, 340] };

  it('is the mean, lowest and highest over the depth (front) or the width (side)', () => {
    expect(stripProfile(grid, 'front')).toEqual({ mean: [110, 230, 320], low: [100, 200, 300], high: [120, 260, 340] });
    expect(stripProfile(grid, 'side').mean).toEqual([200, 240]);
  });

  it('shares one scale that the brightest tier fits in', () => {
    expect(stripTopPpfd([stripProfile(grid, 'front')])).toBe(400);
    expect(stripTopPpfd([{ mean: [500], low: [400], high: [650] }])).toBe(800);
    expect(stripY({ x0: 0, x1: 1, top: 10, height: 29, topPpfd: 400 }, 400)).toBe(10);
  });

  it('shrinks where there are less than 12 cm of free air, and to a bar in a small drawing', () => {
    expect(stripForm(0.3, 340)).toBe('full');
    expect(stripForm(0.11, 340)).toBe('small');
    expect(stripForm(0.3, 175)).toBe('bar');
  });

  it('turns 12 mol in 14 h into 238 µmol/m²/s (12 / (14 × 0.0036))', () => {
    expect(bandPpfd(12, 14)).toBeCloseTo(238.095, 3);
    expect(bandPpfd(12, 0)).toBeNull();
  });
});

describe('small things', () => {
  it('draw 100 W as 10 px and nothing thinner than 2 px', () => {
    expect(heatWidthPx(100)).toBeCloseTo(10, 12);
    expect(heatWidthPx(3)).toBe(2);
  });

  it('name tiers by their place where they have no name', () => {
    const tiers = [0.2, 0.6, 1.0, 1.4].map((topHeightM, i) => ({ id: String(i), topHeightM }));
    expect(tiers.map((tier) => tierName(tiers, tier.id))).toEqual([
      'Bottom tier',
      'Second tier',
      'Third tier',
      'Top tier',
    ]);
    expect(tierNameInside(tiers.slice(0, 2), '0')).toBe('the lower tier');
    expect(tierNameInside([{ id: 'a', name: 'Herbs', topHeightM: 1 }], 'a')).toBe('Herbs');
  });

  it('draw as many plants as there are sites across, none higher than the canopy', () => {
    const bed = { count: 6, x0: 550, x1: 890, shelfY: 400, leafY: 340 };
    for (const [crop, habit] of [
      ['Lettuce, butterhead', 'rosette'],
      ['Basil', 'herb'],
      ['Tomato', 'fruiting'],
      ['Chives', 'tuft'],
    ] as const) {
      expect(plantHabit(crop, 'production')).toBe(habit);
      const paths = plantPaths({ ...bed, habit });
      expect(paths.pots.match(/M/g)).toHaveLength(6);
      const ys = [...(paths.front + paths.back).matchAll(/[-\d.]+ ([-\d.]+)/g)].map((match) => Number(match[1]));
      expect(Math.min(...ys)).toBeGreaterThan(340 - 6);
    }
    expect(plantHabit('Tomato', 'seedling')).toBe('seedling');
  });
});
