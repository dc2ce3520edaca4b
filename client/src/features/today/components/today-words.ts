import { formatPromise } from '../../../lib/format-time';
import { capital, numberWord } from '../../../lib/number-words';
import type { Today } from '../api/today';

const dayLength = 86_400_000;

function weekday(day: string): string {
  return formatPromise(day).split(' ')[0] ?? day;
}

/** `Four things need you by Thursday`; the day is named only where it lies within a week. */
export function headline({ queue, day }: Pick<Today, 'queue' | 'day'>): string {
  if (queue.length === 0) return 'Nothing needs you just now';
  const count = queue.length === 1 ? 'One thing needs you' : `${capital(numberWord(queue.length))} things need you`;
  const days = queue.map(({ due }) => due);
  const last = days.includes(null)
    ? null
    : days.reduce((latest, due) => (due !== null && (latest === null || due > latest) ? due : latest), null);
  if (!last || last < day || Date.parse(last) - Date.parse(day) > 6 * dayLength) return count;
  return last === day ? `${count} today` : `${count} by ${weekday(last)}`;
}

/** `Tuesday 1 December. Nine orders are promised this week; seven are safe.` */
export function standing({ day, promises }: Pick<Today, 'day' | 'promises'>): string {
  const date = `${formatPromise(day)}.`;
  if (!promises) return date;
  const { thisWeek, safe } = promises;
  if (thisWeek === 0) return `${date} No order is promised this week.`;
  const promised = `${capital(numberWord(thisWeek))} ${thisWeek === 1 ? 'order is' : 'orders are'} promised this week`;
  if (safe === thisWeek) return `${date} ${promised}; ${thisWeek === 1 ? 'it is safe' : 'all are safe'}.`;
  if (safe === 0) return `${date} ${promised}; ${thisWeek === 1 ? 'it is not safe' : 'none is safe'}.`;
  return `${date} ${promised}; ${numberWord(safe)} ${safe === 1 ? 'is' : 'are'} safe.`;
}
