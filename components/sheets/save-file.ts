/** ms a file stays in memory after it was handed over: the browser's own viewer reads it late. */
export const KEEP_MS = 120_000;

/** Saves something under an address of the browser as a file. */
export function saveAs(address: string, name: string): void {
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  document.body.append(link);
  link.click();
  link.remove();
}

/** Saves a text as a file. */
export function saveText(name: string, text: string, type: string): void {
  const address = URL.createObjectURL(new Blob([text], { type: `${type};charset=utf-8` }));
  saveAs(address, name);
  setTimeout(() => URL.revokeObjectURL(address), KEEP_MS);
}
