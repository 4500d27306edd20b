/** Hands a text to the browser as a file. The mark in front tells spreadsheets that it is UTF-8. */
export function downloadText(fileName: string, text: string): void {
  const url = URL.createObjectURL(new Blob(['\uFEFF', text], { type: 'text/csv;charset=utf-8' }));
  const link = document.createElement('a');
  link.href = url;
  link.download = fileName;
  link.click();
  URL.revokeObjectURL(url);
}
