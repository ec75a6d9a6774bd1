import { parseNumber } from './parse-number';

const RULES = {
  latitude: { most: 90, positive: 'N', negative: 'S', examples: '52.41, 52° 24′ 36″ N or S 33.9' },
  longitude: { most: 180, positive: 'E', negative: 'W', examples: '9.73, 9° 43′ 48″ E or W 80.2' },
} as const;

/** Degrees as a decimal or in degrees, minutes and seconds, with the letter of the hemisphere on either side. */
export function parseCoordinate(
  text: string,
  kind: keyof typeof RULES,
): { ok: true; value: number } | { ok: false; problem: string } {
  const rule = RULES[kind];
  const wrong = { ok: false, problem: `Type a ${kind} such as ${rule.examples}.` } as const;
  const letters = text.toUpperCase().match(/NORTH|SOUTH|EAST|WEST|[NSEW]/g) ?? [];
  if (letters.length > 1) return wrong;
  const hemisphere = letters[0]?.[0];
  if (hemisphere && hemisphere !== rule.positive && hemisphere !== rule.negative) return wrong;
  const figures = text
    .replaceAll(/north|south|east|west|[NSEW]/gi, ' ')
    .replaceAll('−', '-')
    .trim();
  const parts = figures.split(/[°′'’″"\s]+/).filter(Boolean);
  if (parts.length < 1 || parts.length > 3) return wrong;
  const numbers = parts.map(parseNumber);
  if (numbers.some((each) => each === null)) return wrong;
  const [degrees = 0, minutes = 0, seconds = 0] = numbers as number[];
  if (minutes < 0 || minutes >= 60 || seconds < 0 || seconds >= 60) return wrong;
  const negative = figures.startsWith('-') || hemisphere === rule.negative;
  const value = (Math.abs(degrees) + minutes / 60 + seconds / 3600) * (negative ? -1 : 1);
  if (Math.abs(value) > rule.most)
    return { ok: false, problem: `A ${kind} lies between −${rule.most}° and ${rule.most}°.` };
  return { ok: true, value };
}

/** 52.41 as "52.41° north". */
export function coordinateWords(value: number, kind: keyof typeof RULES): string {
  if (kind === 'latitude') return value < 0 ? 'south' : 'north';
  return value < 0 ? 'west' : 'east';
}
