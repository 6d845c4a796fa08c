export type PictureKind = 'jpeg' | 'png' | 'webp' | 'gif' | 'heic';

const startsWith = (bytes: Buffer, hex: string): boolean => bytes.subarray(0, hex.length / 2).toString('hex') === hex;
const ascii = (bytes: Buffer, from: number, to: number): string => bytes.subarray(from, to).toString('latin1');
const heicBrands = new Set(['heic', 'heix', 'hevc', 'hevx', 'heim', 'heis', 'mif1', 'msf1']);

/** What a file is by its first bytes, whatever its name or declared type says; null when it is no picture that we know. */
export function pictureKind(bytes: Buffer): PictureKind | null {
  if (startsWith(bytes, 'ffd8ff')) return 'jpeg';
  if (startsWith(bytes, '89504e470d0a1a0a')) return 'png';
  if (ascii(bytes, 0, 4) === 'RIFF' && ascii(bytes, 8, 12) === 'WEBP') return 'webp';
  if (/^GIF8[79]a/.test(ascii(bytes, 0, 6))) return 'gif';
  // ISO base media file format: the size, then "ftyp" and the brand.
  return ascii(bytes, 4, 8) === 'ftyp' && heicBrands.has(ascii(bytes, 8, 12)) ? 'heic' : null;
}
