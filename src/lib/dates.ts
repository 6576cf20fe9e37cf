/** `2 June` of this year, `17 June 2024` of another, in the shop's own time zone. */
export function dayOf(iso: string, timeZone?: string, now = new Date()): string {
  const date = new Date(iso);
  const zone = timeZone ? { timeZone } : {};
  const year = new Intl.DateTimeFormat('en-GB', { year: 'numeric', ...zone });
  const sameYear = year.format(date) === year.format(now);
  return new Intl.DateTimeFormat('en-GB', {
    day: 'numeric',
    month: 'short',
    ...(sameYear ? {} : { year: '2-digit' }),
    ...zone,
  }).format(date);
}

/** `14:32:08`. */
export function clockOf(iso: string, timeZone?: string): string {
  return new Intl.DateTimeFormat('en-GB', {
    hour: '2-digit',
    minute: '2-digit',
    second: '2-digit',
    ...(timeZone ? { timeZone } : {}),
  }).format(new Date(iso));
}

/** `2 Jun 2026, 14:32`: for decisions and signatures, where the year always matters. */
export function momentOf(iso: string, timeZone?: string): string {
  return new Intl.DateTimeFormat('en-GB', {
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    ...(timeZone ? { timeZone } : {}),
  }).format(new Date(iso));
}
