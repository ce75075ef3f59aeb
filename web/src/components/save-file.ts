/** A name every file system takes: letters, figures, points and hyphens; never empty, never hidden. */
export function fileNameOf(title: string, extension: string): string {
  const plain = title
    .normalize("NFKC")
    .replace(/[^\p{L}\p{N}.]+/gu, "-")
    .replace(/^[-.]+|[-.]+$/gu, "")
    .slice(0, 80);
  return `${plain || "scenario"}.${extension}`;
}

/** Hands a text, or bytes, to the browser as a file to keep. */
export function saveFile(name: string, type: string, content: string | Uint8Array<ArrayBuffer>): void {
  const kind = typeof content === "string" ? `${type};charset=utf-8` : type;
  const address = URL.createObjectURL(new Blob([content], { type: kind }));
  const link = Object.assign(document.createElement("a"), { href: address, download: name });
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
