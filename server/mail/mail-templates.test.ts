import { expect, it } from 'vitest';
import { renderMail } from '#server/mail/mail-templates.ts';

const returned = {
  batchId: '5f0c',
  batchNumber: '17-06',
  workOrder: 'LEC-17 <north>',
  inspector: 'R. "Bo" O’Neil',
  nextRevision: 1,
  dueOn: '2026-05-01',
  approved: 11,
  returned: 1,
  held: 0,
  findings: [
    {
      structureNumber: 'P-104',
      finding: 'Fill ratio short',
      detail: '0.93 against at least 1.00, Set!H9',
      due: 'Rework',
      dueOn: '2026-05-01',
      reason: 'Top it up & photograph the <finish>.',
    },
  ],
};

it('says the same in plain text and in HTML', () => {
  const { subject, text, html } = renderMail('batch-returned', returned, {
    publicUrl: 'https://poles.example',
  });
  expect(subject).toBe('Batch 17-06: 1 line returned, due 1 May 2026');
  for (const said of [
    'P-104',
    'Fill ratio short',
    '0.93 against at least 1.00, Set!H9',
    'Rework',
    '1 May 2026',
  ]) {
    expect(text).toContain(said);
    expect(html).toContain(said);
  }
  expect(text).toContain('https://poles.example/batches/5f0c');
  expect(html).toContain('href="https://poles.example/batches/5f0c"');
});

it('escapes what people wrote in HTML and leaves it alone in plain text', () => {
  const { text, html } = renderMail('batch-returned', returned, { publicUrl: 'https://poles.example' });
  expect(text).toContain('Top it up & photograph the <finish>.');
  expect(html).toContain('Top it up &amp; photograph the &lt;finish&gt;.');
  expect(html).toContain('LEC-17 &lt;north&gt;');
  expect(html).toContain('R. &quot;Bo&quot; O’Neil');
});

it('a line break in a number ends no header', () => {
  const { subject } = renderMail(
    'batch-approved',
    { ...returned, batchNumber: '17-06\r\nBcc: everyone@people.example', revision: 0 },
    { publicUrl: 'https://poles.example' },
  );
  expect(subject).toBe('Batch 17-06 Bcc: everyone@people.example approved');
});
