import { z } from 'zod';
import { isCalendarDate } from '#src/domain/calendar/dayNumber.ts';

/** A date as YYYY-MM-DD that the calendar knows. */
export const calendarDate = () =>
  z
    .string({ error: 'Give a date as YYYY-MM-DD' })
    .regex(/^\d{4}-\d{2}-\d{2}$/, { message: 'Give a date as YYYY-MM-DD', abort: true })
    .refine(
      (text) => {
        const [year, month, day] = text.split('-').map(Number);
        return isCalendarDate(year!, month!, day!);
      },
      { message: 'There is no such date' },
    )
    .meta({ format: 'date' });
