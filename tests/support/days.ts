const weekdays = ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat'];
const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

/** A working day so many days from now, as a day field takes it. */
export function daysFromNow(days: number): string {
  const day = new Date(Date.now() + days * 86_400_000);
  if (days > 0) while (day.getUTCDay() % 6 === 0) day.setUTCDate(day.getUTCDate() + 1);
  return day.toISOString().slice(0, 10);
}

/** The same as a page says it: Fri 4 Dec. */
export function saidFromNow(days: number): string {
  const day = new Date(`${daysFromNow(days)}T00:00:00Z`);
  return `${weekdays[day.getUTCDay()]} ${day.getUTCDate()} ${months[day.getUTCMonth()]}`;
}
