/** Characters of the bytes 0x80 to 0x9F; the five unused ones stay what they are. */
const upper = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008DŽ\u008F\u0090‘’“”•–—˜™š›œ\u009DžŸ';

const chunk = 8192;

/**
 * Windows-1252 bytes as text. Done by hand: the TextDecoder of Node.js 20 takes this encoding for
 * ISO 8859-1 and turns dashes and curly quotes into control characters.
 *
 * @source WHATWG Encoding Standard, index windows-1252
 */
export function decodeWindows1252(bytes: Uint8Array): string {
  const parts: string[] = [];
  for (let start = 0; start < bytes.length; start += chunk) {
    const codes = Array.from(bytes.subarray(start, start + chunk), (byte) =>
      byte >= 0x80 && byte <= 0x9f ? upper.charCodeAt(byte - 0x80) : byte,
    );
    parts.push(String.fromCharCode(...codes));
  }
  return parts.join('');
}
