/**
 * A moment as it is said at the bench: the time alone today, else with the day, and the year when it is another.
 * `now` is given so that a test need not wait.
 */
export function formatMoment(iso: string, now: Date = new Date()): string {
  const moment = new Date(iso);
  if (Number.isNaN(moment.getTime())) return '';
  const time = `${two(moment.getHours())}:${two(moment.getMinutes())}`;
  if (moment.toDateString() === now.toDateString()) return time;
  const day = `${moment.getDate()} ${MONTHS[moment.getMonth()] ?? ''}`;
  return moment.getFullYear() === now.getFullYear() ? `${day}, ${time}` : `${day} ${moment.getFullYear()}`;
}

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'June', 'July', 'Aug', 'Sept', 'Oct', 'Nov', 'Dec'];

function two(value: number): string {
  return String(value).padStart(2, '0');
}
