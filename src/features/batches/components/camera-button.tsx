import { FileButton } from './file-button.tsx';
import { missingPhotographs } from '../lib/next-photograph.ts';
import type { LineView } from '../lib/line-view.ts';
import { counted } from '#src/lib/formats.ts';
import type { QueuedFile } from '#src/lib/api/upload-queue.ts';

type Props = {
  readonly lines: readonly LineView[];
  readonly files: readonly QueuedFile[];
  readonly onPhotograph: (file: File, name: string) => void;
};

/** The next photograph that the check misses: one touch, and the phone's camera opens. */
export function CameraButton({ lines, files, onPhotograph }: Props) {
  const taken = new Set(files.filter((one) => one.state !== 'failed').map((one) => one.file.name));
  const missing = missingPhotographs(lines, taken);
  const [next] = missing;
  if (!next) return null;
  return (
    <div className="border-b border-hairline px-gutter py-3">
      <FileButton
        kind="primary"
        size="large"
        wide
        camera
        accept="image/jpeg,image/png,image/webp"
        label={`Photograph ${next.label}`}
        onFiles={([file]) => file && onPhotograph(file, next.fileName)}
      >
        <svg
          viewBox="0 0 24 20"
          width="24"
          height="20"
          fill="none"
          stroke="currentColor"
          strokeWidth="1.8"
          aria-hidden="true"
          className="shrink-0"
        >
          <path d="M1.5 4.5h5l1.8-3h7.4l1.8 3h5v14h-21z" strokeLinejoin="round" />
          <circle cx="12" cy="11" r="4.2" />
        </svg>
        <span className="py-2 text-left leading-tight whitespace-normal">Photograph {next.label}</span>
      </FileButton>
      {missing.length > 1 ? (
        <p className="mt-1.5 text-small text-muted">
          After it, {counted(missing.length - 1, 'more view is', 'more views are')} missing.
        </p>
      ) : null}
    </div>
  );
}
