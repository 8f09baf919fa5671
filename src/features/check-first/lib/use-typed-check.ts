import { useEffect, useRef, useState } from 'react';
import type { CheckContextData } from '#shared/generated/api-types.ts';
import type { TypedLine } from '#shared/workbook/typed-workbook.ts';
import type { FromCheckWorker } from '#src/workers/check/protocol.ts';
import { startCheckWorker, type CheckWorker } from '#src/workers/check/start-worker.ts';

export type TypedResult = Extract<FromCheckWorker, { type: 'typed' }>;

const PAUSE_MS = 200;

/** What the check says of the line as it stands, a moment after the last key. */
export function useTypedCheck(line: TypedLine, context: CheckContextData) {
  const worker = useRef<CheckWorker | null>(null);
  const turn = useRef(0);
  const [result, setResult] = useState<TypedResult | null>(null);
  const [fault, setFault] = useState<string | null>(null);
  useEffect(() => {
    worker.current = startCheckWorker((message) => {
      if (message.type === 'typed') {
        // An answer to what stood there before says nothing of what stands there now.
        if (message.turn === turn.current) setResult(message);
      } else if (message.type === 'fault' || message.type === 'refused') setFault(message.detail);
    });
    return () => worker.current?.end();
  }, []);
  useEffect(() => {
    const timer = setTimeout(() => {
      turn.current += 1;
      worker.current?.ask({ type: 'typed', turn: turn.current, line, context });
    }, PAUSE_MS);
    return () => clearTimeout(timer);
  }, [line, context]);
  return { result, fault };
}
