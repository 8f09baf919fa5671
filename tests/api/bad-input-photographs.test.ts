import sharp from 'sharp';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { photograph } from '#tests/factories/photograph.ts';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { startBatch, uploadWorkbook, type HandedIn } from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

type Told = { id: string | null; fileName: string; already: object | null; error: { detail: string } | null };
type Shown = {
  id: string;
  fileName: string;
  state: string;
  problem: string | null;
  structureNumber: string | null;
};

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let batch: HandedIn;
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1', 'L-2'] });
  contractor = await harness.signIn(site.contractor);
});
afterAll(() => harness?.close());
beforeEach(async () => {
  batch = await startBatch(contractor, site);
});

type File = readonly [string, Buffer];
async function post(files: readonly File[]): Promise<{ status: number; input: number; files: Told[] }> {
  const upload = contractor.post(`${batch.path}/photos`);
  for (const [name, bytes] of files) upload.attach('photos', bytes, name);
  const { status, body } = await upload;
  return { status, input: body.input, files: body.files };
}
/** By name; they came in one moment. */
const shown = async (): Promise<Shown[]> =>
  (await contractor.get(`${batch.path}/photos`)).body.items.toSorted((one: Shown, other: Shown) =>
    one.fileName < other.fileName ? -1 : 1,
  );

/** Many different JPEG files made from one: a comment segment (ITU-T T.81, B.2.4.5) of its own after the first marker. */
function different(picture: Buffer, count: number): Buffer[] {
  return Array.from({ length: count }, (_, n) => {
    const text = Buffer.from(`copy ${n}`);
    const segment = Buffer.concat([Buffer.from([0xff, 0xfe, 0, text.length + 2]), text]);
    return Buffer.concat([picture.subarray(0, 2), segment, picture.subarray(2)]);
  });
}

describe('a file that is no photograph', () => {
  const HEIC = Buffer.from('\0\0\0\u0018ftypheic\0\0\0\0mif1heic', 'latin1');
  it.each<[string, string, Buffer, string, RegExp]>([
    [
      'a text file',
      'kits.jpg',
      Buffer.from('Bore depth 7 ft'),
      'photo.not-a-picture',
      /not a picture.*JPEG/u,
    ],
    ['SVG', 'kits.png', Buffer.from('<?xml version="1.0"?>\n<svg onload="x"/>'), 'photo.svg', /SVG.*JPEG/u],
    ['HEIC', 'IMG_0001.jpg', HEIC, 'photo.heic', /HEIC.*JPEG.*most compatible/u],
    ['nothing', 'kits.jpg', Buffer.alloc(0), 'photo.empty', /empty.*again/u],
    ['a page', 'kits.jpg', Buffer.from('<!doctype html><script>1</script>'), 'photo.not-a-picture', /JPEG/u],
  ])(
    '%s is refused with what to do; the others of the upload stay',
    async (_what, name, bytes, code, advice) => {
      const { status, files } = await post([
        ['L-1 before.jpg', await photograph()],
        [name, bytes],
        ['L-1 after.jpg', await photograph()],
      ]);
      expect(status).toBe(202);
      expect(files.map(({ fileName, error }) => [fileName, error])).toEqual([
        ['L-1 before.jpg', null],
        [name, { code, detail: expect.stringMatching(advice) }],
        ['L-1 after.jpg', null],
      ]);
      expect((await shown()).map((photo) => photo.fileName)).toEqual(['L-1 after.jpg', 'L-1 before.jpg']);
    },
  );

  it('alone makes no input', async () => {
    const { input, files } = await post([['notes.jpg', Buffer.from('no picture')]]);
    expect([input, files[0]?.id]).toEqual([0, null]);
    expect((await contractor.get(batch.path)).body).toMatchObject({ input: 0, status: 'draft' });
  });
});

describe('a photograph that cannot be shown', () => {
  it(
    'cut short or of a hundred megapixels is told beside its name with the remedy, and the rest goes on',
    { timeout: 90_000 },
    async () => {
      const picture = await photograph({ width: 800, height: 600 });
      const noise = await sharp(Buffer.alloc(300 * 200 * 3, 'noise of many'), {
        raw: { width: 300, height: 200, channels: 3 },
      })
        .jpeg({ quality: 100 })
        .toBuffer();
      const huge = await sharp({
        create: { width: 10_000, height: 10_000, channels: 3, background: '#888' },
        limitInputPixels: false,
      })
        .jpeg()
        .toBuffer();
      await post([
        ['L-1 before.jpg', picture],
        ['L-1 cut.jpg', noise.subarray(0, noise.length - 400)],
        ['L-1 huge.jpg', huge],
        ['L-1 after.jpg', await photograph()],
      ]);
      await harness.drain();
      expect((await shown()).map(({ fileName, state, problem }) => [fileName, state, problem])).toEqual([
        ['L-1 after.jpg', 'ready', null],
        ['L-1 before.jpg', 'ready', null],
        ['L-1 cut.jpg', 'unreadable', expect.stringMatching(/damaged or broke off.*again/u)],
        ['L-1 huge.jpg', 'unreadable', expect.stringMatching(/more than 90 million pixels.*smaller/u)],
      ]);
      // The original is kept byte for byte, whatever can be shown of it.
      const cut = (await shown())[2];
      const original = await contractor.get(`/api/photos/${cut?.id}/file?size=original`).responseType('blob');
      expect((original.body as Buffer).length).toBe(noise.length - 400);
    },
  );
});

describe('the same photograph again', () => {
  it(
    'in one upload, in the next, and after another, is one photograph, told with where it lies',
    { timeout: 90_000 },
    async () => {
      await uploadWorkbook(harness, contractor, {
        batch,
        site,
        workbook: { set: [setRow('L-1'), setRow('L-2')], pours: pourRows('L-1', site.lot.number) },
      });
      const [a, b] = [await photograph(), await photograph()];
      const first = await post([
        ['L-1 kits.jpg', a],
        ['copy.jpg', a],
      ]);
      expect(first.files.map((file) => file.already)).toEqual([
        null,
        { fileName: 'L-1 kits.jpg', structureNumber: null },
      ]);
      expect(first.files[1]?.id).toBe(first.files[0]?.id);
      await harness.drain();
      expect((await post([['L-1 water.jpg', b]])).input).toBe(first.input + 1);
      // A, then B, then A again, now named for another structure: it lies on the first, and says so.
      const again = await post([['L-2 kits.jpg', a]]);
      expect([again.input, again.files]).toEqual([
        first.input + 1,
        [
          expect.objectContaining({
            id: first.files[0]?.id,
            fileName: 'L-2 kits.jpg',
            already: { fileName: 'L-1 kits.jpg', structureNumber: 'L-1' },
            error: null,
          }),
        ],
      ]);
      await harness.drain();
      expect((await shown()).map((photo) => [photo.fileName, photo.structureNumber])).toEqual([
        ['L-1 kits.jpg', 'L-1'],
        ['L-1 water.jpg', 'L-1'],
      ]);
    },
  );

  it('in another batch of the same contractor is told as new there', async () => {
    const picture = await photograph();
    await post([['L-1 kits.jpg', picture]]);
    batch = await startBatch(contractor, site);
    expect((await post([['L-1 kits.jpg', picture]])).files[0]?.already).toBeNull();
  });
});

// Last: what drains the queue after them would prepare every one.
describe('four hundred photographs', () => {
  const files = async (): Promise<File[]> =>
    different(await photograph({ width: 64, height: 48 }), 400).map((bytes, n) => [`photo ${n}.jpg`, bytes]);
  const ends = async () => {
    const names = new Set((await shown()).map((photo) => photo.fileName));
    const { input, counts } = (await contractor.get(batch.path)).body;
    return [names.size, input, counts.photos, counts.unplacedPhotos];
  };

  it('at once are all stored', { timeout: 180_000 }, async () => {
    const once = await post(await files());
    expect([once.status, once.input, once.files.length]).toEqual([202, 1, 400]);
    expect(once.files.filter((file) => file.error !== null || file.already !== null)).toEqual([]);
    expect(await ends()).toEqual([400, 1, 400, 400]);
  });

  it('by parts are all stored, and a part sent again adds nothing', { timeout: 180_000 }, async () => {
    const all = await files();
    for (const part of [0, 1, 2, 3]) {
      const reply = await post(all.slice(part * 100, part * 100 + 100));
      expect([reply.status, reply.input, reply.files.length]).toEqual([202, part + 1, 100]);
    }
    const again = await post(all.slice(100, 110));
    expect(again.files.map((file) => file.already !== null)).toEqual(Array.from({ length: 10 }, () => true));
    expect(await ends()).toEqual([400, 4, 400, 400]);
  });

  it('and more than five hundred in one upload are refused with the number, none stored', async () => {
    const upload = contractor.post(`${batch.path}/photos`);
    for (let n = 0; n <= 500; n++) upload.attach('photos', Buffer.from(`text ${n}`), `${n}.jpg`);
    const { status, body } = await upload;
    expect([status, body.code]).toEqual([413, 'upload.too-many']);
    expect(body.detail).toBe('At most 500 files go in one upload. Send the others after it.');
    expect(await shown()).toEqual([]);
    expect((await contractor.get(batch.path)).body.input).toBe(0);
  });
});
