import { formatInstant } from '../../lib/dates';

/** Short enough for a narrow column: "14:02" today, "Mon 16" within a week, else "30 Apr". */
export function feedTime(instant: string, now: Date = new Date()): string {
  const [day, clock] = formatInstant(instant, now).split(', ');
  if (day === 'Today') return clock!;
  return day!.replace(/\s\d{4}$/u, '');
}
