const VULGAR: Record<string, string> = {
  '¼': '0.25',
  '½': '0.5',
  '¾': '0.75',
  '⅓': '0.333333333333',
  '⅔': '0.666666666667',
  '⅛': '0.125',
  '⅜': '0.375',
  '⅝': '0.625',
  '⅞': '0.875',
};

/**
 * A number as people type it: `2.4`, `2,4`, `1 234,5`, `1,234.5`, `½`, `7 1/2`; null when it is none.
 *
 * One comma followed by exactly three digits is read as a thousand ("1,200 W" is twelve hundred); any other single comma
 * is a decimal comma.
 */
export function parseNumber(text: string): number | null {
  let plain = text.trim().replaceAll('−', '-').replaceAll(/\s/g, ' ');
  const fraction = /^([+-]?)(?:(\d+) )?(\d+)\/(\d+)$/.exec(plain);
  if (fraction) {
    const [, sign, whole, over, under] = fraction;
    if (Number(under) === 0) return null;
    const value = Number(whole ?? 0) + Number(over) / Number(under);
    return sign === '-' ? -value : value;
  }
  const vulgar = /^([+-]?\d*) ?([¼½¾⅓⅔⅛⅜⅝⅞])$/.exec(plain);
  if (vulgar) {
    const whole = vulgar[1] === '' ? 0 : Number(vulgar[1]);
    return whole + Math.sign(whole || 1) * Number(VULGAR[vulgar[2]!]);
  }
  plain = plain.replaceAll(/(?<=\d)[ '’](?=\d{3}(\D|$))/g, '');
  const commas = plain.split(',').length - 1;
  const points = plain.split('.').length - 1;
  if (commas > 0 && points > 0) {
    plain =
      plain.lastIndexOf(',') > plain.lastIndexOf('.')
        ? plain.replaceAll('.', '').replace(',', '.')
        : plain.replaceAll(',', '');
  } else if (commas > 1 || (commas === 1 && /^[+-]?[1-9]\d{0,2},\d{3}$/.test(plain))) {
    plain = plain.replaceAll(',', '');
  } else {
    plain = plain.replace(',', '.');
  }
  if (!/^[+-]?(\d+\.?\d*|\.\d+)$/.test(plain)) return null;
  const value = Number(plain);
  return Number.isFinite(value) ? value : null;
}
