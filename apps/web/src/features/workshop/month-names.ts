const month = new Intl.DateTimeFormat('en-GB', { month: 'long', timeZone: 'UTC' });

/** January to December. */
export const monthNames = Array.from({ length: 12 }, (_, i) => month.format(new Date(Date.UTC(2026, i, 1))));
