import { dayScale, FROM, monthTicks, TO, weekTicks } from './calendar-line';

interface CalendarLineProps {
  span: { start: string; end: string };
  today: string;
}

const ink = 'var(--hp-colors-fg)';
const quiet = 'var(--hp-colors-fg-muted)';

/** The line itself: weeks short, months long and named, today flagged. */
export function CalendarLine({ span, today }: CalendarLineProps) {
  const at = dayScale(span);
  const now = at(today);
  return (
    <g>
      <path d={`M${FROM} 50H${TO}`} stroke={ink} strokeWidth="1.5" />
      {weekTicks(span).map((day) => (
        <path key={day} d={`M${at(day)} 50v5`} stroke={quiet} />
      ))}
      {monthTicks(span).map(({ day, word }) => (
        <g key={day}>
          <path d={`M${at(day)} 50v11`} stroke={ink} strokeWidth="1.5" />
          {at(day) < TO - 24 && (
            <text x={at(day)} y="77" fontSize="15" fill={quiet}>
              {word}
            </text>
          )}
        </g>
      ))}
      <path d={`M${now} 16v34`} stroke={ink} strokeWidth="1.5" strokeDasharray="3 3" />
      <text x={now} y="11" fontSize="15" fill={ink} textAnchor={now < 40 ? 'start' : 'middle'}>
        today
      </text>
    </g>
  );
}
