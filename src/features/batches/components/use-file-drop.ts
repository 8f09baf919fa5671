import { useEffect, useRef, useState } from 'react';
import { readDropped } from '../lib/read-dropped.ts';

/** Files and folders dropped anywhere on the page. True while some are held over it. */
export function useFileDrop(onFiles: ((files: readonly File[]) => void) | null): boolean {
  const [over, setOver] = useState(false);
  const current = useRef(onFiles);
  useEffect(() => {
    current.current = onFiles;
  });
  useEffect(() => {
    let depth = 0;
    const carriesFiles = (event: DragEvent) =>
      current.current !== null && event.dataTransfer?.types.includes('Files') === true;
    function enter(event: DragEvent) {
      if (!carriesFiles(event)) return;
      depth += 1;
      setOver(true);
    }
    function leave(event: DragEvent) {
      if (!carriesFiles(event)) return;
      depth -= 1;
      if (depth <= 0) setOver(false);
    }
    function hover(event: DragEvent) {
      if (carriesFiles(event)) event.preventDefault();
    }
    function drop(event: DragEvent) {
      depth = 0;
      setOver(false);
      if (!carriesFiles(event) || !event.dataTransfer) return;
      event.preventDefault();
      void readDropped(event.dataTransfer).then((files) => current.current?.(files));
    }
    document.addEventListener('dragenter', enter);
    document.addEventListener('dragleave', leave);
    document.addEventListener('dragover', hover);
    document.addEventListener('drop', drop);
    return () => {
      document.removeEventListener('dragenter', enter);
      document.removeEventListener('dragleave', leave);
      document.removeEventListener('dragover', hover);
      document.removeEventListener('drop', drop);
    };
  }, []);
  return over;
}
