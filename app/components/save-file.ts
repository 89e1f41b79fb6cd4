/** Hands a text to the reader as a file, made in the browser from what the page holds already. */
export function saveFile(name: string, type: string, content: string): void {
  const address = URL.createObjectURL(new Blob([content], { type: `${type};charset=utf-8` }));
  const link = document.createElement("a");
  link.href = address;
  link.download = name;
  link.click();
  // Some browsers read it only after the click has been handled.
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}
