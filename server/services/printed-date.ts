/** The day in the shop's own time zone, `2026-03-09`, as it is printed on sheets. */
export function printedDate(at: Date, timeZone: string): string {
  return new Intl.DateTimeFormat('en-CA', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  }).format(at);
}
