import type { MailContent } from '#server/mail/content.ts';

export type LotBlocked = {
  readonly lotId: string;
  readonly lotNumber: string;
  readonly product: string;
  readonly status: 'held' | 'recalled';
  readonly reason: string;
  readonly by: string;
  /** The recipient's own structures only. */
  readonly structures: readonly string[];
};

export function lotBlocked(data: LotBlocked): MailContent {
  return {
    subject: `Lot ${data.lotNumber} of ${data.product} ${data.status}`,
    heading: `Lot ${data.lotNumber} of ${data.product} is ${data.status}`,
    blocks: [
      { type: 'text', text: 'Do not pour from this lot. Set its kits aside until you hear more.' },
      { type: 'quote', by: data.by, text: data.reason },
      ...(data.structures.length === 0
        ? []
        : [
            {
              type: 'facts' as const,
              facts: [['Your structures with foam of this lot', data.structures.join(', ')] as const],
            },
          ]),
      { type: 'link', label: 'Open your batches', path: '/batches' },
    ],
  };
}
