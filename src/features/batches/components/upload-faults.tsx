import { Glyph } from '#src/components/ui/glyph.tsx';
import type { QueuedFile } from '#src/lib/api/upload-queue.ts';

const MOST = 6;

/** Which files were not taken, and why. */
export function UploadFaults({ files }: { files: readonly QueuedFile[] }) {
  const failed = files.filter((one) => one.state === 'failed');
  const copies = files.filter((one) => one.state === 'duplicate');
  const offline = failed.some((one) => one.offline);
  return (
    <>
      {offline ? (
        <p role="alert" className="mt-1 text-query">
          The network is away. What was stored is kept; the rest is sent by itself when it is back.
        </p>
      ) : null}
      {failed.length > 0 ? (
        <ul aria-label="Not stored" className="mt-1 grid gap-1">
          {failed.slice(0, MOST).map((one) => (
            <li key={one.id} className="flex gap-2">
              <Glyph name="triangle" className="mt-0.5" />
              <span className="min-w-0 break-words">
                <span className="font-semibold text-ink">{one.file.name}</span>{' '}
                {one.offline ? 'waits for the network' : one.problem}
              </span>
            </li>
          ))}
          {failed.length > MOST ? <li>and {failed.length - MOST} more</li> : null}
        </ul>
      ) : null}
      {copies.length > 0 ? (
        <p className="mt-1 break-words">
          Here already, byte for byte, and not kept twice: {copies.slice(0, MOST).map(copyWords).join(', ')}
          {copies.length > MOST ? ` and ${copies.length - MOST} more` : ''}. To move one to another structure,
          place it by hand under Photographs.
        </p>
      ) : null}
    </>
  );
}

/** `kits.jpg (as L-104 kits.jpg on 17-0426)` */
function copyWords({ file, already }: QueuedFile): string {
  if (!already) return file.name;
  const name = already.fileName === file.name ? '' : `as ${already.fileName}`;
  const place = already.structureNumber ? `on ${already.structureNumber}` : 'on no line yet';
  return `${file.name} (${[name, place].filter(Boolean).join(' ')})`;
}
