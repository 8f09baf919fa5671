import type { MailContent } from '#server/mail/content.ts';
import { formatDay } from '#shared/dates/format-day.ts';

export type ConcessionAnswered = {
  readonly concessionId: string;
  readonly number: string;
  readonly batchNumber: string;
  readonly answer: 'granted' | 'refused';
  readonly engineer: string;
  readonly reason: string;
  readonly condition: string | null;
  /** YYYY-MM-DD. */
  readonly endsOn: string | null;
  readonly structures: readonly string[];
};

export function concessionAnswered(data: ConcessionAnswered): MailContent {
  const facts: [string, string][] = [
    ['Batch', data.batchNumber],
    ['Structures', data.structures.join(', ')],
  ];
  if (data.condition !== null) facts.push(['Condition', data.condition]);
  if (data.endsOn !== null) facts.push(['Ends on', formatDay(data.endsOn)]);
  return {
    subject: `Concession ${data.number} ${data.answer}`,
    heading: `Concession ${data.number} was ${data.answer}`,
    blocks: [
      {
        type: 'text',
        text:
          data.answer === 'granted'
            ? 'What does not conform is accepted as built.'
            : 'What does not conform is not accepted as built; the line needs another decision.',
      },
      { type: 'facts', facts },
      { type: 'quote', by: data.engineer, text: data.reason },
      { type: 'link', label: 'Open the concession', path: `/concessions/${data.concessionId}` },
    ],
  };
}
