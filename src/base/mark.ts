/**
 * The mark that ties a program, its sheet and its job together: eight hexadecimal digits of the CRC-32 (polynomial
 * 0xEDB88320, reflected; ISO 3309, ITU-T V.42) of the texts the program was made from. Not a safeguard against intent.
 */
export function markOf(texts: readonly string[]): string {
  let crc = 0xffffffff;
  for (const text of texts) {
    for (let i = 0; i < text.length; i++) {
      const code = text.charCodeAt(i);
      crc = step(step(crc, code & 0xff), code >> 8);
    }
  }
  return ((crc ^ 0xffffffff) >>> 0).toString(16).padStart(8, '0').toUpperCase();
}

function step(crc: number, byte: number): number {
  let value = (crc ^ byte) & 0xff;
  for (let bit = 0; bit < 8; bit++) {
    value = value & 1 ? (value >>> 1) ^ 0xedb88320 : value >>> 1;
  }
  return (crc >>> 8) ^ value;
}
