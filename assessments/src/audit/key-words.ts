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
      return places(held.options, [held.right]).join();
    case 'choices':
      return places(held.options, held.right).sort().join();
    case 'order':
      return places(held.options, held.right).join();
    case 'match': {
      const texts = places(held.options, held.right);
      return held.rows
        .map(({ index }, row) => `${index}:${texts[row]}`)
        .sort()
        .join();
    }
  }
}

/** Where the sheet has what the ids stand for: ids and their order are drawn anew each time. */
function places(options: readonly DrawnOption[], ids: readonly string[]): string[] {
  return ids.map((id) => String(options.find((one) => one.id === id)?.index));
}
