import { useState } from 'react';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { RecordDrawing } from './record-drawing.tsx';

/** Opens the drawing of a line over the list it stands in. */
export function DrawingButton({
  recordId,
  structureNumber,
}: {
  recordId: string;
  structureNumber: string | null;
}) {
  const [open, setOpen] = useState(false);
  const name = structureNumber ?? 'this line';
  return (
    <>
      <Button kind="quiet" size="small" aria-label={`Drawing of ${name}`} onClick={() => setOpen(true)}>
        Drawing
      </Button>
      <Dialog open={open} onOpenChange={setOpen} title={`Structure ${name}`} wide>
        {open ? <RecordDrawing recordId={recordId} /> : null}
        <p className="mt-2 text-table">
          <TextLink to={paths.record.to(recordId)}>Open the record page</TextLink>: measurements, pours and
          history.
        </p>
      </Dialog>
    </>
  );
}
