/** Hands a text to the person as a file of this name. */
export function download(fileName: string, type: string, text: string): void {
  downloadBlob(fileName, new Blob([text], { type: `${type};charset=utf-8` }));
}

/** Hands anything else, such as a picture, to the person as a file of this name. */
export function downloadBlob(fileName: string, blob: Blob): void {
  const url = URL.createObjectURL(blob);
  const link = document.createElement('a');
  link.href = url;
  link.download = fileName;
  link.click();
  URL.revokeObjectURL(url);
}
