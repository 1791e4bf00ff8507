import sharp from 'sharp';
import { invalidField } from '../problem';

/** Photos from a phone are 12 to 50 megapixels; a drawing of more is meant to exhaust the server. */
const MAX_PIXELS = 50_000_000;
const THUMBNAIL_PIXELS = 480;
export const PHOTO_TYPE = 'image/jpeg';

// Everything is closed but three decoders: SVG, PDF and the rest reach out or run too much code.
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({
  operation: ['VipsForeignLoadJpegBuffer', 'VipsForeignLoadPngBuffer', 'VipsForeignLoadWebpBuffer'],
});

export interface PhotoImage {
  photo: Buffer;
  thumbnail: Buffer;
}

/**
 * Decodes a photo and writes it anew as JPEG: no metadata (a phone writes the
 * place into it), nothing hidden behind the picture. What no decoder reads in
 * full is refused.
 */
export async function encodePhoto(received: Buffer): Promise<PhotoImage> {
  try {
    const decoded = sharp(received, { limitInputPixels: MAX_PIXELS, failOn: 'warning' })
      .autoOrient()
      .flatten({ background: '#ffffff' });
    const photo = await decoded.clone().jpeg({ quality: 86 }).toBuffer();
    const thumbnail = await sharp(photo)
      .resize({ width: THUMBNAIL_PIXELS, height: THUMBNAIL_PIXELS, fit: 'inside' })
      .jpeg({ quality: 78 })
      .toBuffer();
    return { photo, thumbnail };
  } catch (fault) {
    if (fault instanceof Error && fault.message.includes('pixel limit')) {
      throw invalidField('#/file', 'too-many-pixels', 'A photo has at most 50 million pixels.');
    }
    throw invalidField('#/file', 'no-photo', 'Send a whole JPEG, PNG or WebP photo.');
  }
}
