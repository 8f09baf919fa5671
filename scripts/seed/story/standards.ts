import type { Standard } from '#shared/standard/types.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';

export type StoryStandard = {
  readonly n: number;
  readonly effectiveOn: string;
  readonly body: Standard;
  readonly note: string;
  /** e-mail of who drafted it and who published it */
  readonly author: string;
  readonly approver: string;
};

const by = { author: 'engineer@larkmoor.example', approver: 'engineer2@larkmoor.example' };

/** How the owner's standard grew: the water limit came down, then the wait before hardware went up. */
export const STANDARDS: readonly StoryStandard[] = [
  {
    n: 1,
    effectiveOn: '2025-01-06',
    body: withLimits({ waterIn: 3, hardwareMin: 10 }),
    note: 'First version.',
    ...by,
  },
  {
    n: 2,
    effectiveOn: '2025-09-01',
    body: withLimits({ waterIn: 2, hardwareMin: 10 }),
    note: 'Water with the pole in: 2 in instead of 3.',
    ...by,
  },
  {
    n: 3,
    effectiveOn: '2026-03-02',
    body: DEMO_STANDARD,
    note: 'Wait before hardware: 15 minutes instead of 10.',
    ...by,
  },
];

function withLimits({ waterIn, hardwareMin }: { waterIn: number; hardwareMin: number }): Standard {
  const { rules } = DEMO_STANDARD;
  return {
    ...DEMO_STANDARD,
    rules: {
      ...rules,
      'water-deep': { ...rules['water-deep'], params: { ...rules['water-deep'].params, limitIn: waterIn } },
      'hardware-early': {
        ...rules['hardware-early'],
        params: { ...rules['hardware-early'].params, waitMin: hardwareMin },
      },
    },
  };
}
