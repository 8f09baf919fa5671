import { randomBytes } from 'node:crypto';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { Readable } from 'node:stream';
import { buffer } from 'node:stream/consumers';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { row, run } from '#server/db/rows.ts';
import { BlobMissing, BlobTooLarge, createBlobStore, type BlobStore } from '#server/storage/blob-store.ts';
import { rememberBlob } from '#server/storage/remember-blob.ts';
import { sweep } from '#server/storage/sweep-blobs.ts';
import { createDataHarness, type DataHarness } from '#tests/setup/data-harness.ts';

let data: DataHarness;
let store: BlobStore;
beforeAll(async () => {
  data = await createDataHarness();
  // A container of its own: the sweeper takes what this database does not know.
  store = await createBlobStore(data.database.storage, `blobs-${randomBytes(4).toString('hex')}`);
});
afterAll(() => data.close());

const MB = 1024 * 1024;
/** FIPS 180-2, appendix B.1: SHA-256 of the three bytes "abc". */
const ABC = 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad';

async function names(): Promise<string[]> {
  const found: string[] = [];
  for await (const item of store.list()) found.push(item.name);
  return found;
}

it('keeps a file under the SHA-256 of its bytes, once', async () => {
  expect(
    await store.putStream(Readable.from([Buffer.from('a'), Buffer.from('bc')]), { maxBytes: 3 }),
  ).toEqual({
    sha256: ABC,
    size: 3,
    existed: false,
  });
  expect(await store.putStream(Readable.from([Buffer.from('abc')]), { maxBytes: 3 })).toEqual({
    sha256: ABC,
    size: 3,
    existed: true,
  });
  expect(await names()).toEqual([`ba/${ABC}`]);
  expect((await buffer(await store.openRead(ABC))).toString()).toBe('abc');
  expect((await buffer(await store.openRead(ABC, { offset: 1, count: 1 }))).toString()).toBe('b');
  expect(await store.size(ABC)).toBe(3);
});

it('takes an empty file', async () => {
  // The digest of no bytes at all: NIST CAVP, SHA256ShortMsg, Len = 0.
  expect(await store.putStream(Readable.from([]), { maxBytes: 10 })).toMatchObject({
    sha256: 'e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855',
    size: 0,
  });
});

it('gives back 20 MB byte for byte', async () => {
  const bytes = randomBytes(20 * MB);
  const { sha256 } = await store.putStream(
    Readable.from(
      (function* () {
        for (let at = 0; at < bytes.length; at += 64_000) yield bytes.subarray(at, at + 64_000);
      })(),
    ),
    { maxBytes: 21 * MB },
  );
  const folder = mkdtempSync(path.join(tmpdir(), 'upstand-blob-'));
  await store.readTo(sha256, path.join(folder, 'file'));
  expect(readFileSync(path.join(folder, 'file')).equals(bytes)).toBe(true);
  await expect(store.readTo(sha256, path.join(folder, 'file'))).rejects.toThrow('EEXIST');
  rmSync(folder, { recursive: true });
});

it('leaves nothing of a file that is too large, breaks off or is called off', async () => {
  const before = await names();
  const endless = () =>
    Readable.from(
      (async function* () {
        for (;;) yield randomBytes(MB);
      })(),
    );
  await expect(store.putStream(endless(), { maxBytes: 9 * MB })).rejects.toBeInstanceOf(BlobTooLarge);

  const cut = Readable.from(
    (async function* () {
      yield randomBytes(6 * MB);
      throw new Error('the line went dead');
    })(),
  );
  await expect(store.putStream(cut, { maxBytes: 90 * MB })).rejects.toThrow('the line went dead');

  const call = new AbortController();
  const calledOff = store.putStream(
    Readable.from(
      (async function* () {
        yield randomBytes(6 * MB);
        call.abort();
        yield randomBytes(MB);
      })(),
    ),
    { maxBytes: 90 * MB, signal: call.signal },
  );
  await expect(calledOff).rejects.toMatchObject({ name: 'AbortError' });
  expect(await names()).toEqual(before);
});

it('says that a file is missing, and refuses a name that is no digest', async () => {
  await expect(store.openRead('0'.repeat(64))).rejects.toBeInstanceOf(BlobMissing);
  expect(await store.size('0'.repeat(64))).toBe(null);
  await expect(store.openRead('../secrets')).rejects.toThrow(RangeError);
});

it('sweeps what nothing refers to, and never what is young or referred to', async () => {
  const em = data.orm.em.fork();
  const put = async (text: string) => {
    const blob = await store.putStream(Readable.from([Buffer.from(text)]), { maxBytes: 100 });
    await rememberBlob(em, blob);
    return blob.sha256;
  };
  const kept = await put('referred to');
  const loose = await put('not referred to');
  await run(em, `insert into photo_facts (sha256, pipeline) values ($1, 'test')`, [kept]);
  await run(em, `update blobs set referenced_at = now() - interval '2 days'`);

  // Nothing in the store is older than a day: all of it may belong to an upload under way.
  const dayAgo = new Date(Date.now() - 86_400_000);
  expect(await sweep({ em, blobs: store, before: dayAgo })).toEqual({
    unreferenced: 0,
    unknown: 0,
    incoming: 0,
  });
  expect(await store.exists(loose)).toBe(true);

  const soon = new Date(Date.now() + 60_000);
  await run(em, `update blobs set referenced_at = now() - interval '2 days'`);
  const swept = await sweep({ em, blobs: store, before: soon });
  expect(swept.unreferenced).toBe(1);
  expect(await store.exists(loose)).toBe(false);
  expect(await row(em, 'select 1 from blobs where sha256 = $1', [loose])).toBe(null);
  expect(await store.exists(kept)).toBe(true);
  // Those of the tests above, of which no row tells.
  expect(await store.exists(ABC)).toBe(false);
});

it('an upload of bytes that are there makes them young again', async () => {
  const put = () => store.putStream(Readable.from([Buffer.from('seen again')]), { maxBytes: 100 });
  const { sha256 } = await put();
  const between = await new Promise<Date>((resolve) => {
    // The store tells time in whole seconds.
    setTimeout(() => resolve(new Date()), 1_100);
  });
  await new Promise((resolve) => setTimeout(resolve, 1_100));
  expect((await put()).existed).toBe(true);
  expect(await store.deleteIfOld(sha256, between)).toBe(false);
  expect(await store.exists(sha256)).toBe(true);
});
