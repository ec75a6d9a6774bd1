/** Reads RFC 4180 text with a head into records. The reference files are ours; a broken one is a fault to be told at start. */
export function parseCsv(text: string): Record<string, string>[] {
  const rows: string[][] = [];
  let row: string[] = [];
  let cell = '';
  let quoted = false;
  for (let i = 0; i < text.length; i += 1) {
    const letter = text[i]!;
    if (quoted) {
      if (letter === '"' && text[i + 1] === '"') {
        cell += '"';
        i += 1;
      } else if (letter === '"') quoted = false;
      else cell += letter;
    } else if (letter === '"') quoted = true;
    else if (letter === ',') {
      row.push(cell);
      cell = '';
    } else if (letter === '\n') {
      row.push(cell);
      rows.push(row);
      row = [];
      cell = '';
    } else if (letter !== '\r') cell += letter;
  }
  if (cell !== '' || row.length > 0) rows.push([...row, cell]);
  const [head = [], ...body] = rows;
  return body.filter((each) => each.length > 1).map((each) => Object.fromEntries(head.map((name, at) => [name, each[at] ?? ''])));
}
