import { differenceInCalendarDays } from "date-fns/differenceInCalendarDays";
import { format } from "date-fns/format";
import { isSameYear } from "date-fns/isSameYear";

/** A moment as a row shows it, in the reader's time zone: “Jan 9, 08:05”; the year only when it is not this one. */
export function momentText(at: string, now: Date | number): string {
  const then = new Date(at);
  return format(then, isSameYear(then, now) ? "MMM\u00a0d, HH:mm" : "MMM\u00a0d,\u00a0yyyy, HH:mm");
}

/** A moment as someone would say it on the day: “09:14”, “yesterday 09:14”, and after that its date. */
export function recentText(at: string, now: Date | number): string {
  const days = differenceInCalendarDays(now, at);
  if (days === 0) return format(at, "HH:mm");
  return days === 1 ? format(at, "'yesterday' HH:mm") : momentText(at, now);
}

/** The whole moment, to the second and with the zone. */
export function fullMomentText(at: string): string {
  return format(new Date(at), "EEEE, MMMM d, yyyy, HH:mm:ss 'UTC'xxx");
}

/** A running time: 03:12, or 1:03:12 from an hour on. */
export function clockText(ms: number): string {
  const seconds = Math.floor(ms / 1000);
  const two = (part: number) => String(part).padStart(2, "0");
  const hours = Math.floor(seconds / 3600);
  const rest = `${two(Math.floor(seconds / 60) % 60)}:${two(seconds % 60)}`;
  return hours > 0 ? `${hours}:${rest}` : rest;
}

const UNITS = [
  { ms: 86_400_000, one: "day", many: "days" },
  { ms: 3_600_000, one: "h", many: "h" },
  { ms: 60_000, one: "min", many: "min" },
  { ms: 1_000, one: "s", many: "s" },
] as const;

/** A length of time in its two largest units: “7 min 42 s”, “2 days 3 h”. */
export function durationText(ms: number): string {
  const first = UNITS.findIndex((unit) => ms >= unit.ms);
  if (first < 0) return "0 s";
  let left = ms;
  const parts = UNITS.slice(first, first + 2).map(({ ms: size, one, many }) => {
    const count = Math.floor(left / size);
    left -= count * size;
    return count > 0 ? `${count} ${count === 1 ? one : many}` : null;
  });
  return parts.filter((part) => part !== null).join(" ");
}

/** A digest or thumbprint in fours, so that two people can read it to each other. */
export function inFours(text: string): string[] {
  return text.match(/.{1,4}/g) ?? [];
}

/** The time of day of an epoch time in milliseconds. */
export function clockTimeText(ms: number): string {
  return format(ms, "HH:mm");
}

/** The time of day to the second, for two clocks that are compared. */
export function secondsTimeText(ms: number): string {
  return format(ms, "HH:mm:ss");
}
