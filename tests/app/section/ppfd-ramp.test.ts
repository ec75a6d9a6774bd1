import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import {
  hexToLab,
  RAMP_TINTS,
  rampHex,
  rampHexAt,
  rampPosition,
  rampPpfd,
  rampProperties,
  rampTint,
  tintHex,
  tintInkHex,
  type RampTheme,
} from '@/app/_components/ppfd-ramp';

const themes: RampTheme[] = ['limewash', 'cellar'];

/** Relative luminance and contrast as WCAG 2.2 defines them. */
function contrast(one: string, other: string): number {
  const luminance = (hex: string) => {
    const [r, g, b] = [1, 3, 5].map((at) => {
      const c = parseInt(hex.slice(at, at + 2), 16) / 255;
      return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
    }) as [number, number, number];
    return 0.2126 * r + 0.7152 * g + 0.0722 * b;
  };
  const [high, low] = [luminance(one), luminance(other)].sort((p, q) => q - p) as [number, number];
  return (high + 0.05) / (low + 0.05);
}

describe('the PPFD ramp', () => {
  it('gives CIELAB as published for sRGB primaries (Lindbloom, D65: red 53.24 80.09 67.20; blue 32.30 79.19 -107.86)', () => {
    const red = hexToLab('#ff0000');
    const blue = hexToLab('#0000ff');
    // Lindbloom prints two decimals.
    [53.24, 80.09, 67.2].forEach((value, i) => expect(red[i]).toBeCloseTo(value, 1));
    [32.3, 79.19, -107.86].forEach((value, i) => expect(blue[i]).toBeCloseTo(value, 1));
  });

  it.each(themes)('only rises in CIELAB L* from dim to bright (%s)', (theme) => {
    const lightness = Array.from({ length: 257 }, (_, i) => hexToLab(rampHexAt(i / 256, theme))[0]);
    // A step of one in 255 of a channel moves L* by up to about 0.25.
    lightness.slice(1).forEach((l, i) => expect(l).toBeGreaterThan(lightness[i]! - 0.25));
    expect(lightness.at(-1)! - lightness[0]!).toBeGreaterThan(30);
  });

  it.each(themes)('rises in L* from tint to tint without any tolerance (%s)', (theme) => {
    const lightness = Array.from({ length: RAMP_TINTS }, (_, tint) => hexToLab(tintHex(tint, theme))[0]);
    lightness.slice(1).forEach((l, i) => expect(l).toBeGreaterThan(lightness[i]!));
  });

  it.each(themes)('keeps text on every tint at 4.5 to 1 or better, as WCAG 2.2 asks (%s)', (theme) => {
    for (let tint = 0; tint < RAMP_TINTS; tint += 1) {
      expect(contrast(tintHex(tint, theme), tintInkHex(tint, theme))).toBeGreaterThanOrEqual(4.5);
    }
  });

  it('stands at the square root of PPFD over 800 and stops at 800', () => {
    expect(rampPosition(200)).toBe(0.5);
    expect(rampPosition(800)).toBe(1);
    expect(rampPosition(1200)).toBe(1);
    expect(rampPosition(0)).toBe(0);
    expect(rampPpfd(rampPosition(333))).toBeCloseTo(333, 10);
    expect(rampHex(900, 'cellar')).toBe('#fff6db');
    expect(rampTint(5000)).toBe(RAMP_TINTS - 1);
  });

  it('is the same in the style sheet as in the code', () => {
    const css = readFileSync('app/_components/ppfd-ramp.css', 'utf8');
    const block = (start: string) => css.slice(css.indexOf(start)).split('}')[0]!;
    rampProperties('limewash').forEach((line) => expect(block(':root {')).toContain(line));
    rampProperties('cellar').forEach((line) => {
      expect(block(":root[data-theme='cellar']")).toContain(line);
      expect(block(":root:not([data-theme='limewash'])")).toContain(line);
    });
  });
});
