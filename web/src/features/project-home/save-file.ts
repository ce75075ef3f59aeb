/** A name every file system takes: letters, figures, points and hyphens; never empty, never hidden. */
export function fileNameOf(title: string, extension: string): string {
  const plain = title
    .normalize("NFKC")
    .replace(/[^\p{L}\p{N}.]+/gu, "-")
    .replace(/^[-.]+|[-.]+$/gu, "")
    .slice(0, 80);
  return `${plain || "scenario"}.${extension}`;
}

/** Hands a text to the browser as a file to keep. */
export function saveFile(name: string, type: string, text: string): void {
  const address = URL.createObjectURL(new Blob([text], { type: `${type};charset=utf-8` }));
  const link = Object.assign(document.createElement("a"), { href: address, download: name });
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
