import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Moment } from '#src/components/ui/moment.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { Tabs } from '#src/components/ui/tabs.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import type { CapturedMessage } from '#shared/generated/api-types.ts';
import { messageQuery } from '../api/message.ts';
import { framedHtml, splitLinks } from '../components/framed-html.ts';

export function Component() {
  const { id = '' } = useParams();
  const found = useQuery(messageQuery(id));
  const message = found.data;
  return (
    <>
      <DocumentTitle>{message?.subject ?? 'Message'}</DocumentTitle>
      <PageBand
        title={message?.subject ?? 'Message'}
        facts={
          message ? (
            <>
              <Fact word="to">{message.recipients.join(', ')}</Fact>
              <Fact word="from">{message.sender}</Fact>
              <Fact>
                <Moment at={message.at} />
              </Fact>
            </>
          ) : null
        }
        actions={<TextLink to={paths.mail.to()}>All messages</TextLink>}
      />
      {found.isPending ? <Skeleton lines={8} /> : null}
      {found.isError ? (
        <ErrorState error={found.error} what="The message" onRetry={() => void found.refetch()} />
      ) : null}
      {message ? <Body key={message.id} message={message} /> : null}
    </>
  );
}

function Body({ message }: { message: CapturedMessage }) {
  const [shown, setShown] = useState<'html' | 'text'>(message.html ? 'html' : 'text');
  return (
    <Tabs
      label="Forms of the message"
      value={shown}
      onChange={setShown}
      tabs={[
        ...(message.html ? [{ value: 'html' as const, label: 'As shown' }] : []),
        { value: 'text' as const, label: 'As plain text' },
      ]}
    >
      {shown === 'html' && message.html ? (
        <iframe
          title={`Message: ${message.subject}`}
          sandbox="allow-top-navigation-by-user-activation"
          srcDoc={framedHtml(message.html)}
          className="h-[calc(100dvh-9rem)] w-full"
        />
      ) : (
        <pre className="max-w-3xl px-gutter py-4 font-sans wrap-anywhere whitespace-pre-wrap">
          {message.text === null
            ? 'This message has no plain text.'
            : splitLinks(message.text).map((part, index) =>
                part.link ? (
                  <a key={index} href={part.text} className="underline underline-offset-4">
                    {part.text}
                  </a>
                ) : (
                  part.text
                ),
              )}
        </pre>
      )}
    </Tabs>
  );
}
