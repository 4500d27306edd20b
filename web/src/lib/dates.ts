import { conventions } from './conventions';

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];
const DAY_MS = 86_400_000;

/** A calendar date of the clinic group, `2026-04-30` → "30 Apr 2026". Not an instant: no zone can shift it. */
export function formatDate(date: string): string {
  const [year, month, day] = parts(date);
  return `${day}\u00a0${MONTHS[month - 1]}\u00a0${year}`;
}

/** The same without the year, for dates within the round: "30 Apr". */
export function formatDayMonth(date: string): string {
  const [, month, day] = parts(date);
  return `${day}\u00a0${MONTHS[month - 1]}`;
}

/** Whole days from today, as the group's calendar counts it, to `date`; negative once it has passed. */
export function daysUntil(date: string, now: Date = new Date()): number {
  return Math.round((dayNumber(date) - dayNumber(today(now))) / DAY_MS);
}

/** "44 days left", "1 day left", "Due today", "3 days late". */
export function timeLeft(date: string, now: Date = new Date()): string {
  const days = daysUntil(date, now);
  if (days === 0) return 'Due today';
  const count = `${Math.abs(days)}\u00a0${Math.abs(days) === 1 ? 'day' : 'days'}`;
  return days > 0 ? `${count} left` : `${count} late`;
}

/** An instant in the reader's own zone: "Today, 14:10", "Mon 16, 09:30" within a week, else "30 Apr 2026, 14:10". */
export function formatInstant(instant: string, now: Date = new Date()): string {
  const at = new Date(instant);
  const clock = clockOf(at);
  const age = Math.round((startOfDay(now) - startOfDay(at)) / DAY_MS);
  if (age === 0) return `Today, ${clock}`;
  if (age > 0 && age < 7) return `${weekday(at)}\u00a0${at.getDate()}, ${clock}`;
  return formatInstantInFull(instant);
}

/** The same for papers, which are read on other days too: always "30 Apr 2026, 14:10". */
export function formatInstantInFull(instant: string): string {
  const at = new Date(instant);
  return `${at.getDate()}\u00a0${MONTHS[at.getMonth()]}\u00a0${at.getFullYear()}, ${clockOf(at)}`;
}

/** Today's calendar date in the group's zone, as `2026-04-30`. */
export function today(now: Date = new Date()): string {
  return new Intl.DateTimeFormat('sv-SE', { timeZone: conventions().timeZone, dateStyle: 'short' }).format(
    now,
  );
}

function parts(date: string): [year: number, month: number, day: number] {
  const [year = NaN, month = NaN, day = NaN] = date.slice(0, 10).split('-').map(Number);
  return [year, month, day];
}

function dayNumber(date: string): number {
  const [year, month, day] = parts(date);
  return Date.UTC(year, month - 1, day);
}

function startOfDay(at: Date): number {
  return Date.UTC(at.getFullYear(), at.getMonth(), at.getDate());
}

function weekday(at: Date): string {
  return ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat'][at.getDay()]!;
}

function clockOf(at: Date): string {
  return `${pad(at.getHours())}:${pad(at.getMinutes())}`;
}

function pad(value: number): string {
  return String(value).padStart(2, '0');
}
