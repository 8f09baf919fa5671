import { Callout } from '#src/components/ui/callout.tsx';
import { Day, Moment } from '#src/components/ui/moment.tsx';
import { Fact, PageBand, SectionHead } from '#src/components/ui/page-band.tsx';
import { StateWord } from '#src/components/ui/state-word.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { MeasuredAgainst } from '#src/components/ui/measured-against.tsx';
import { paths } from '#src/config/paths.ts';
import { AnswerForm } from '#src/features/concessions/components/answer-form.tsx';
import { ConcessionSheet } from '#src/features/concessions/components/concession-sheet.tsx';
import { CONCESSION_WORDS } from '#src/features/concessions/components/concession-words.ts';
import { counted } from '#src/lib/formats.ts';
import { useUser } from '#src/lib/session/session.ts';
import type { Concession } from '#shared/generated/api-types.ts';

/** What is to be accepted as built, why it was asked, and the answer. */
export function ConcessionPage({ concession }: { concession: Concession }) {
  const user = useUser();
  const { findings, batch } = concession;
  const recordId = findings.find((finding) => finding.recordId !== null)?.recordId ?? null;
  const batchTo = user.role === 'contractor' ? paths.batch.to(batch.id) : paths.reviewBatch.to(batch.id);
  return (
    <>
      <PageBand
        title={`Concession ${concession.number}`}
        facts={
          <>
            <Fact>
              <StateWord {...CONCESSION_WORDS[concession.state]} />
            </Fact>
            <Fact word="batch">
              <TextLink to={batchTo}>{batch.number}</TextLink>
            </Fact>
            <Fact word="from">{concession.contractor.name}</Fact>
          </>
        }
      />
      <div className="grid flex-1 lg:grid-cols-[minmax(0,1fr)_28rem]">
        <section aria-labelledby="asked-for">
          <SectionHead
            title="What is to be accepted as built"
            id="asked-for"
            aside={counted(findings.length, 'finding')}
          />
          <ul>
            {findings.map((finding) => (
              <li key={finding.id} className="border-b border-hairline px-gutter py-3">
                <h3 className="font-semibold">
                  {finding.structureNumber ? `${finding.structureNumber}: ` : ''}
                  {finding.title}
                </h3>
                <MeasuredAgainst
                  measured={finding.measured}
                  limit={finding.limit}
                  margin={finding.margin}
                  unit={finding.unit}
                  uncertainty={finding.uncertainty}
                />
                <p className="text-ink-2">{finding.message}</p>
                {finding.recordId ? (
                  <p className="mt-1">
                    <TextLink to={paths.record.to(finding.recordId)}>
                      Record of {finding.structureNumber}, with its drawing and photographs
                    </TextLink>
                  </p>
                ) : null}
              </li>
            ))}
          </ul>
          <div className="px-gutter py-3">
            <p className="text-table text-muted">
              Asked by {concession.askedBy}, <Moment at={concession.askedAt} />
            </p>
            <p className="mt-0.5 text-lead">{concession.askedReason}</p>
          </div>
          {recordId ? <ConcessionSheet recordId={recordId} /> : null}
        </section>
        <section aria-labelledby="answer" className="lg:border-l">
          <SectionHead title="Answer" id="answer" />
          <div className="px-gutter py-3">
            {concession.can.includes('decide') ? (
              <AnswerForm concession={concession} />
            ) : (
              <Answer concession={concession} />
            )}
          </div>
        </section>
      </div>
    </>
  );
}

function Answer({ concession }: { concession: Concession }) {
  const { state, reason, condition, endsOn, answeredBy, answeredAt } = concession;
  if (state === 'asked') {
    return (
      <p className="text-ink-2">Not answered yet. Any engineer may answer; the line is held until then.</p>
    );
  }
  if (state === 'withdrawn') {
    return <p className="text-ink-2">Withdrawn: nothing waits for an answer any longer.</p>;
  }
  return (
    <Callout
      tone={state === 'granted' ? 'conform' : 'nonconform'}
      title={state === 'granted' ? 'Granted' : 'Refused'}
    >
      <p>{reason}</p>
      {condition ? (
        <p className="mt-1">
          <span className="text-muted">Condition: </span>
          {condition}
        </p>
      ) : null}
      {endsOn ? (
        <p className="mt-1">
          <span className="text-muted">Ends </span>
          <Day on={endsOn} />
        </p>
      ) : null}
      <p className="mt-1 text-muted">
        {answeredBy}
        {answeredAt ? (
          <>
            , <Moment at={answeredAt} />
          </>
        ) : null}
      </p>
    </Callout>
  );
}
