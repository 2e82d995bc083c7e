const shortDay = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
});
const longDay = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
});
const moment = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  hour: '2-digit',
  minute: '2-digit',
});
const utcMoment = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
  timeZone: 'UTC',
});

/** A date without a time is that day everywhere: noon keeps it clear of every zone's midnight. */
function readDate(date: string): Date {
  return new Date(/^\d{4}-\d{2}-\d{2}$/.test(date) ? `${date}T12:00:00` : date);
}

/** "3 Nov 2026" */
export function sayDate(date: string): string {
  return shortDay.format(readDate(date)).replace('Sept', 'Sep');
}

/** "3 November 2026", for certificates and checks. */
export function sayDateInFull(date: string): string {
  return longDay.format(readDate(date));
}

/** "1 Dec, 12:43", in the reader's own zone. */
export function sayMoment(instant: string): string {
  return moment.format(new Date(instant)).replace('Sept', 'Sep');
}

/** "1 December 2026 at 12:43 UTC" */
export function sayMomentInUtc(instant: string): string {
  return `${utcMoment.format(new Date(instant)).replace(', ', ' at ')} UTC`;
}

const timeOfDay = new Intl.DateTimeFormat('en-GB', {
  hour: '2-digit',
  minute: '2-digit',
  second: '2-digit',
});

/** "10:27:04", in the reader's own zone. */
export function sayTimeOfDay(instant: string): string {
  return timeOfDay.format(new Date(instant));
}

const dayAndMonth = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short' });

/** "3 Nov", where the year goes without saying. */
export function sayDayAndMonth(date: string): string {
  return dayAndMonth.format(readDate(date)).replace('Sept', 'Sep');
}
