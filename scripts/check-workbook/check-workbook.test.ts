import { execFile } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { writeWorkbook } from '#server/workbook/write-workbook.ts';
import { CLEAN_LINES, CLEAN_POURS } from '#shared/check/testing.ts';
import { runCheck } from './run-check.ts';

const HEAD = { workOrder: 'W-1', contractor: 'Brindle', foreman: 'A. Foreman' };
let folder = '';
const path = (name: string) => join(folder, name);

type Json = {
  readonly records: readonly { readonly structureNumber: string; readonly derived: Record<string, number> }[];
  readonly findings: readonly Readonly<Record<string, unknown>>[];
  readonly skipped: readonly unknown[];
};

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'upstand-check-'));
  const { set, straighten, relevel } = CLEAN_LINES;
  const pours = [...CLEAN_POURS.set, ...CLEAN_POURS.straighten, ...CLEAN_POURS.relevel];
  const kinds = { set: [set], straighten: [straighten], relevel: [relevel] };
  await writeWorkbook(path('clean.xlsx'), { ...HEAD, ...kinds, pours });
  const short = { ...set, embedmentFt: 5.5, boreTopIn: '1.200,5', boreDepthFt: null };
  await writeWorkbook(path('bad.xlsx'), { ...HEAD, set: [short], pours: CLEAN_POURS.set });
  await writeFile(path('text.xlsx'), 'not a workbook');
});
afterAll(() => rm(folder, { recursive: true, force: true }));

// A reading process starts for each workbook.
describe('npm run check', { timeout: 60_000 }, () => {
  it('exits 0 on a clean workbook and prints a report by line', async () => {
    const { exitCode, stdout, stderr } = await runCheck([path('clean.xlsx')]);
    expect({ exitCode, stderr }).toEqual({ exitCode: 0, stderr: '' });
    // WR-01, WR-17 and the pad of testing.ts.
    expect(stdout).toContain('S-1  Set row 4  void 8.67 ft³, foam 9.50 ft³, fill ratio 1.10 ± 0.11');
    expect(stdout).toContain('S-2  Straighten row 4  void 0.69 ft³');
    expect(stdout).toContain('3 lines: 0 nonconformities, 0 queries, 0 notes.');
    expect(stdout).toContain('photographs are not known here');
  });

  it('exits 1 on findings and prints one JSON document', async () => {
    const { exitCode, stdout } = await runCheck([path('bad.xlsx'), '--json']);
    const report = JSON.parse(stdout) as Json;
    expect(exitCode).toBe(1);
    expect(Object.keys(report)).toEqual(['records', 'findings', 'skipped']);
    expect(report.records).toMatchObject([{ structureNumber: 'S-1', derived: { voidFt3: null, dueFt: 6 } }]);
    expect(report.findings).toMatchObject([
      {
        code: 'embedment-short',
        structureNumber: 'S-1',
        measured: 5.5,
        limit: 6,
        margin: -0.5,
        sheet: 'Set',
        row: 4,
      },
      { code: 'record-missing', field: 'boreDepthFt', cell: 'U4' },
      { code: 'record-unreadable', field: 'boreTopIn', cell: 'O4', measured: '1.200,5' },
    ]);
    for (const finding of report.findings) {
      expect(finding).not.toHaveProperty('ownerParams');
      expect(finding['message']).toEqual(expect.any(String));
    }
  });

  it('takes lots and design list from a context file', async () => {
    const lots = [{ product: 'EP-15', number: 'L-7' }];
    const design = [{ structureNumber: 'S-1' }, { structureNumber: 'P-1', kind: 'relevel' }];
    await writeFile(path('context.json'), JSON.stringify({ zone: 'America/Denver', lots, design }));
    const { stdout } = await runCheck([path('clean.xlsx'), '--json', '--context', path('context.json')]);
    const { findings, skipped } = JSON.parse(stdout) as Json;
    const found = findings.map(({ code, structureNumber }) => `${String(code)} ${String(structureNumber)}`);
    expect(found).toEqual([
      'lot-unknown S-1',
      'lot-unknown S-1',
      'lot-unknown S-2',
      'not-on-order S-2',
      'lot-unknown P-1',
    ]);
    expect(skipped).toEqual([
      { code: 'brand-differs', reason: 'off' },
      { code: 'clock-future', reason: 'no-time' },
      { code: 'lot-overdrawn', reason: 'no-lot-use' },
      { code: 'position-shared', reason: 'no-register' },
      { code: 'position-outside', reason: 'no-area' },
      { code: 'already-on-record', reason: 'no-register' },
      { code: 'changed-to-pass', reason: 'no-earlier-check' },
      ...['missing', 'reused', 'alike', 'elsewhen', 'elsewhere', 'undated', 'small'].map((what) => ({
        code: `photo-${what}`,
        reason: 'no-photos',
      })),
    ]);
  });

  it.each([
    ['no workbook', ['text.xlsx'], 'not-a-workbook'],
    ['a missing file', ['nowhere.xlsx'], 'file-missing'],
    ['no file named', [], 'usage'],
  ])('exits 2 on %s, with the problem as the document', async (_name, files, code) => {
    const { exitCode, stdout } = await runCheck([...files.map(path), '--json']);
    expect(exitCode).toBe(2);
    expect(JSON.parse(stdout)).toMatchObject({ problem: { code, detail: expect.any(String) as string } });
  });

  it('exits 2 on a context file that cannot be used, naming every fault', async () => {
    await writeFile(path('wrong.json'), JSON.stringify({ lots: [{ product: 'EP-15' }], colour: 'red' }));
    const { exitCode, stderr, stdout } = await runCheck([
      path('clean.xlsx'),
      '--context',
      path('wrong.json'),
    ]);
    expect({ exitCode, stdout }).toEqual({ exitCode: 2, stdout: '' });
    expect(stderr).toContain('lots/0');
    expect(stderr).toContain('colour');
    await writeFile(path('mars.json'), JSON.stringify({ zone: 'Mars/Olympus' }));
    const mars = await runCheck([path('clean.xlsx'), '--context', path('mars.json')]);
    expect(mars.stderr).toContain('"Mars/Olympus" is no IANA time zone');
  });

  it('hands its exit code to the shell', async () => {
    const entry = new URL('./check-workbook.ts', import.meta.url).pathname;
    const run = promisify(execFile)(process.execPath, ['--import', 'tsx', entry, path('text.xlsx')]);
    await expect(run).rejects.toMatchObject({ code: 2, stdout: '' });
  });
});
