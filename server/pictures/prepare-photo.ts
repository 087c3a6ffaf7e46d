import sharp from 'sharp';
import { LIMITS } from '#shared/schemas/limits.ts';
import { BoundedQueue, QueueFull } from '#server/bounded-queue.ts';
import { AppError, invalidInput, unavailable } from '#server/errors.ts';
import { pictureType } from './picture-type.ts';

/** Longest sides, px. */
const IMAGE = 2_400;
const THUMBNAIL = 320;
const PATIENCE_S = 20;

/** A large photo takes a second and some hundred megabytes. */
const queue = new BoundedQueue({ atOnce: 2, mostWaiting: 16 });

// Nothing is decoded twice, and one photo may not take every processor.
sharp.cache(false);
sharp.concurrency(1);

export interface PreparedPhoto {
  image: Buffer;
  thumbnail: Buffer;
  /** px, of the image */
  width: number;
  height: number;
}

/**
 * Makes of a picture a JPEG of bounded size that stands upright and holds nothing but the picture: no place, no
 * camera, no hidden file behind it.
 * @param field of the form that it came in
 * @throws AppError `unsupported_type`, or `invalid_input` for what cannot be read or has too many pixels
 */
export async function preparePhoto(bytes: Buffer, field = 'photo'): Promise<PreparedPhoto> {
  const type = pictureType(bytes);
  if (type === null || type === 'HEIC') {
    const detail = 'Photos are JPEG, PNG, WebP or AVIF.';
    throw new AppError(
      'unsupported_type',
      type === 'HEIC' ? `${detail} Save this HEIC picture as JPEG first.` : detail,
    );
  }
  try {
    return await queue.run(() => encode(bytes));
  } catch (error) {
    if (error instanceof QueueFull) throw unavailable('Too many photos at once. Try again in a moment.');
    const tooLarge = error instanceof Error && /pixel limit/i.test(error.message);
    throw invalidInput([
      {
        pointer: `#/${field}`,
        detail: tooLarge
          ? `Has more than ${LIMITS.photoPixels.max / 1_000_000} million pixels.`
          : `Cannot be read as a ${type} picture.`,
      },
    ]);
  }
}

async function encode(bytes: Buffer): Promise<PreparedPhoto> {
  const { data: image, info } = await sharp(bytes, {
    limitInputPixels: LIMITS.photoPixels.max,
    failOn: 'error',
    sequentialRead: true,
  })
    .timeout({ seconds: PATIENCE_S })
    .autoOrient()
    .resize({ width: IMAGE, height: IMAGE, fit: 'inside', withoutEnlargement: true })
    .flatten({ background: '#ffffff' })
    .jpeg({ quality: 82, mozjpeg: true })
    .toBuffer({ resolveWithObject: true });
  const thumbnail = await sharp(image)
    .resize({ width: THUMBNAIL, height: THUMBNAIL, fit: 'inside', withoutEnlargement: true })
    .jpeg({ quality: 78, mozjpeg: true })
    .toBuffer();
  return { image, thumbnail, width: info.width, height: info.height };
}
