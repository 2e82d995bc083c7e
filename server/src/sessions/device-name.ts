/** A word by which somebody tells their own sessions apart. */
export function deviceName(userAgent: string): string {
  if (userAgent === '') return 'Unknown device';
  if (/tablet/i.test(userAgent)) return 'Tablet';
  return /mobi/i.test(userAgent) ? 'Phone' : 'Computer';
}
