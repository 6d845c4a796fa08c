import sharp, { type Sharp } from 'sharp';
import type { Photo } from '../../shared/api/intakes';
import { problem } from '../http/problem';
import { judgePicture } from './judge-picture';
import { pictureKind } from './picture-kind';

export interface EncodedPicture {
  readonly full: Buffer;
  readonly thumb: Buffer;
  readonly widthPx: number;
  readonly heightPx: number;
  readonly verdict: Photo['verdict'];
}

const MAX_PIXELS = 50_000_000;
const FULL_PX = 2_400;
const THUMB_PX = 480;

// Pictures come once each; keeping decoded ones around only costs memory.
sharp.cache(false);

const refusals: Record<string, string> = {
  heic: 'This picture is in the HEIC format, which we cannot read yet. Take it with the button here, or set the camera to JPEG.',
  gif: 'This is an animation. Choose a photo (JPEG, PNG or WebP).',
};
const unreadable = () => problem('unsupported-media', 'Choose a photo (JPEG, PNG or WebP). This file is something else, or it is damaged.');

const asJpeg = (image: Sharp, quality: number) => image.flatten({ background: '#ffffff' }).toColourspace('srgb').jpeg({ quality });

/** Two at a time in one process: a decoded picture takes up to 200 MB. */
const AT_ONCE = 2;
let running = 0;
const waiting: (() => void)[] = [];
async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= AT_ONCE) await new Promise<void>((go) => { waiting.push(go); });
  else running += 1;
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    if (next) next();
    else running -= 1;
  }
}

async function encode(bytes: Buffer): Promise<EncodedPicture> {
  const { width, height } = await sharp(bytes, { limitInputPixels: false }).metadata();
  if (width * height > MAX_PIXELS) throw problem('too-large', 'A photo may have 50 million pixels at most. Take it again in a smaller size.');
  // Metadata (the place, the device) is not carried over unless asked for; rotate() turns the picture as its metadata said first.
  const upright = sharp(bytes, { limitInputPixels: MAX_PIXELS, failOn: 'error' }).rotate();
  const { data: full, info } = await asJpeg(upright.resize({ width: FULL_PX, height: FULL_PX, fit: 'inside', withoutEnlargement: true }), 84).toBuffer({ resolveWithObject: true });
  const thumb = await asJpeg(sharp(full).resize({ width: THUMB_PX, height: THUMB_PX, fit: 'inside', withoutEnlargement: true }), 76).toBuffer();
  return { full, thumb, widthPx: info.width, heightPx: info.height, verdict: await judgePicture(full, width, height) };
}

/**
 * Makes what we keep of an uploaded file: an upright JPEG without metadata and a small one. What came in is never kept.
 * Runs off the event loop.
 * @throws problems unsupported-media (not a picture, damaged, a kind we cannot read), too-large (too many pixels)
 */
export async function encodePicture(bytes: Buffer): Promise<EncodedPicture> {
  const kind = pictureKind(bytes);
  if (kind === null) throw unreadable();
  const words = refusals[kind];
  if (words) throw problem('unsupported-media', words);
  return inTurn(() => encode(bytes).catch((error: unknown) => {
    if (error instanceof Error && error.name === 'Refusal') throw error;
    throw unreadable();
  }));
}
