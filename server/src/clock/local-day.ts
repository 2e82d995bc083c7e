// Making one takes far longer than using it.
const formats = new Map<string, Intl.DateTimeFormat>();

function formatFor(zone: string): Intl.DateTimeFormat {
  const kept = formats.get(zone);
  if (kept) return kept;
  const format = new Intl.DateTimeFormat('en', {
    timeZone: zone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  });
  formats.set(zone, format);
  return format;
}

/** The calendar day, as YYYY-MM-DD, on which an instant falls in a time zone. */
export function localDay(instant: Date, zone: string): string {
  const parts = formatFor(zone).formatToParts(instant);
  const part = (type: string) => parts.find((found) => found.type === type)?.value ?? '';
  return `${part('year')}-${part('month')}-${part('day')}`;
}
