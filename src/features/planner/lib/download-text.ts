const BOM = '\uFEFF';

/** Hands the browser a text as a file; with the mark by which spreadsheets know that it is UTF-8. */
export function downloadCsv(fileName: string, text: string): void {
  const address = URL.createObjectURL(new Blob([BOM, text], { type: 'text/csv;charset=utf-8' }));
  const link = document.createElement('a');
  link.href = address;
  link.download = fileName;
  link.click();
  // The download has its own hold on the data once it has begun.
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
