import { AXIS, dayScale, FROM, monthTicks, TO, weekTicks } from './calendar-line';

const ink = 'var(--hp-colors-fg)';
const quiet = 'var(--hp-colors-fg-muted)';

/** The line itself: weeks short, months long and named, a new year by its number. */
export function CalendarLine({ span }: { span: { start: string; end: string } }) {
  const at = dayScale(span);
  return (
    <g>
      <path d={`M${FROM} ${AXIS}H${TO}`} stroke={ink} strokeWidth="1.5" />
      {weekTicks(span).map((day) => (
        <path key={day} d={`M${at(day)} ${AXIS}v5`} stroke={quiet} />
      ))}
      {monthTicks(span).map(({ day, word }) => (
        <g key={day}>
          <path d={`M${at(day)} ${AXIS}v${word ? 11 : 7}`} stroke={ink} strokeWidth={word ? 1.5 : 1} />
          {at(day) < TO - 18 && (
            <text
              x={at(day)}
              y={AXIS + 26}
              fontSize="15"
              fill={/\d/.test(word) ? ink : quiet}
              fontWeight={/\d/.test(word) ? 600 : 400}
            >
              {word}
            </text>
          )}
        </g>
      ))}
    </g>
  );
}

/** Its word stands left of the flag where there is room, so that a booking has the right. */
const side = (x: number) =>
  x < 52 ? { x: x + 5, anchor: 'start' as const } : { x: x - 5, anchor: 'end' as const };

export function Today({ x }: { x: number }) {
  const word = side(x);
  return (
    <g>
      <path d={`M${x} 2V${AXIS}`} stroke={ink} strokeWidth="1.5" strokeDasharray="3 3" />
      <text x={word.x} y="13" fontSize="15" fill={ink} textAnchor={word.anchor}>
        today
      </text>
    </g>
  );
}

/** The appointment: an open roller on the line, under its flag. */
export function Booked({ x, today }: { x: number; today: number }) {
  const isRight = x > TO - 60 && x - today > 110;
  return (
    <g>
      <path d={`M${x} 4V${AXIS - 7}`} stroke={ink} strokeWidth="1.5" />
      <circle cx={x} cy={AXIS} r="7" fill="var(--hp-colors-bg-panel)" stroke={ink} strokeWidth="2" />
      <circle cx={x} cy={AXIS} r="2" fill={ink} />
      <text
        x={isRight ? x - 6 : x + 6}
        y="13"
        fontSize="15"
        fontWeight="600"
        fill={ink}
        textAnchor={isRight ? 'end' : 'start'}
      >
        booked
      </text>
    </g>
  );
}
