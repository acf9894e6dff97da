/** Cells of a table as a spreadsheet puts it on the clipboard: tabs, line ends, quoted cells. */
export function readTable(text: string): string[][] {
  const rows: string[][] = [];
  let row: string[] = [];
  let cell = '';
  let quoted = false;
  const separator = text.includes('\t') ? '\t' : text.includes(';') ? ';' : '\t';
  const endCell = () => {
    row.push(cell.replace(/\s+/g, ' ').trim());
    cell = '';
  };
  const endRow = () => {
    endCell();
    if (row.some((value) => value !== '')) rows.push(row);
    row = [];
  };
  for (let at = 0; at < text.length; at += 1) {
    const sign = text[at] ?? '';
    if (quoted) {
      if (sign !== '"') cell += sign;
      else if (text[at + 1] === '"') {
        cell += '"';
        at += 1;
      } else quoted = false;
    } else if (sign === '"' && cell === '') quoted = true;
    else if (sign === separator) endCell();
    else if (sign === '\n') endRow();
    else if (sign !== '\r') cell += sign;
  }
  endRow();
  return rows;
}
