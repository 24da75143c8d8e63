/**
 * A table as CSV (RFC 4180) for spreadsheets: quoted where needed, CRLF, and a text that a spreadsheet would take for a
 * formula (it begins with = + - @, a tab or a return) gets an apostrophe before it. Figures stay figures.
 */
export function csv(rows: readonly (readonly (string | number | null)[])[]): string {
  return rows.map((row) => row.map(cell).join(',')).join('\r\n') + '\r\n';
}

function cell(value: string | number | null): string {
  if (value === null) return '';
  if (typeof value === 'number') return Number.isFinite(value) ? String(value) : '';
  const safe =
    /^[=+\-@\t\r\n]/.test(value) && !/^[-+]?\d+([.,]\d+)?$/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
