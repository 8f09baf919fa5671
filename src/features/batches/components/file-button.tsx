import { useRef, type ReactNode } from 'react';
import { Button, type ButtonProps } from '#src/components/ui/button.tsx';

type Props = Pick<ButtonProps, 'kind' | 'size' | 'wide' | 'busy'> & {
  readonly label: string;
  readonly accept?: string;
  readonly multiple?: boolean;
  /** A whole folder with what lies in it. */
  readonly folder?: boolean;
  /** On a phone: the camera instead of the files. */
  readonly camera?: boolean;
  readonly onFiles: (files: readonly File[]) => void;
  readonly children: ReactNode;
};

/** A button that opens the file picker or the camera. */
export function FileButton({ label, accept, multiple, folder, camera, onFiles, children, ...look }: Props) {
  const input = useRef<HTMLInputElement>(null);
  return (
    <>
      <Button {...look} aria-label={label} onClick={() => input.current?.click()}>
        {children}
      </Button>
      <input
        ref={input}
        type="file"
        hidden
        tabIndex={-1}
        aria-hidden="true"
        accept={accept}
        multiple={multiple}
        {...(folder ? { webkitdirectory: '' } : {})}
        {...(camera ? { capture: 'environment' as const } : {})}
        onChange={(event) => {
          const files = [...(event.target.files ?? [])];
          // The same file chosen twice is two choices.
          event.target.value = '';
          if (files.length > 0) onFiles(files);
        }}
      />
    </>
  );
}
