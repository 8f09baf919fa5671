import { useMakeSheets } from '../api/sheet-file.ts';
import { SheetsDialog } from './sheets-dialog.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Menu, MenuItem } from '#src/components/ui/menu.tsx';
import { useSearchParams } from 'react-router-dom';

/** Stands in the address, so that a reload or the way back finds the file again. */
const PARAM = 'sheets';

/** The record sheets of a batch as one PDF, of the revision that is looked at. */
export function SheetsMenu({ batchId, revision }: { batchId: string; revision: number }) {
  const [search, setSearch] = useSearchParams();
  const make = useMakeSheets(batchId);
  const fileId = search.get(PARAM);
  const show = (id: string | null) =>
    setSearch(
      (current) => {
        const next = new URLSearchParams(current);
        if (id === null) next.delete(PARAM);
        else next.set(PARAM, id);
        return next;
      },
      { replace: true, preventScrollReset: true },
    );
  const ask = (paper: 'letter' | 'a4') =>
    make.mutate({ paper, revision }, { onSuccess: (made) => show(made.id) });
  return (
    <>
      <Menu
        trigger={
          <Button size="small" disabled={make.isPending}>
            Print
          </Button>
        }
      >
        <MenuItem onSelect={() => ask('letter')}>All sheets as PDF, US Letter</MenuItem>
        <MenuItem onSelect={() => ask('a4')}>All sheets as PDF, A4</MenuItem>
      </Menu>
      <SheetsDialog
        fileId={fileId}
        error={make.error}
        onClose={() => {
          make.reset();
          show(null);
        }}
      />
    </>
  );
}
