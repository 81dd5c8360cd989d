import 'server-only';
import sharp, { type Sharp } from 'sharp';
import { AppError } from '@/lib/errors';
import { MOST_KEPT_BYTES } from '@/lib/schemas/photo';

// Of everything that the library reads only these, and only from memory: no SVG with what it refers to, no files by name.
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({
  operation: ['VipsForeignLoadJpegBuffer', 'VipsForeignLoadPngBuffer', 'VipsForeignLoadWebpBuffer'],
});
sharp.cache(false);
sharp.concurrency(1);

/** Phones take up to 50 megapixels in one piece; more is a panorama or an attack. */
const MOST_PIXELS = 60_000_000;
const SECONDS_AT_MOST = 20;
/** The longest side of the whole picture and of its small copy [px]. */
const WHOLE_SIDE = 1600;
const SMALL_SIDE = 240;
/** Tried one after the other until the picture is small enough: side [px] and quality [%]. */
const tries = [
  { side: WHOLE_SIDE, quality: 80 },
  { side: WHOLE_SIDE, quality: 60 },
  { side: 1280, quality: 55 },
  { side: 1000, quality: 45 },
  { side: 800, quality: 30 },
] as const;

export type EncodedPhoto = { picture: Buffer; small: Buffer; width: number; height: number };

/**
 * A photo as it is kept: turned the right way up, at most 1600 px long, WebP, without a byte of what a camera writes beside
 * the picture (place, time, owner, preview).
 *
 * Errors: `invalid-input`, with a sentence, for what is no JPEG, PNG or WebP, is not whole, or is too large.
 */
export function encodePhoto(bytes: Uint8Array): Promise<EncodedPhoto> {
  // One at a time: each may need the memory of a whole picture.
  const encoded = last.then(() => encode(bytes));
  last = encoded.catch(() => undefined);
  return encoded;
}

let last: Promise<unknown> = Promise.resolve();

async function encode(bytes: Uint8Array): Promise<EncodedPhoto> {
  assertPhoto(bytes);
  const { data, info } = await decode(bytes);
  const { width, height, channels } = info;
  const raw = () => sharp(data, { raw: { width, height, channels } });
  const small = await resized(raw(), SMALL_SIDE).webp({ quality: 70 }).toBuffer();
  for (const { side, quality } of tries) {
    const { data: picture, info: kept } = await resized(raw(), side)
      .webp({ quality })
      .toBuffer({ resolveWithObject: true });
    if (picture.byteLength + small.byteLength <= MOST_KEPT_BYTES)
      return { picture, small, width: kept.width, height: kept.height };
  }
  throw new Error('a picture of 800 pixels does not fit into 400 kB');
}

/** The pixels, no more of them than are kept, on white where the picture was clear. */
async function decode(bytes: Uint8Array) {
  const options = { limitInputPixels: MOST_PIXELS, failOn: 'error' } as const;
  const { width, height } = await sharp(bytes, { ...options, limitInputPixels: false })
    .metadata()
    .catch(refuse);
  if (width * height > MOST_PIXELS)
    throw refusal('This picture has too many pixels. Send a smaller one: 12 megapixels are plenty.');
  return resized(sharp(bytes, options).timeout({ seconds: SECONDS_AT_MOST }).autoOrient(), WHOLE_SIDE)
    .flatten({ background: 'white' })
    .toColourspace('srgb')
    .raw()
    .toBuffer({ resolveWithObject: true })
    .catch(refuse);
}

function resized(image: Sharp, side: number): Sharp {
  return image.resize({ width: side, height: side, fit: 'inside', withoutEnlargement: true });
}

/** What the library says of a broken picture speaks of its own insides. */
function refuse(cause: unknown): never {
  throw refusal('This picture is not whole, or cannot be read. Take it again, or send another.', cause);
}

function refusal(message: string, cause?: unknown): AppError {
  return new AppError('invalid-input', message, { cause, problems: [{ path: 'bytes', message }] });
}

/** Looks at what a file is, never at what it is called. */
function assertPhoto(bytes: Uint8Array): void {
  const head = Buffer.from(bytes.subarray(0, 32)).toString('latin1');
  if (head.startsWith('\xff\xd8\xff') || head.startsWith('\x89PNG\r\n\x1a\n') || /^RIFF[^]{4}WEBP/.test(head)) return;
  if (/^[^]{4}ftyp(heic|heix|hevc|heim|heis|mif1|msf1|avif)/.test(head))
    throw refusal(
      'This photo is in a format that cannot be read here (HEIC or AVIF). Send it as JPEG: the settings of a camera name it the compatible format.',
    );
  throw refusal('This is no photo. Choose a picture in JPEG, PNG or WebP.');
}
