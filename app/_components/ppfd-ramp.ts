/**
 * The one colour scale for PPFD: dark is dim and bright is bright, in both themes.
 * Position on the scale is √(PPFD / 800); colours are interpolated in CIELAB (D65).
 */

export type RampTheme = 'limewash' | 'cellar';
type Triple = readonly [number, number, number];

/** What is brighter than this is painted as this, and said to be over it. */
export const RAMP_TOP_PPFD = 800;
export const RAMP_TINTS = 23;
/** Isolines are drawn at these round values; those in `HEAVY_LINES` are a little stronger. */
export const ISOLINES = [50, 100, 150, 200, 300, 400, 600] as const;
export const HEAVY_LINES: ReadonlySet<number> = new Set([100, 200, 400]);

const STOPS: Record<RampTheme, readonly (readonly [t: number, hex: string])[]> = {
  limewash: [
    [0, '#a5a098'],
    [0.22, '#bfae9a'],
    [0.45, '#e9c28a'],
    [0.7, '#ffdf96'],
    [1, '#fffbe9'],
  ],
  cellar: [
    [0, '#1b2326'],
    [0.22, '#513128'],
    [0.45, '#9f4f2e'],
    [0.7, '#e6a042'],
    [1, '#fff6db'],
  ],
};

/** White point D65, 2° observer (CIE 15). */
const WHITE: Triple = [0.95047, 1, 1.08883];

const toLinear = (c: number) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4);
const toGamma = (c: number) => (c <= 0.0031308 ? c * 12.92 : 1.055 * c ** (1 / 2.4) - 0.055);
const forward = (t: number) => (t > (6 / 29) ** 3 ? Math.cbrt(t) : t / (3 * (6 / 29) ** 2) + 4 / 29);
const inverse = (t: number) => (t > 6 / 29 ? t ** 3 : 3 * (6 / 29) ** 2 * (t - 4 / 29));

export function hexToLab(hex: string): Triple {
  const [r, g, b] = [1, 3, 5].map((at) => toLinear(parseInt(hex.slice(at, at + 2), 16) / 255)) as [
    number,
    number,
    number,
  ];
  const x = forward((0.4124564 * r + 0.3575761 * g + 0.1804375 * b) / WHITE[0]);
  const y = forward((0.2126729 * r + 0.7151522 * g + 0.072175 * b) / WHITE[1]);
  const z = forward((0.0193339 * r + 0.119192 * g + 0.9503041 * b) / WHITE[2]);
  return [116 * y - 16, 500 * (x - y), 200 * (y - z)];
}

export function labToHex([l, a, b]: Triple): string {
  const fy = (l + 16) / 116;
  const x = WHITE[0] * inverse(fy + a / 500);
  const y = WHITE[1] * inverse(fy);
  const z = WHITE[2] * inverse(fy - b / 200);
  const rgb = [
    3.2404542 * x - 1.5371385 * y - 0.4985314 * z,
    -0.969266 * x + 1.8760108 * y + 0.041556 * z,
    0.0556434 * x - 0.2040259 * y + 1.0572252 * z,
  ];
  const byte = (c: number) => Math.round(Math.min(1, Math.max(0, toGamma(c))) * 255);
  return `#${rgb.map((c) => byte(c).toString(16).padStart(2, '0')).join('')}`;
}

/** Where a PPFD stands on the scale, 0..1. */
export function rampPosition(ppfdUmolM2S: number): number {
  return Math.min(1, Math.sqrt(Math.max(0, ppfdUmolM2S) / RAMP_TOP_PPFD));
}

/** The PPFD at a place on the scale. */
export function rampPpfd(position: number): number {
  return position * position * RAMP_TOP_PPFD;
}

export function rampHexAt(position: number, theme: RampTheme): string {
  const stops = STOPS[theme];
  const t = Math.min(1, Math.max(0, position));
  const upper = Math.max(
    1,
    stops.findIndex(([at]) => at >= t),
  );
  const [t0, hex0] = stops[upper - 1]!;
  const [t1, hex1] = stops[upper]!;
  const share = (t - t0) / (t1 - t0);
  const from = hexToLab(hex0);
  const to = hexToLab(hex1);
  return labToHex([0, 1, 2].map((i) => from[i]! + (to[i]! - from[i]!) * share) as unknown as Triple);
}

/** The continuous colour of a PPFD. */
export function rampHex(ppfdUmolM2S: number, theme: RampTheme): string {
  return rampHexAt(rampPosition(ppfdUmolM2S), theme);
}

/** Which of the painted tints a PPFD falls in. */
export function rampTint(ppfdUmolM2S: number): number {
  return Math.min(RAMP_TINTS - 1, Math.floor(rampPosition(ppfdUmolM2S) * RAMP_TINTS));
}

/** A tint's colour: that of its middle. */
export function tintHex(tint: number, theme: RampTheme): string {
  return rampHexAt((tint + 0.5) / RAMP_TINTS, theme);
}

/** Text on a tint: ink on limewash; in the cellar near-white below L* 50, near-black above. */
export function tintInkHex(tint: number, theme: RampTheme): string {
  if (theme === 'limewash') return '#1e2629';
  return hexToLab(tintHex(tint, theme))[0] < 50 ? '#fffdf8' : '#0b0d0e';
}

/** The PPFD from which a tint is painted. */
export function tintFloorPpfd(tint: number): number {
  return rampPpfd(tint / RAMP_TINTS);
}

/** For drawings that follow the page's theme (`ppfd-ramp.css`). */
export const tintVar = (tint: number): string => `var(--ramp-${tint})`;
export const tintInkVar = (tint: number): string => `var(--ramp-ink-${tint})`;
export const rampVar = (ppfdUmolM2S: number): string => tintVar(rampTint(ppfdUmolM2S));

/** The custom properties of one theme, as `ppfd-ramp.css` holds them. */
export function rampProperties(theme: RampTheme): string[] {
  const tints = Array.from({ length: RAMP_TINTS }, (_, tint) => tint);
  return [
    ...tints.map((tint) => `--ramp-${tint}: ${tintHex(tint, theme)};`),
    ...tints.map((tint) => `--ramp-ink-${tint}: ${tintInkHex(tint, theme)};`),
  ];
}
