import { Fragment } from 'react';

/** An e-mail address; too long for its place, it breaks at the sign and not within a name. */
export function Address({ children }: { children: string }) {
  return children.split('@').map((part, index) => (
    <Fragment key={part}>
      {index > 0 ? (
        <>
          @<wbr />
        </>
      ) : null}
      {part}
    </Fragment>
  ));
}
