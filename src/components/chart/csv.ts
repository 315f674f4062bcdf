/** One table as comma-separated text: quoted where needed, CRLF line ends, as spreadsheets expect. */
export function toCsv(head: string[], rows: (string | number)[][]): string {
  const cell = (value: string | number) => {
    const written = String(value);
    return /[",\r\n]/.test(written) ? `"${written.replaceAll('"', '""')}"` : written;
  };
  return [head, ...rows].map((row) => row.map(cell).join(",")).join("\r\n");
}

/** Offers text as a file. The byte-order mark makes spreadsheets read m² and ° rightly. */
export function downloadCsv(fileName: string, csv: string): void {
  const address = URL.createObjectURL(new Blob([`\ufeff${csv}`], { type: "text/csv;charset=utf-8" }));
  const link = document.createElement("a");
  link.href = address;
  link.download = fileName;
  link.click();
  URL.revokeObjectURL(address);
}
