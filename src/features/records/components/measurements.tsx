import { measurementGroups } from '#src/features/records/components/measurement-rows.ts';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';

/** What was measured, by group, each with the cell it came from. */
export function Measurements({ data }: { data: RecordSheetData }) {
  const metric = useUnitSystem() === 'metric';
  const groups = measurementGroups(data, metric);
  return (
    <section aria-labelledby="measurements">
      <SectionHead
        title="Measurements"
        id="measurements"
        aside={`from ${data.record.sheet}, row ${data.record.row}`}
      />
      <div className="grid items-start md:grid-cols-2">
        {groups.map((group) => (
          <table key={group.title} className="w-full border-collapse text-table">
            <caption className="px-gutter pt-2.5 pb-1 text-left text-small font-semibold text-muted">
              {group.title}
            </caption>
            <thead className="sr-only">
              <tr>
                <th scope="col">Field</th>
                <th scope="col">Value</th>
                <th scope="col">Cell</th>
              </tr>
            </thead>
            <tbody>
              {group.rows.map((row) => (
                <tr key={row.field} className="border-b border-hairline">
                  <th
                    scope="row"
                    className="w-2/5 py-1 pr-2 pl-gutter text-left align-baseline font-normal text-ink-2"
                  >
                    {row.title}
                  </th>
                  <td className="px-2 py-1 align-baseline break-words">
                    <span className="font-semibold">{row.value}</span>
                    {row.written === null ? null : (
                      <span className="block text-small text-muted">written “{row.written}”</span>
                    )}
                  </td>
                  <td className="w-20 py-1 pr-gutter pl-2 text-right align-baseline whitespace-nowrap text-small text-muted">
                    {row.cell}
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        ))}
      </div>
    </section>
  );
}
