/** How one strand of the mark is drawn. */
export const strandKinds = { ring: 0, ringWithDot: 1, solid: 2 } as const;

const strandCount = 37;

/**
 * The strands of a mark from the SHA-256 of its certificate number: two bits each, where two of
 * the four values are solid.
 */
export function strandsFromDigest(digest: Uint8Array): number[] {
  return Array.from({ length: strandCount }, (_, strand) => {
    const byte = digest[strand >> 1] ?? 0;
    return Math.min((byte >> (strand % 2 === 0 ? 0 : 4)) & 3, strandKinds.solid);
  });
}

/**
 * Where the 37 strands lie, row by row from the top, in strand diameters from the middle
 * (y downwards): one in the middle and three hexagonal rings around it.
 */
export function strandCentres(): { x: number; y: number }[] {
  const rowLengths = [4, 5, 6, 7, 6, 5, 4];
  return rowLengths.flatMap((count, row) =>
    Array.from({ length: count }, (_, place) => ({
      x: place - (count - 1) / 2,
      y: ((row - 3) * Math.sqrt(3)) / 2,
    })),
  );
}
