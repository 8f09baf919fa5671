import { inflateSync } from 'node:zlib';

export type PdfForTests = {
  /** Words of each page, in the order they are written. */
  readonly pages: readonly string[];
  readonly fonts: readonly string[];
  /** Font files within. */
  readonly embedded: number;
  readonly pictures: number;
  readonly mediaBoxes: readonly string[];
};

type Part = { readonly head: string; readonly body: Buffer | null };

/** Objects of a PDF by number, as far as a document of our own is made: no object streams, no encryption. */
function objects(file: Buffer): Map<number, Part> {
  const text = file.toString('latin1');
  const found = new Map<number, Part>();
  for (const match of text.matchAll(/(?:^|\n)(\d+) 0 obj\n([\s\S]*?)\nendobj/g)) {
    const [, number = '', whole = ''] = match;
    const at = whole.indexOf('\nstream\n');
    const head = at === -1 ? whole : whole.slice(0, at);
    const raw =
      at === -1 ? null : Buffer.from(whole.slice(at + 8, whole.lastIndexOf('\nendstream')), 'latin1');
    const body = raw && head.includes('/FlateDecode') ? inflateSync(raw) : raw;
    found.set(Number(number), { head, body });
  }
  return found;
}

/** Glyph number -> letters, of a ToUnicode map. */
function letters(map: string): Map<number, string> {
  const of = new Map<number, string>();
  for (const range of map.matchAll(/<([0-9a-f]+)> <[0-9a-f]+> \[([^\]]*)\]/gi)) {
    const first = Number.parseInt(range[1] ?? '0', 16);
    [...(range[2] ?? '').matchAll(/<([0-9a-f ]*)>/gi)].forEach((code, index) => {
      const units = (code[1] ?? '').replaceAll(' ', '').match(/.{4}/g) ?? [];
      of.set(first + index, String.fromCharCode(...units.map((unit) => Number.parseInt(unit, 16))));
    });
  }
  return of;
}

const reference = (head: string, key: string): number =>
  Number(new RegExp(`/${key} (\\d+) 0 R`).exec(head)?.[1] ?? 0);

/** What a reader of the file would find. */
export function readPdfForTests(file: Buffer): PdfForTests {
  const all = objects(file);
  const heads = [...all.values()].map((part) => part.head);
  const fonts = new Map<string, Map<number, string>>();
  const pages: string[] = [];
  const mediaBoxes: string[] = [];
  for (const { head } of all.values()) {
    if (!/\/Type \/Page\b(?!s)/.test(head)) continue;
    const resources = all.get(reference(head, 'Resources'))?.head ?? head;
    for (const [, name = '', number = '0'] of resources.matchAll(/\/(F\d+) (\d+) 0 R/g)) {
      const map = all.get(reference(all.get(Number(number))?.head ?? '', 'ToUnicode'))?.body;
      if (map) fonts.set(name, letters(map.toString('latin1')));
    }
    mediaBoxes.push(/\/MediaBox \[([^\]]*)\]/.exec(head)?.[1] ?? '');
    pages.push(wordsOf(all.get(reference(head, 'Contents'))?.body?.toString('latin1') ?? '', fonts));
  }
  return {
    pages,
    mediaBoxes,
    fonts: [...new Set(heads.flatMap((head) => /\/FontName \/\w+\+([\w-]+)/.exec(head)?.[1] ?? []))],
    embedded: heads.filter((head) => /\/FontFile2 \d+/.test(head)).length,
    pictures: heads.filter((head) => head.includes('/Subtype /Image')).length,
  };
}

function wordsOf(commands: string, fonts: Map<string, Map<number, string>>): string {
  let font: Map<number, string> | undefined;
  const said: string[] = [];
  for (const [, name, shown] of commands.matchAll(/\/(F\d+) [\d.]+ Tf|\[([^\]]*)\] TJ/g)) {
    if (name) font = fonts.get(name);
    else {
      const glyphs = [...(shown ?? '').matchAll(/<([0-9a-f]+)>/gi)].flatMap(
        ([, hex = '']) => hex.match(/.{4}/g) ?? [],
      );
      said.push(glyphs.map((glyph) => font?.get(Number.parseInt(glyph, 16)) ?? '?').join(''));
    }
  }
  return said.join(' ').replaceAll('\u00a0', ' ');
}
