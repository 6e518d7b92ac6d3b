const DAY_MS = 24 * 60 * 60 * 1000;

const hours = new Intl.DateTimeFormat("en-US", { hour: "2-digit", minute: "2-digit", hourCycle: "h23" });
const date = new Intl.DateTimeFormat("en-US", { month: "short", day: "numeric" });
const dateAndYear = new Intl.DateTimeFormat("en-US", { month: "short", day: "numeric", year: "numeric" });

/** An instant as the person at this phone would say it: "09:14", "yesterday 09:14", "Mar 3, 09:14". */
export function whenWords(instant: string, nowMs: number): string {
  const at = new Date(instant);
  const days = Math.round((midnight(new Date(nowMs)) - midnight(at)) / DAY_MS);
  const time = hours.format(at);
  if (days === 0) return time;
  if (days === 1) return `yesterday ${time}`;
  const sameYear = at.getFullYear() === new Date(nowMs).getFullYear();
  return `${(sameYear ? date : dateAndYear).format(at)}, ${time}`;
}

function midnight(at: Date): number {
  return new Date(at.getFullYear(), at.getMonth(), at.getDate()).getTime();
}

/** A walk's running time: "03:12", from an hour on "1:03:12". */
export function timerWords(elapsedMs: number): string {
  const seconds = Math.floor(elapsedMs / 1000);
  const two = (value: number) => String(value).padStart(2, "0");
  const [h, m, s] = [Math.floor(seconds / 3600), Math.floor(seconds / 60) % 60, seconds % 60];
  return h > 0 ? `${h}:${two(m)}:${two(s)}` : `${two(m)}:${two(s)}`;
}
