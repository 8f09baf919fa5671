import { once } from 'node:events';
import { createReadStream, createWriteStream, type WriteStream } from 'node:fs';
import { createInterface } from 'node:readline';
import { finished } from 'node:stream/promises';
import type { SheetContent } from './sheet-content.ts';

/** Sheets in a file, a line each: a batch of thousands is never in memory at once. */
export class SheetSpool {
  readonly #path: string;
  readonly #file: WriteStream;

  constructor(path: string) {
    this.#path = path;
    this.#file = createWriteStream(path, { flags: 'wx', mode: 0o600 });
  }

  async add(content: SheetContent): Promise<void> {
    if (!this.#file.write(`${JSON.stringify(content)}\n`)) await once(this.#file, 'drain');
  }

  async close(): Promise<void> {
    this.#file.end();
    await finished(this.#file);
  }

  async *read(): AsyncGenerator<SheetContent> {
    const lines = createInterface({ input: createReadStream(this.#path), crlfDelay: Infinity });
    for await (const line of lines) yield JSON.parse(line) as SheetContent;
  }
}
