/** Shown on the sign-in page of the demo, in this order. */
export const DEMO_ACCOUNTS = [
  'contractor@brindle.example',
  'contractor@tamsett.example',
  'inspector@larkmoor.example',
  'engineer@larkmoor.example',
  'engineer2@larkmoor.example',
  'clerk@larkmoor.example',
  'auditor@larkmoor.example',
  'admin@larkmoor.example',
] as const;
