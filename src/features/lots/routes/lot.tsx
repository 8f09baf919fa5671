import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { Button } from '#src/components/ui/button.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import type { LotDetail } from '#shared/generated/api-types.ts';
import { lotQuery } from '../api/lot.ts';
import { BlockLotDialog } from '../components/block-lot-dialog.tsx';
import type { BlockingType } from '../components/lot-effects.ts';
import { LotTables } from '../components/lot-tables.tsx';
import { Expiry, LotStatus } from '../components/lot-words.tsx';
import { ReceiveDialog } from '../components/receive-dialog.tsx';

type Step = 'received' | BlockingType;
const STEPS: readonly { can: string; step: Step; word: string }[] = [
  { can: 'receive', step: 'received', word: 'Kits received…' },
  { can: 'hold', step: 'held', word: 'Hold…' },
  { can: 'release', step: 'released', word: 'Release…' },
  { can: 'recall', step: 'recalled', word: 'Recall…' },
];

/** A lot with its balance and every structure it went into. */
export function Component() {
  const { id = '' } = useParams();
  const found = useQuery(lotQuery(id));
  const [step, setStep] = useState<Step | null>(null);
  const lot = found.data;
  return (
    <>
      <DocumentTitle>{lot ? `Lot ${lot.number}` : 'Lot'}</DocumentTitle>
      <PageBand
        title={lot ? `Lot ${lot.number}` : 'Lot'}
        facts={lot ? <LotFacts lot={lot} /> : null}
        actions={STEPS.filter(({ can }) => lot?.can.includes(can)).map(({ step: to, word }) => (
          <Button key={to} size="small" onClick={() => setStep(to)}>
            {word}
          </Button>
        ))}
      />
      {found.isPending ? <Skeleton lines={8} /> : null}
      {found.isError ? (
        <ErrorState error={found.error} what="The lot" onRetry={() => void found.refetch()} />
      ) : null}
      {lot ? (
        <>
          <Balance lot={lot} />
          <LotTables lot={lot} />
        </>
      ) : null}
      {lot && step === 'received' ? <ReceiveDialog lot={lot} onDone={() => setStep(null)} /> : null}
      {lot && step !== null && step !== 'received' ? (
        <BlockLotDialog lot={lot} type={step} onDone={() => setStep(null)} />
      ) : null}
    </>
  );
}

function LotFacts({ lot }: { lot: LotDetail }) {
  return (
    <>
      <Fact>{lot.product.code}</Fact>
      <LotStatus status={lot.status} />
      <Fact>
        <Expiry on={lot.expiresOn} worded />
      </Fact>
      <Fact word="received">
        <Quantity value={lot.receivedFt3} unit="ft3" />
      </Fact>
      <Fact word="used">
        <Quantity value={lot.usedFt3} unit="ft3" />
      </Fact>
      <Fact word="balance">
        <Quantity value={lot.balanceFt3} unit="ft3" margin className="font-semibold" />
      </Fact>
    </>
  );
}

/** Used of received, to scale; more used than received is a contradiction somebody has to explain. */
function Balance({ lot }: { lot: LotDetail }) {
  const whole = Math.max(lot.receivedFt3, lot.usedFt3);
  if (whole === 0) return null;
  const used = `${(Math.min(lot.usedFt3, lot.receivedFt3) / whole) * 100}%`;
  const over = `${(Math.max(0, lot.usedFt3 - lot.receivedFt3) / whole) * 100}%`;
  return (
    <div className="border-b border-hairline px-gutter py-3.5">
      <div aria-hidden="true" className="flex h-3 max-w-3xl border border-rule bg-sheet">
        <span className="bg-foam-cell" style={{ width: used }} />
        <span className="bg-nonconform" style={{ width: over }} />
      </div>
      {lot.balanceFt3 < 0 ? (
        <div className="mt-3 max-w-3xl">
          <Callout tone="query" title="More is written down as used than was received">
            A receipt is missing, or a pour names the wrong lot. Compare the receipts with the structures
            below.
          </Callout>
        </div>
      ) : null}
    </div>
  );
}
