import { chartColours, chartText } from '../../components/chart-colours';

/** '7 Dec', short enough for twelve of them beside each other. */
export const shortDay = (day: string): string =>
  new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', timeZone: 'UTC' }).format(
    new Date(`${day}T00:00:00Z`),
  );

/** Both axes look the same on every chart of the weeks. */
export const axis = { tick: chartText, tickLine: false, axisLine: { stroke: chartColours.axis } } as const;
export const margin = { top: 12, right: 8, bottom: 4, left: 0 } as const;
