import type { HoursView } from '@linkfell/contracts';

const names = ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday'] as const;
export const dayName = (weekday: number): string => names[weekday - 1] ?? '';
const short = (weekday: number): string => dayName(weekday).slice(0, 3);

/** "Mon to Fri, Sun" from 1 to 5 and 7. Two days in a row are named singly. */
export function openDaysWords(weekdays: readonly number[]): string {
  const days = [...weekdays].sort((a, b) => a - b);
  const runs: number[][] = [];
  for (const day of days) {
    const run = runs.at(-1);
    if (run && run.at(-1) === day - 1) run.push(day);
    else runs.push([day]);
  }
  return runs
    .map((run) =>
      run.length > 2 ? `${short(run[0] ?? 1)} to ${short(run.at(-1) ?? 7)}` : run.map(short).join(', '),
    )
    .join(', ');
}

/** All seven days, each with its spans: "08:30 to 12:30", or none. */
export const weekOf = (hours: readonly HoursView[]): { day: string; spans: string[] }[] =>
  names.map((day, index) => ({
    day,
    spans: hours
      .filter(({ weekday }) => weekday === index + 1)
      .map(({ opens, closes }) => `${opens} to ${closes}`),
  }));
