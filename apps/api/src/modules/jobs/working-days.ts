const dayMs = 86_400_000;

export function addDays(day: string, days: number): string {
  return new Date(Date.parse(`${day}T00:00:00Z`) + days * dayMs).toISOString().slice(0, 10);
}

/** Monday to Friday: common practice, no source. */
export function isWorkingDay(day: string): boolean {
  const weekday = new Date(`${day}T00:00:00Z`).getUTCDay();
  return weekday >= 1 && weekday <= 5;
}

/** The calendar days from the first to the last, both included; none where the last comes before the first. */
export function daysBetween(first: string, last: string): string[] {
  const days: string[] = [];
  for (let day = first; day <= last; day = addDays(day, 1)) days.push(day);
  return days;
}

/** How many working days there are from the first to the last, both included. */
export function countWorkingDays(first: string, last: string): number {
  const days = Math.round((Date.parse(last) - Date.parse(first)) / dayMs) + 1;
  if (days <= 0) return 0;
  const weeks = Math.floor(days / 7);
  return weeks * 5 + daysBetween(addDays(first, weeks * 7), last).filter(isWorkingDay).length;
}
