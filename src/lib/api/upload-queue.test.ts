import { beforeEach, expect, it, vi } from 'vitest';
import { ApiProblem, unreachable } from '#src/lib/api/api-problem.ts';
import { countUploads, createUploadQueue, type SendFile } from '#src/lib/api/upload-queue.ts';
import type { UploadReply } from '#shared/generated/api-types.ts';

const sent: string[] = [];
let answer: (name: string) => UploadReply | Error;
const keys: (string | undefined)[] = [];
const send: SendFile = ({ files, idempotencyKey }) => {
  const name = files[0]?.name ?? '';
  sent.push(name);
  keys.push(idempotencyKey);
  const reply = answer(name);
  return reply instanceof Error ? Promise.reject(reply) : Promise.resolve(reply);
};

const file = (name: string) => new File(['x'], name);
const reply = (id: string, error: { code: string; detail: string } | null = null): UploadReply => ({
  input: 1,
  files: [{ id: error ? null : id, fileName: id, sha256: null, already: null, error }],
});
const copyOf = (id: string, structureNumber: string | null): UploadReply => ({
  input: 1,
  files: [
    { id, fileName: id, sha256: null, already: { fileName: `first ${id}`, structureNumber }, error: null },
  ],
});
const queue = () => createUploadQueue({ path: '/p', method: 'POST', field: 'photos' }, send);
const settled = (one: ReturnType<typeof queue>) =>
  vi.waitFor(() => expect(countUploads(one.files()).busy).toBe(false));

beforeEach(() => {
  sent.length = 0;
  keys.length = 0;
  answer = (name) => reply(name);
});

it('stores each file, and tells the same bytes again as a duplicate, with where they lie', async () => {
  const one = queue();
  const stored = vi.fn<() => void>();
  one.onStored(stored);
  answer = (name) => (name === 'known' ? copyOf(name, 'L-1') : reply(name));
  one.add([file('a'), file('known'), file('b')]);
  await settled(one);
  expect(countUploads(one.files())).toMatchObject({ all: 3, stored: 2, duplicate: 1, failed: 0 });
  expect(one.files()[1]?.already).toEqual({ fileName: 'first known', structureNumber: 'L-1' });
  expect(stored).toHaveBeenCalledTimes(2);
  one.clear();
  expect(one.files()).toEqual([]);
  one.stop();
});

it('a refusal costs one file, says why, is not sent again, and goes with the list', async () => {
  const one = queue();
  answer = (name) => reply(name, name === 'bad' ? { code: 'photo.kind', detail: 'Not a picture.' } : null);
  one.add([file('bad'), file('good')]);
  await settled(one);
  expect(one.files().map(({ state, problem }) => [state, problem])).toEqual([
    ['failed', 'Not a picture.'],
    ['stored', null],
  ]);
  one.retry();
  await settled(one);
  expect(countUploads(one.files())).toMatchObject({ stored: 1, failed: 1, refused: 1 });
  expect(sent).toEqual(['bad', 'good']);
  one.clear();
  expect(one.files()).toEqual([]);
  one.stop();
});

it('sends again what failed on the way', async () => {
  const one = queue();
  const busy = new ApiProblem({ status: 503, code: 'busy', detail: 'Busy.' });
  answer = (name) => (name === 'lost' ? busy : reply(name));
  one.add([file('lost'), file('good')]);
  await settled(one);
  expect(countUploads(one.files())).toMatchObject({ stored: 1, failed: 1, refused: 0 });
  answer = (name) => reply(name);
  one.retry();
  await settled(one);
  expect(countUploads(one.files()).stored).toBe(2);
  expect(sent).toEqual(['lost', 'good', 'lost']);
  // Under one key, so that an answer that was lost on the way is given again; another file has its own.
  expect(keys[2]).toBe(keys[0]);
  expect(new Set(keys).size).toBe(2);
  one.stop();
});

it('goes on by itself when the network is back, and only with what waited for it', async () => {
  const one = queue();
  const full = new ApiProblem({ status: 413, code: 'photo.too-large', detail: 'Too large.' });
  answer = (name) => (name === 'large' ? full : unreachable());
  one.add([file('a'), file('large')]);
  await settled(one);
  expect(one.files().map((each) => each.offline)).toEqual([true, false]);
  answer = (name) => reply(name);
  globalThis.dispatchEvent(new Event('online'));
  await settled(one);
  expect(one.files().map((each) => each.state)).toEqual(['stored', 'failed']);
  one.stop();
});
