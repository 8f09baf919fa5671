import { cleanMeasure } from './clean-text.ts';
import { parseNumber } from './parse-number.ts';
import { type Reading, unreadable, value } from './reading.ts';

/** Degrees, minutes, seconds with their marks: `41° 14' 4.2"`. */
const SEXAGESIMAL = /^(\d{1,3}) ?° ?(\d{1,2}(?:\.\d+)?) ?'(?: ?(\d{1,2}(?:\.\d+)?) ?")?$/;
const HEMISPHERES: Readonly<Record<string, string>> = { latitude: 'ns', longitude: 'ew' };

function unsigned(text: string): Reading {
  // One sign was taken off, or a letter stands for it.
  if (/^[+-]/.test(text)) return unreadable('degrees');
  const match = SEXAGESIMAL.exec(text);
  if (!match) {
    const parsed = parseNumber(text.replace(/ ?°$/, ''));
    return 'number' in parsed
      ? value(parsed.number)
      : unreadable(parsed.fault === 'number' ? 'degrees' : parsed.fault);
  }
  const [degrees, minutes, seconds] = [Number(match[1]), Number(match[2]), Number(match[3] ?? 0)];
  if (minutes >= 60 || seconds >= 60) return unreadable('degrees');
  return value(degrees + minutes / 60 + seconds / 3600);
}

/** Decimal degrees, or degrees with minutes and seconds; a hemisphere letter only where the column has one and nothing contradicts it. */
export function readDegrees(text: string, key: string): Reading {
  // `degrees` ends in a letter that also names a hemisphere.
  const clean = cleanMeasure(text).replace(/ ?deg(?:rees?)?\.?/, '°');
  const [, before = '', middle = '', after = ''] = /^([nsew]?) ?(.*?) ?([nsew]?)$/.exec(clean) ?? [];
  const letter = before || after;
  if (letter === '') {
    const signed = /^[+-] ?/.exec(clean)?.[0] ?? '';
    const reading = unsigned(clean.slice(signed.length));
    return signed.startsWith('-') && 'value' in reading ? value(-Number(reading.value) || 0) : reading;
  }
  const reading = unsigned(middle);
  if ('problem' in reading) return /^[+-]/.test(middle) ? unreadable('hemisphere') : unreadable('degrees');
  const fits = (HEMISPHERES[key] ?? '').includes(letter) && !(before !== '' && after !== '');
  if (!fits) return unreadable('hemisphere');
  return value(letter === 's' || letter === 'w' ? -Number(reading.value) || 0 : reading.value);
}
