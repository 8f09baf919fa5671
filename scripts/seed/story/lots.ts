export type StoryLot = {
  readonly product: 'EP-15';
  readonly number: string;
  readonly expiresOn: string;
  readonly received: readonly { readonly kitFt3: number; readonly quantity: number }[];
  /** What happened to it later. */
  readonly event?: { readonly type: 'held' | 'recalled'; readonly reason: string };
};

/** The maker's batches of kits that the cooperative knows. */
export const LOTS: readonly StoryLot[] = [
  {
    product: 'EP-15',
    number: 'LK-2098',
    expiresOn: '2026-03-01',
    received: [
      { kitFt3: 4, quantity: 20 },
      { kitFt3: 1.5, quantity: 12 },
    ],
  },
  { product: 'EP-15', number: 'LK-2204', expiresOn: '2026-12-31', received: kits(30) },
  { product: 'EP-15', number: 'LK-2291', expiresOn: '2027-02-28', received: kits(48) },
  { product: 'EP-15', number: 'LK-2337', expiresOn: '2027-05-31', received: kits(36) },
  {
    product: 'EP-15',
    number: 'LK-2310',
    expiresOn: '2027-03-31',
    received: kits(12),
    event: {
      type: 'held',
      reason: 'Two kits of this lot rose slowly at the yard; the maker has been asked.',
    },
  },
];

function kits(quantity: number) {
  return [1.5, 2.5, 4, 6, 8].map((kitFt3) => ({ kitFt3, quantity }));
}
