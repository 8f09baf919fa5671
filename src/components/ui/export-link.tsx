import type { ReactNode } from 'react';
import { ButtonLink } from '#src/components/ui/button.tsx';
import { withQuery, type ApiOptions } from '#src/lib/api/client.ts';

type Props = {
  readonly path: string;
  readonly query?: ApiOptions['query'];
  readonly kind?: 'primary' | 'secondary';
  readonly children: ReactNode;
};

/** A file of the server's, streamed straight to the disk: its size never passes through the page. */
export function ExportLink({ path, query, kind = 'secondary', children }: Props) {
  return (
    <ButtonLink kind={kind} size="small" to={withQuery(path, query)} reloadDocument download>
      {children}
    </ButtonLink>
  );
}
