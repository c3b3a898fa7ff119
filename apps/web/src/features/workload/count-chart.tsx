import { Bar, CartesianGrid, ComposedChart, Legend, Line, ResponsiveContainer, XAxis, YAxis } from 'recharts';
import { chartColours } from '../../components/chart-colours';
import { axis, margin, shortDay } from './week-axes';
import type { Week } from './week-words';

const still = { isAnimationActive: false } as const;

/** Treatments and replacements a week: bands as bars, middles as marks of two shapes. */
export default function CountChart({ weeks }: { weeks: Week[] }) {
  const data = weeks.map(({ from, treatments, replacements }) => ({
    week: shortDay(from),
    treatments: [treatments.p10, treatments.p90],
    replacements: [replacements.p10, replacements.p90],
    treatmentsMiddle: treatments.p50,
  }));
  return (
    <ResponsiveContainer width="100%" height="100%">
      <ComposedChart data={data} margin={margin} accessibilityLayer={false}>
        <CartesianGrid stroke={chartColours.grid} vertical={false} />
        <XAxis dataKey="week" {...axis} interval="preserveStartEnd" minTickGap={8} />
        <XAxis dataKey="week" xAxisId="inner" hide />
        <YAxis width={36} allowDecimals={false} {...axis} />
        <Legend formatter={(name: string) => <span style={{ color: chartColours.ink }}>{name}</span>} />
        <Bar
          {...still}
          name="Treatments"
          dataKey="treatments"
          maxBarSize={30}
          fill={chartColours.band}
          stroke={chartColours.line}
          radius={3}
        />
        <Bar
          {...still}
          name="Replacements"
          dataKey="replacements"
          xAxisId="inner"
          barSize={9}
          minPointSize={3}
          fill={chartColours.turning}
          stroke={chartColours.ink}
          radius={3}
        />
        <Line
          {...still}
          legendType="none"
          dataKey="treatmentsMiddle"
          stroke={chartColours.line}
          strokeDasharray="2 4"
          dot={{ r: 4, fill: chartColours.line, strokeDasharray: '' }}
        />
      </ComposedChart>
    </ResponsiveContainer>
  );
}
