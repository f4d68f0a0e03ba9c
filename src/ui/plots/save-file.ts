export function saveBlob(blob: Blob, fileName: string): void {
  const url = URL.createObjectURL(blob);
  follow(url, fileName);
  setTimeout(() => URL.revokeObjectURL(url), 10_000);
}

export function saveText(text: string, fileName: string, type: string): void {
  saveBlob(new Blob([text], { type: `${type};charset=utf-8` }), fileName);
}

export function follow(url: string, fileName: string): void {
  const link = document.createElement('a');
  link.href = url;
  link.download = fileName;
  link.click();
}
