/** Hands a text to the browser as a file to be saved. The byte order mark tells spreadsheets that it is UTF-8. */
export function saveText(fileName: string, mediaType: string, text: string): void {
  const address = URL.createObjectURL(new Blob(['\ufeff', text], { type: `${mediaType};charset=utf-8` }));
  const link = document.createElement('a');
  link.href = address;
  link.download = fileName;
  link.click();
  URL.revokeObjectURL(address);
}
