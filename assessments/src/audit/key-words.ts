import { type Drawn, type DrawnOption, type DrawnPart } from '../questions/compiled.ts';

/** The whole key of a draw as a neighbour could copy it: two papers of one key are one paper. */
export function keyWords(drawn: Drawn): string {
  return Object.values(drawn.parts).map(partWords).join(' | ');
}

function partWords(held: DrawnPart): string {
  switch (held.kind) {
    case 'quantity':
      return held.key.toPrecision(4);
    case 'options':
      return placesOf(held.options, [held.right]);
    case 'choices':
      return placesOf(held.options, [...held.right].sort());
    case 'order':
      return placesOf(held.options, held.right);
    case 'match':
      return placesOf(held.options, held.right);
  }
}

function placesOf(options: readonly DrawnOption[], ids: readonly string[]): string {
  return ids.map((id) => options.find((one) => one.id === id)?.index ?? '?').join(' ');
}
