const letters = "ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/";
const perLine = 120;

/** Bytes as lines of base64 (RFC 4648, padded). */
export function base64Lines(bytes: Uint8Array): string[] {
  const lines: string[] = [];
  const bytesPerLine = (perLine / 4) * 3;
  for (let from = 0; from < bytes.length; from += bytesPerLine)
    lines.push(base64(bytes.subarray(from, from + bytesPerLine)));
  return lines;
}

function base64(bytes: Uint8Array): string {
  let text = "";
  for (let i = 0; i < bytes.length; i += 3) {
    const three = (bytes[i] << 16) | ((bytes[i + 1] ?? 0) << 8) | (bytes[i + 2] ?? 0);
    for (let n = 0; n < 4; n++) text += i + n > bytes.length ? "=" : letters[(three >> (18 - 6 * n)) & 63];
  }
  return text;
}
