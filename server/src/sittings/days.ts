/** The calendar day of an instant in a zone, in words: 1 December 2026. */
export const longDay = (zone: string, at: Date): string =>
  new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: zone }).format(at);
