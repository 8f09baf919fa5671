import { expect, it } from 'vitest';
import { splitLinks } from './framed-html.ts';

it('addresses in a text are found without the stop behind them', () => {
  expect(splitLinks('Open http://127.0.0.1:4600/batches/1. Thank you')).toEqual([
    { text: 'Open ', link: false },
    { text: 'http://127.0.0.1:4600/batches/1', link: true },
    { text: '. Thank you', link: false },
  ]);
  expect(splitLinks('javascript:alert(1)')).toEqual([{ text: 'javascript:alert(1)', link: false }]);
});
