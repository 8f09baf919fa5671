import { Cautions } from '#src/components/ui/caution.tsx';
import { classNames } from '#src/lib/class-names.ts';
import { leastGapIn } from '#shared/planner/choose-bore.ts';
import type { DepthTable, TableCell } from '#shared/planner/depth-table.ts';
import { kitsText } from '#shared/planner/kits-text.ts';
import { formatNumber } from '#shared/units/format-quantity.ts';
import type { Standard } from '#shared/standard/types.ts';

type Props = {
  readonly table: DepthTable;
  readonly head: readonly (readonly [string, string])[];
  readonly dueFt: number | null;
  readonly standard: Standard;
};

/** The table as a sheet: one page of Letter, in the units of the tape in the truck. */
export function DepthTableSheet({ table, head, dueFt, standard }: Props) {
  const known = table.rows.some(({ cells }) => cells.some(({ voidFt3 }) => voidFt3 !== null));
  return (
    <div className="px-3 py-3 print:p-0">
      <style>{'@media print { @page { size: letter portrait; margin: 10mm } }'}</style>
      <div className="border border-hairline bg-sheet p-1 print:border-none">
        <div className="border-[1.5px] border-ink p-4 print:p-3">
          <h2 className="text-title font-semibold">Foam kits by bore and depth</h2>
          <dl className="mt-1.5 grid grid-cols-[max-content_minmax(0,1fr)] gap-x-4 text-table">
            {head.map(([name, text]) => (
              <div key={name} className="contents">
                <dt className="text-muted">{name}</dt>
                <dd>{text}</dd>
              </div>
            ))}
          </dl>
          {known ? (
            <Grid table={table} dueFt={dueFt} />
          ) : (
            <p className="mt-4 text-ink-2">
              {table.boresIn.length === 0
                ? 'List the augers on the truck: each is a column.'
                : 'The pole is not known yet: see what is marked beside the fields.'}
            </p>
          )}
          <p className="mt-2 text-small text-ink-2">
            Each cell: kits in ft³, the void in ft³ below them. * leaves less than{' '}
            {formatNumber(leastGapIn(standard), { digits: 1 })} in round the pole: take a wider bore. × the
            pole does not go in. {dueFt === null ? '' : `Depth due as planned: ${formatNumber(dueFt)} ft.`}
          </p>
        </div>
      </div>
      <div className="mt-3 print:text-micro">
        <Cautions />
      </div>
    </div>
  );
}

function Grid({ table, dueFt }: Pick<Props, 'table' | 'dueFt'>) {
  return (
    // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex -- what scrolls must be reachable by keyboard
    <div role="region" aria-label="Kits by bore and depth" tabIndex={0} className="mt-3 overflow-x-auto">
      <table className="w-full border-collapse text-table">
        <caption className="sr-only">Kits and void by depth and bore diameter</caption>
        <thead>
          <tr className="border-b-[1.5px] border-ink">
            <th scope="col" className="px-2 py-1 text-right font-semibold whitespace-nowrap text-ink-2">
              Depth, ft
            </th>
            {table.boresIn.map((bore) => (
              <th key={bore} scope="col" className="px-2 py-1 text-right font-semibold whitespace-nowrap">
                {formatNumber(bore)} in
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {table.rows.map(({ depthFt, cells }) => {
            const due = dueFt !== null && Math.abs(depthFt - dueFt) < 1e-6;
            return (
              <tr key={depthFt} className={classNames('border-b border-hairline', due && 'bg-sunk')}>
                <th scope="row" className="px-2 py-1 text-right align-top font-semibold whitespace-nowrap">
                  {due ? <span className="font-normal text-ink-2">due </span> : null}
                  {formatNumber(depthFt)}
                </th>
                {cells.map((cell, at) => (
                  <td key={table.boresIn[at]} className="px-2 py-1 text-right align-top whitespace-nowrap">
                    <Cell cell={cell} />
                  </td>
                ))}
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}

function Cell({ cell }: { readonly cell: TableCell }) {
  if (cell.fit === 'none')
    return (
      <span className="text-muted">
        <span aria-hidden="true">×</span>
        <span className="sr-only">the pole does not go in</span>
      </span>
    );
  if (cell.voidFt3 === null) return <span className="text-muted">–</span>;
  return (
    <>
      <span className={classNames('block', cell.fit === 'fits' ? 'font-semibold' : 'text-ink-2')}>
        {cell.kits ? kitsText(cell.kits.kits) : '–'}
        {cell.fit === 'narrow' ? (
          <>
            <span aria-hidden="true"> *</span>
            <span className="sr-only"> gap too narrow</span>
          </>
        ) : null}
      </span>
      <span className="block text-small text-ink-2">
        {formatNumber(cell.voidFt3, { digits: 2, fixed: true })}
      </span>
    </>
  );
}
