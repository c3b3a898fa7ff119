import {
  Area,
  CartesianGrid,
  ComposedChart,
  Line,
  ReferenceLine,
  ResponsiveContainer,
  Scatter,
  XAxis,
  YAxis,
} from 'recharts';
import { chartColours, chartText } from '../../components/chart-colours';
import { monthMarks } from './chart-data';
import type { ElongationPoint, intervals } from './chart-data';

interface ElongationDrawingProps {
  points: ElongationPoint[];
  /** Go/no-go readings, drawn as upright strokes. */
  strokes: ReturnType<typeof intervals>;
  limit: number;
  /** Upper end of the scale, %. */
  top: number;
  today: number;
}

const month = new Intl.DateTimeFormat('en-GB', { month: 'short', year: '2-digit', timeZone: 'UTC' });

/** Elongation over time: readings, the predicted band, the limit. */
export default function ElongationDrawing({ points, strokes, limit, top, today }: ElongationDrawingProps) {
  return (
    <ResponsiveContainer width="100%" height="100%">
      <ComposedChart
        data={points}
        margin={{ top: 12, right: 16, bottom: 4, left: 0 }}
        accessibilityLayer={false}
      >
        <CartesianGrid stroke={chartColours.grid} vertical={false} />
        <XAxis
          dataKey="time"
          type="number"
          scale="time"
          domain={['dataMin', 'dataMax']}
          tickFormatter={(time: number) => month.format(time)}
          tick={chartText}
          stroke={chartColours.axis}
          ticks={monthMarks(points[0]?.time ?? today, points.at(-1)?.time ?? today)}
          minTickGap={24}
        />
        <YAxis
          domain={[0, top]}
          unit=" %"
          width={64}
          tick={chartText}
          stroke={chartColours.axis}
          tickCount={6}
        />
        <Area
          dataKey="band"
          connectNulls
          stroke="none"
          fill={chartColours.line}
          fillOpacity={0.22}
          isAnimationActive={false}
        />
        <Line
          dataKey="middle"
          connectNulls
          dot={false}
          stroke={chartColours.line}
          strokeWidth={2}
          isAnimationActive={false}
        />
        <ReferenceLine
          y={limit}
          stroke={chartColours.limit}
          strokeWidth={2}
          strokeDasharray="7 4"
          label={{
            ...chartText,
            fill: chartColours.ink,
            value: `limit ${limit} %`,
            position: 'insideTopLeft',
          }}
        />
        <ReferenceLine
          x={today}
          stroke={chartColours.axis}
          label={{ ...chartText, value: 'today', position: 'insideBottomRight' }}
        />
        {strokes.map(({ id, time, from, to }) => (
          <ReferenceLine
            key={id}
            segment={[
              { x: time, y: from },
              { x: time, y: to },
            ]}
            stroke={chartColours.ink}
            strokeWidth={4}
            strokeOpacity={0.55}
          />
        ))}
        <Scatter dataKey="measured" fill={chartColours.ink} isAnimationActive={false} />
      </ComposedChart>
    </ResponsiveContainer>
  );
}
