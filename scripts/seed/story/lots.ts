export type StoryLot = {
  readonly product: 'EP-15';
  readonly number: string;
  readonly expiresOn: string;
  readonly receivedOn: string;
  readonly received: readonly { readonly kitFt3: number; readonly quantity: number }[];
  /** What happened to it later. */
  readonly event?: { readonly type: 'held' | 'recalled'; readonly on: string; readonly reason: string };
};

/** The maker's batches of kits that the cooperative knows. */
export const LOTS: readonly StoryLot[] = [
  {
    product: 'EP-15',
    number: 'LK-2098',
    expiresOn: '2026-03-01',
    receivedOn: '2025-08-18',
    received: [
      { kitFt3: 4, quantity: 20 },
      { kitFt3: 1.5, quantity: 12 },
    ],
  },
  {
    product: 'EP-15',
    number: 'LK-2204',
    expiresOn: '2026-12-31',
    receivedOn: '2026-02-16',
    received: kits(30),
  },
  {
    product: 'EP-15',
    number: 'LK-2291',
    expiresOn: '2027-02-28',
    receivedOn: '2026-03-23',
    received: kits(48),
  },
  {
    product: 'EP-15',
    number: 'LK-2337',
    expiresOn: '2027-05-31',
    receivedOn: '2026-05-26',
    received: kits(36),
  },
  {
    product: 'EP-15',
    number: 'LK-2310',
    expiresOn: '2027-03-31',
    receivedOn: '2026-04-20',
    received: kits(12),
    event: {
      type: 'held',
      on: '2026-05-12',
      reason: 'Two kits of this lot rose slowly at the yard; the maker has been asked.',
    },
  },
];

function kits(quantity: number) {
  return [1.5, 2.5, 4, 6, 8].map((kitFt3) => ({ kitFt3, quantity }));
}
