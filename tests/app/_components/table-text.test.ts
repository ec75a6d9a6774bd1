import { createElement } from 'react';
import { describe, expect, it } from 'vitest';
import { numberIn, plainText, toCsv, toTabs } from '@/app/_components/table-text';
import { figureText } from '@/lib/format/figure';
import { Num } from '@/app/_components/num';

describe('a table as CSV', () => {
  it('quotes commas, quotes and line ends and ends each line with CRLF (RFC 4180, section 2)', () => {
    expect(toCsv([['a,b', 'say "so"', 'two\nlines']])).toBe('"a,b","say ""so""","two\nlines"\r\n');
  });

  it('never lets a cell be computed by a spreadsheet (OWASP, CSV injection: = + - @ tab carriage return)', () => {
    for (const sign of ['=', '+', '@', '\t', '\r']) expect(toCsv([[`${sign}cmd`]])).toContain(`'${sign}cmd`);
    expect(toCsv([['-2+3']])).toBe("'-2+3\r\n");
  });

  it('writes a true minus and thin spaces so that a spreadsheet reads a number', () => {
    expect(toCsv([[figureText(-1240.5, 1)]])).toBe('-1240.5\r\n');
  });

  it('keeps one row to a line when copied', () => {
    expect(toTabs([['a\tb', 'c\nd']])).toBe('a b\tc d');
  });
});

describe('the words of a cell', () => {
  it('takes a figure in digit cells as its plain number', () => {
    expect(plainText(createElement('span', null, createElement(Num, { text: '12.3' }), ' mol'))).toBe('12.3 mol');
  });

  it('reads what people write as a number, so that columns sort by size', () => {
    expect(numberIn('−4.5 °C')).toBe(-4.5);
    expect(numberIn(`${figureText(1516, 0)} kWh`)).toBe(1516);
    expect(numberIn('below')).toBeNull();
  });
});
