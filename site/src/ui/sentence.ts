/** "unsupervised, on ..." stands alone as "Unsupervised, on ...". */
export function beginSentence(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
