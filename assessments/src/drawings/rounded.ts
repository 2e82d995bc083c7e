/** Free of rounding dust and of a nought with a minus. */
export const rounded = (value: number, decimals: number): number =>
  Number(value.toFixed(decimals)) + 0;
