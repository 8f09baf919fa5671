/** Issues one transmittal and says what it took; nothing else runs in this process. */
import { memoryOf } from '#scripts/bench/lib/memory.ts';
import { loadConfig } from '#server/config/config.ts';
import { createServices } from '#server/container.ts';
import { row } from '#server/db/rows.ts';
import { issueTransmittal } from '#server/modules/transmittals/issue-transmittal.ts';

const transmittalId = process.argv[2] ?? '';
const services = await createServices(loadConfig(process.env));
try {
  const began = performance.now();
  await issueTransmittal({ transmittalId }, {
    services,
    em: services.orm.em.fork(),
    job: { id: transmittalId, attempt: 1, last: true },
    signal: new AbortController().signal,
  } as Parameters<typeof issueTransmittal>[1]);
  const ms = performance.now() - began;
  const issued = await row<{ size: number; rows: number }>(
    services.orm.em.fork(),
    'select size, rows from transmittals where id = $1',
    [transmittalId],
  );
  process.stdout.write(JSON.stringify({ ms, ...issued, peakMb: memoryOf(process.pid).peak }));
} finally {
  await services.close();
}
