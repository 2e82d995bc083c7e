declare module 'subset-font' {
  /** Keeps the glyphs of `text` (HarfBuzz), from TTF, WOFF or WOFF2. */
  export default function subsetFont(
    font: Uint8Array,
    text: string,
    options: { targetFormat: 'sfnt' },
  ): Promise<Uint8Array>;
}
