'use client';

import { Bar, BarChart, ResponsiveContainer, XAxis, YAxis } from 'recharts';
import type { Figure } from '@/lib/contracts/numbers';

const rowPx = 34;
/** Longer names are cut: the table beside the chart has them whole. */
const nameLetters = 24;

/** The parts of a figure as lengths; what they are of stands behind them as an outline. Read by eye only. */
export function SplitChart({ splits }: { splits: Figure['splits'] }) {
  const rows = splits.map(({ name, value, outOf }) => ({
    name: name.length > nameLetters ? `${name.slice(0, nameLetters - 1)}…` : name,
    value,
    outOf: outOf ?? 0,
  }));
  const hasWhole = splits.some(({ outOf }) => outOf !== null);
  return (
    <div aria-hidden="true" style={{ height: rows.length * rowPx + 30 }}>
      <ResponsiveContainer width="100%" height="100%">
        <BarChart
          layout="vertical"
          data={rows}
          barGap={-12}
          margin={{ top: 0, right: 12, bottom: 0, left: 0 }}
          accessibilityLayer={false}
        >
          <XAxis
            type="number"
            allowDecimals={false}
            tick={{ fill: 'var(--graphite)', fontSize: 12 }}
            stroke="var(--rule)"
          />
          <YAxis
            type="category"
            dataKey="name"
            width={170}
            tick={{ fill: 'var(--ink)', fontSize: 13 }}
            stroke="var(--ink)"
          />
          {hasWhole ? (
            <Bar
              dataKey="outOf"
              barSize={12}
              fill="transparent"
              stroke="var(--graphite)"
              isAnimationActive={false}
            />
          ) : null}
          <Bar dataKey="value" barSize={12} fill="var(--blueprint)" isAnimationActive={false} />
        </BarChart>
      </ResponsiveContainer>
    </div>
  );
}
