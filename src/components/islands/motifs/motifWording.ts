import type { MotifSummary } from '../../../schemas/motif';

/** Written out alike by server and browser, whatever their clocks and languages. */
const DAY = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  timeZone: 'UTC',
});

/** "1 December 2026" */
export const savedOn = (moment: string): string =>
  Number.isNaN(Date.parse(moment)) ? '' : DAY.format(new Date(moment));

/** ", 2 errors in its text"; nothing where there are none. */
export function problemCountInWords({ errors }: MotifSummary['problems'], before = ''): string {
  if (errors === 0) return '';
  return `${before}${errors === 1 ? '1 error' : `${errors} errors`} in its text`;
}
