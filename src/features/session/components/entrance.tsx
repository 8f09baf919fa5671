import type { ReactNode } from 'react';
import { useQuery } from '@tanstack/react-query';
import { EntranceDrawing } from '#src/features/session/components/entrance-drawing.tsx';
import { Mark } from '#src/components/ui/mark.tsx';
import { appInfoQuery } from '#src/features/session/api/app-info.ts';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';

/** The sheet that the pages before the sign-in stand on: a section at the left, the form as its title block. */
export function Entrance({ title, children }: { title: string; children: ReactNode }) {
  const { data } = useQuery(appInfoQuery);
  return (
    <main className="flex min-h-dvh p-3 sm:p-5">
      <DocumentTitle>{title}</DocumentTitle>
      <div className="flex flex-1 border border-hairline bg-sheet p-1">
        <div className="grid flex-1 border-[1.5px] border-ink lg:grid-cols-[1fr_minmax(26rem,32rem)]">
          <div className="hidden lg:block">
            {/* Stays in sight beside a form that is longer than the window. */}
            <div className="sticky top-0 h-dvh max-h-[calc(100dvh-3.25rem)]">
              <EntranceDrawing />
            </div>
          </div>
          <div className="flex flex-col border-ink lg:border-l-[1.5px]">
            <div className="flex items-center gap-2.5 border-b border-hairline px-6 py-3 text-lead font-semibold sm:px-8 lg:hidden">
              <Mark />
              Upstand
            </div>
            <div className="border-b-[1.5px] border-ink px-6 py-4 sm:px-8">
              <p className="text-small text-muted">Owner</p>
              <p className="min-h-6 text-lead font-semibold">{data?.owner ?? ''}</p>
            </div>
            <div className="flex-1 px-6 py-7 sm:px-8">
              <h1 className="mb-5 text-display font-semibold">{title}</h1>
              {children}
            </div>
            <p className="border-t border-hairline px-6 py-3 text-small text-query sm:px-8">
              Local codes, the maker’s instructions and a licensed engineer decide; this program does not.
            </p>
          </div>
        </div>
      </div>
    </main>
  );
}
