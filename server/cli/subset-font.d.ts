declare module 'subset-font' {
  /** Gives the font with only the characters of `text`. */
  export default function subsetFont(font: Uint8Array, text: string, options: { targetFormat: 'woff2' | 'woff' | 'truetype' }): Promise<Buffer>;
}
