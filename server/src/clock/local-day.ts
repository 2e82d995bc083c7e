/** The calendar day, as YYYY-MM-DD, on which an instant falls in a time zone. */
export function localDay(instant: Date, zone: string): string {
  const parts = new Intl.DateTimeFormat('en', {
    timeZone: zone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  }).formatToParts(instant);
  const part = (type: string) => parts.find((found) => found.type === type)?.value ?? '';
  return `${part('year')}-${part('month')}-${part('day')}`;
}
