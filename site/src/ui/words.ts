const numberWords =
  'no one two three four five six seven eight nine ten eleven twelve thirteen fourteen fifteen'.split(
    ' ',
  );

/** "three"; figures from sixteen on. */
export const sayNumber = (count: number): string => numberWords[count] ?? String(count);

/** Begins a cell or a sentence. */
export const upperFirst = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** Goes on within a sentence. */
export const lowerFirst = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);

/** "(a), (b) and (c)" */
export function joinAnd(parts: string[]): string {
  return [parts.slice(0, -1).join(', '), parts.at(-1)].filter(Boolean).join(' and ');
}
