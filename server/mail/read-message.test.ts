import { createTransport } from 'nodemailer';
import { expect, it } from 'vitest';
import { readMessage } from '#server/mail/read-message.ts';

it.each([
  ['plain words', 'One line.', '<p>One line.</p>'],
  [
    'Überhöhung ≥ 1,00 – Mast № 7 '.repeat(4).trim(),
    'Grüße,\n„Ünïcödé“ 東京 = 100 %\n'.repeat(30),
    '<p>é</p>'.repeat(60),
  ],
])('reads back what the sender wrote: %s', async (subject, text, html) => {
  const { message } = await createTransport({ streamTransport: true, buffer: true }).sendMail({
    from: 'a@people.example',
    to: 'b@people.example',
    subject,
    text,
    html,
  });
  const read = readMessage((message as Buffer).toString('utf8'));
  expect(read.subject).toBe(subject);
  expect(read.text?.replaceAll('\r\n', '\n').trim()).toBe(text.trim());
  expect(read.html?.trim()).toBe(html);
});

it('reads a message without parts', () => {
  const read = readMessage('Subject: Hello\r\nX-Long: a\r\n b\r\n\r\nBody\r\n');
  expect(read).toMatchObject({ subject: 'Hello', text: 'Body\r\n', html: null });
  expect(read.headers.get('x-long')).toBe('a b');
});
