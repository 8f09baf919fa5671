import { useSearchParams } from 'react-router-dom';
import { writeFilters } from '#src/lib/filters/filter-params.ts';
import type { NonconformitySummary } from '#shared/generated/api-types.ts';
import { AgeChart } from './age-chart.tsx';
import { ParetoChart } from './pareto-chart.tsx';
import { RateChart } from './rate-chart.tsx';

export function SummaryCharts({ summary }: { summary: NonconformitySummary }) {
  const [search] = useSearchParams();
  return (
    <div className="grid gap-x-9 gap-y-6 border-b border-hairline px-gutter pt-3 pb-4 md:grid-cols-2 xl:grid-cols-[1.45fr_1.05fr_0.72fr]">
      <div className="min-w-0 md:col-span-2 xl:col-span-1">
        <ParetoChart
          rules={summary.byRule}
          ruleTo={(rule) => `?${writeFilters(search, { rule }).toString()}`}
        />
      </div>
      <RateChart contractors={summary.byContractor} />
      <AgeChart buckets={summary.openActions} />
    </div>
  );
}
