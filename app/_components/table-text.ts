import { isValidElement, type ReactNode } from 'react';

/** The words of a cell, as copied and as saved. */
export function plainText(node: ReactNode): string {
  if (node === null || node === undefined || typeof node === 'boolean') return '';
  if (typeof node === 'string' || typeof node === 'number') return String(node);
  if (Array.isArray(node)) return node.map(plainText).join('');
  if (!isValidElement(node)) return '';
  const props = node.props as { text?: unknown; children?: ReactNode };
  return typeof props.text === 'string' ? props.text : plainText(props.children);
}

/** A number written for people, as a number: thin spaces out, true minus in. */
export function numberIn(text: string): number | null {
  const match = /^\s*([−-]?[\d\u2009\u202f\u00a0 ]*\.?\d+)/.exec(text);
  if (!match) return null;
  const value = Number(match[1]!.replaceAll(/[\u2009\u202f\u00a0 ]/g, '').replace('−', '-'));
  return Number.isFinite(value) ? value : null;
}

/** A cell that begins with a sign of a formula would be computed by a spreadsheet; a plain number is let be. */
function guarded(text: string): string {
  return /^[=+@\t\r]/.test(text) || (/^-/.test(text) && !/^-[\d.]+$/.test(text)) ? `'${text}` : text;
}

/** A number alone in its cell loses the spaces between its thousands. */
const ungrouped = (text: string): string =>
  /^-?\d{1,3}([\u2009\u202f\u00a0 ]\d{3})+(\.\d+)?$/.test(text) ? text.replaceAll(/[\u2009\u202f\u00a0 ]/g, '') : text;

/** RFC 4180: comma, CRLF, quotes doubled. */
export function toCsv(rows: readonly (readonly string[])[]): string {
  const cell = (raw: string) => {
    const text = guarded(ungrouped(raw.replaceAll('−', '-')));
    return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
  };
  return rows.map((row) => row.map(cell).join(',')).join('\r\n') + '\r\n';
}

export const toTabs = (rows: readonly (readonly string[])[]): string =>
  rows.map((row) => row.map((cell) => cell.replaceAll(/[\t\n]/g, ' ')).join('\t')).join('\n');
