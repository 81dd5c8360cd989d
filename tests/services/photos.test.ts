import sharp from 'sharp';
import { beforeEach, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { auditTrail, photos } from '@/db/schema';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { encodePhoto } from '@/lib/photos/encode-photo';
import { MOST_KEPT_BYTES } from '@/lib/schemas/photo';
import { addPhoto } from '@/lib/services/add-photo';
import { removePhoto } from '@/lib/services/remove-photo';
import { showPhotos } from '@/lib/services/show-photos';
import { showPicture } from '@/lib/services/show-picture';
import { aHousehold, aMember, freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');
const PLACE = 'GPSLatitude 28.0';

/** Noise compresses worst of all: a photo can only be smaller. */
function noise(width: number, height: number) {
  return sharp({
    create: { width, height, channels: 3, background: 'black', noise: { type: 'gaussian', mean: 128, sigma: 60 } },
  });
}

const aPhoto = (): Promise<Buffer<ArrayBuffer>> =>
  noise(640, 480)
    .jpeg()
    .withExif({ IFD0: { Copyright: PLACE, Make: 'A camera' }, IFD3: { GPSLatitude: '28/1 0/1 0/1' } })
    .toBuffer();

describe('a picture as it is kept', () => {
  it('has nothing of what the camera wrote beside it', async () => {
    const sent = await aPhoto();
    expect(sent.includes(PLACE)).toBe(true);
    const { picture, small } = await encodePhoto(sent);
    for (const kept of [picture, small]) {
      const { exif, xmp, iptc, icc, format } = await sharp(kept).metadata();
      expect({ exif, xmp, iptc, icc, format }).toEqual({ format: 'webp' });
      expect(kept.includes(PLACE)).toBe(false);
    }
  });

  it('stands the right way up', async () => {
    const lying = await noise(400, 200).jpeg().withMetadata({ orientation: 6 }).toBuffer();
    expect(await encodePhoto(lying)).toMatchObject({ width: 200, height: 400 });
  });

  it('is at most 1600 pixels long and 400 kB large, whatever it shows', async () => {
    const { picture, small, width, height } = await encodePhoto(await noise(3000, 2600).png().toBuffer());
    expect(picture.byteLength + small.byteLength).toBeLessThanOrEqual(MOST_KEPT_BYTES);
    expect(Math.max(width, height)).toBeLessThanOrEqual(1600);
    expect((await sharp(picture).metadata()).width).toBe(width);
  });

  it.each(['jpeg', 'png', 'webp'] as const)('is read from %s', async (format) => {
    expect(await encodePhoto(await noise(64, 48).toFormat(format).toBuffer())).toMatchObject({ width: 64, height: 48 });
  });

  it('is white where the picture was clear', async () => {
    const clear = await sharp({ create: { width: 8, height: 8, channels: 4, background: '#00000000' } })
      .png()
      .toBuffer();
    const { picture } = await encodePhoto(clear);
    const { channels } = await sharp(picture).stats();
    expect(channels.map(({ min }) => min)).toEqual([255, 255, 255]);
  });
});

const svg = `<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"><script>alert(1)</script></svg>`;
const refused: [what: string, bytes: () => Promise<Uint8Array<ArrayBuffer>>, sentence: RegExp][] = [
  ['a program with another name', async () => Buffer.from(`MZ${'\0'.repeat(400)}`, 'latin1'), /no photo/],
  [
    'a program behind the first bytes of a JPEG',
    async () => Buffer.concat([Buffer.from([255, 216, 255, 224]), Buffer.alloc(900, 7)]),
    /not whole/,
  ],
  ['an SVG with a script', async () => Buffer.from(svg), /no photo/],
  ['a picture of 100 megapixels', async () => manyPixels(), /too many pixels/],
  [
    'a picture that ends too soon',
    async () => Uint8Array.from((await noise(800, 600).jpeg().toBuffer()).subarray(0, 9_000)),
    /not whole/,
  ],
  [
    'a PNG that ends too soon',
    async () => Uint8Array.from((await noise(800, 600).png().toBuffer()).subarray(0, 9_000)),
    /not whole/,
  ],
  ['a HEIC', async () => Buffer.from(`\0\0\0\x18ftypheic${'\0'.repeat(200)}`, 'latin1'), /HEIC.*as JPEG/],
  ['a GIF', () => noise(8, 8).gif().toBuffer(), /no photo/],
  ['nothing', async () => new Uint8Array(), /no photo/],
];

const manyPixels = () =>
  sharp({ create: { width: 12_000, height: 9_000, channels: 3, background: 'white' } })
    .png({ compressionLevel: 9 })
    .toBuffer();

describe('in a household', () => {
  let db: Database;
  let owner: HouseholdAccess;
  beforeEach(async () => {
    db = freshDatabase();
    owner = await aHousehold(db);
  });
  const as = (access: HouseholdAccess) => ({ db, access, now });
  const equipment = async (bytes?: Uint8Array<ArrayBuffer>) => ({
    ...{ id: crypto.randomUUID(), kind: 'equipment' as const, about: undefined, caption: 'Filter valve' },
    bytes: bytes ?? (await aPhoto()),
  });

  it.each(refused)('%s is refused with a sentence, and nothing is stored', async (_, bytes, sentence) => {
    const photo = await equipment(await bytes());
    await expect(addPhoto(as(owner), photo)).rejects.toMatchObject({
      code: 'invalid-input',
      message: expect.stringMatching(sentence) as string,
    });
    expect(await db.$count(photos)).toBe(0);
    expect(await db.$count(auditTrail)).toBe(0);
  });

  it('keeps a photo once, however often it is sent, and shows it to everybody in it', async () => {
    const photo = await equipment();
    await addPhoto(as(owner), photo);
    const list = await addPhoto(as(owner), photo);
    expect(list).toMatchObject([{ id: photo.id, kind: 'equipment', caption: 'Filter valve', removable: true }]);
    const viewer = await aMember(db, { householdId: owner.householdId, role: 'viewer', now });
    expect(await showPhotos(as(viewer))).toMatchObject([{ id: photo.id, removable: false }]);
    const { bytes } = await showPicture(as(viewer), { id: photo.id, size: 'small' });
    expect((await sharp(bytes).metadata()).width).toBeLessThanOrEqual(240);
  });

  it('belongs to a product of the same household only', async () => {
    const photo = { ...(await equipment()), kind: 'label' as const, about: 'no-such-product' };
    await expect(addPhoto(as(owner), photo)).rejects.toMatchObject({ code: 'not-found' });
    expect(await db.$count(photos)).toBe(0);
  });

  it('is nobody else’s', async () => {
    const photo = await equipment();
    await addPhoto(as(owner), photo);
    const other = await aHousehold(db);
    await expect(showPicture(as(other), { id: photo.id, size: 'whole' })).rejects.toMatchObject({ code: 'not-found' });
    await expect(removePhoto(as(other), photo)).rejects.toMatchObject({ code: 'not-found' });
    await expect(addPhoto(as(other), photo)).rejects.toMatchObject({ code: 'conflict' });
    expect(await db.$count(photos)).toBe(1);
  });

  it('is taken away by whoever added it, or by an owner', async () => {
    const member = (role: 'caretaker' | 'viewer') => aMember(db, { householdId: owner.householdId, role, now });
    const caretaker = await member('caretaker');
    const own = await equipment();
    const owners = await equipment();
    await addPhoto(as(caretaker), own);
    await addPhoto(as(owner), owners);
    await expect(removePhoto(as(caretaker), owners)).rejects.toMatchObject({ code: 'not-allowed' });
    await expect(removePhoto(as(await member('viewer')), own)).rejects.toMatchObject({ code: 'not-allowed' });
    expect(await removePhoto(as(caretaker), own)).toHaveLength(1);
    expect(await removePhoto(as(owner), owners)).toEqual([]);
  });

  it('has no room beyond its number', async () => {
    const demo = { ...owner, demo: true };
    const bytes = await aPhoto();
    for (let sent = 0; sent < 3; sent += 1) await addPhoto(as(demo), await equipment(bytes));
    await expect(addPhoto(as(demo), await equipment(bytes))).rejects.toMatchObject({ code: 'conflict' });
    expect(await db.$count(photos)).toBe(3);
  });
});
