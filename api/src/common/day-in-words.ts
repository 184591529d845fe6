const words = new Intl.DateTimeFormat('en-GB', { timeZone: 'UTC', day: 'numeric', month: 'long', year: 'numeric' });

/** A calendar date as people read it: "2026-11-22" is "22 November 2026". */
export const dayInWords = (date: string): string => words.format(new Date(`${date}T00:00:00.000Z`));
