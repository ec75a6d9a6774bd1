const MINUS = '−';
const THIN_SPACE = '\u202f';

/** A number as people read it: a true minus, thin spaces in thousands, and just so many digits. */
export function figureText(value: number, digits: number): string {
  const fixed = Math.abs(value).toFixed(Math.max(0, Math.min(digits, 12)));
  const [whole = '0', rest] = fixed.split('.');
  const grouped = whole.length > 3 ? whole.replace(/\B(?=(\d{3})+(?!\d))/g, THIN_SPACE) : whole;
  const negative = value < 0 && Number(fixed) !== 0;
  return `${negative ? MINUS : ''}${grouped}${rest ? `.${rest}` : ''}`;
}

/** A difference always carries its sign; what rounds to nothing is "same". */
export function differenceText(value: number, digits: number): string {
  if (Number(value.toFixed(digits)) === 0) return 'same';
  return value > 0 ? `+${figureText(value, digits)}` : figureText(value, digits);
}
